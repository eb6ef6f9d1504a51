import { z } from 'zod';
import {
  declineBodySchema,
  noteBodySchema,
  proposeBodySchema,
  publishBodySchema,
  sendBackBodySchema,
  versionBodySchema,
} from '../../shared/contracts/bodies.ts';
import {
  pageKindSchema,
  proposalsViewSchema,
  proposalViewSchema,
  shelfSchema,
  startViewSchema,
} from '../../shared/contracts/views.ts';
import { proposalStates } from '../../shared/proposals/proposal.ts';
import { idParameters, revisionNumber } from '../http/route-parts.ts';
import { defineRoute } from '../http/route.ts';

const startQuery = z.object({
  shelf: shelfSchema,
  subject: z.string().max(64).optional(),
  page: z.string().max(64).optional(),
  revision: revisionNumber.optional().describe('An old revision to go back to.'),
  kind: pageKindSchema.optional().describe('Of a new page that has no address yet: which kind it is to be.'),
});

const listQuery = z.object({
  state: z.union([z.literal(''), z.enum(proposalStates)]).optional(),
  mine: z
    .enum(['true', 'false'])
    .default('false')
    .transform((word) => word === 'true')
    .describe("Only one's own."),
});

/** A step of a proposal's way: a `POST` below its address that gives the proposal as it then is. */
const step = {
  method: 'post',
  parameters: idParameters,
  view: proposalViewSchema,
} as const;

const stepProblems = ['sign-in-needed', 'not-allowed', 'not-found', 'wrong-state', 'behind-what-was-read'] as const;

/** From change to publication. */
export const proposalRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/start',
    name: 'start',
    summary: 'The text that a change starts from',
    query: startQuery,
    view: startViewSchema,
    problems: ['bad-request', 'sign-in-needed', 'not-found'],
    answer: (api, { query }) =>
      api.start({
        shelf: query.shelf,
        subject: query.subject || null,
        page: query.page || null,
        revision: query.revision ?? null,
        ...(query.kind === undefined ? {} : { kind: query.kind }),
      }),
  }),
  defineRoute({
    method: 'get',
    path: '/api/proposals',
    name: 'proposals',
    summary: "Proposals that one may see: one's own, and for those who decide all that were sent",
    query: listQuery,
    view: proposalsViewSchema,
    problems: ['bad-request', 'sign-in-needed'],
    answer: (api, { query }) => api.proposals(query.state || null, query.mine),
  }),
  defineRoute({
    method: 'post',
    path: '/api/proposals',
    name: 'propose',
    summary: 'Propose a change, or a new page where `baseRevision` is null',
    body: proposeBodySchema,
    status: 201,
    view: proposalViewSchema,
    problems: [
      'sign-in-needed',
      'not-found',
      'conflict',
      'already-there',
      'fields-invalid',
      'not-acceptable-text',
      'takes-too-long',
      'busy',
    ],
    answer: (api, { body }) => api.propose(body),
    location: (proposal) => `/api/proposals/${proposal.id}`,
  }),
  defineRoute({
    method: 'get',
    path: '/api/proposals/{id}',
    name: 'proposal',
    summary: 'A proposal with its versions, notes and findings',
    parameters: idParameters,
    view: proposalViewSchema,
    problems: ['sign-in-needed', 'not-allowed', 'not-found'],
    answer: (api, { parameters }) => api.proposal(parameters.id),
  }),
  defineRoute({
    ...step,
    path: '/api/proposals/{id}/versions',
    name: 'addVersion',
    summary: 'Go on writing, or answer what was asked',
    body: versionBodySchema,
    problems: [...stepProblems, 'conflict', 'fields-invalid', 'not-acceptable-text', 'takes-too-long', 'busy'],
    answer: (api, { parameters, body }) => api.addVersion(parameters.id, body),
    dependsOn: (api, { parameters }) => api.proposal(parameters.id),
  }),
  defineRoute({
    ...step,
    path: '/api/proposals/{id}/notes',
    name: 'addNote',
    summary: 'Say something of a proposal, or of one of its lines',
    body: noteBodySchema,
    problems: [...stepProblems, 'fields-invalid'],
    answer: (api, { parameters, body }) => api.addNote(parameters.id, body),
    dependsOn: (api, { parameters }) => api.proposal(parameters.id),
  }),
  defineRoute({
    ...step,
    path: '/api/proposals/{id}/send',
    name: 'send',
    summary: 'Send the newest version to be decided on',
    problems: [...stepProblems],
    answer: (api, { parameters }) => api.send(parameters.id),
    dependsOn: (api, { parameters }) => api.proposal(parameters.id),
  }),
  defineRoute({
    ...step,
    path: '/api/proposals/{id}/send-back',
    name: 'sendBack',
    summary: 'Ask the author for something, with a note',
    body: sendBackBodySchema,
    problems: [...stepProblems, 'fields-invalid'],
    answer: (api, { parameters, body }) => api.sendBack(parameters.id, body),
    dependsOn: (api, { parameters }) => api.proposal(parameters.id),
  }),
  defineRoute({
    ...step,
    path: '/api/proposals/{id}/decline',
    name: 'decline',
    summary: 'Decline a proposal, with a reason',
    body: declineBodySchema,
    problems: [...stepProblems, 'fields-invalid'],
    answer: (api, { parameters, body }) => api.decline(parameters.id, body),
    dependsOn: (api, { parameters }) => api.proposal(parameters.id),
  }),
  defineRoute({
    ...step,
    path: '/api/proposals/{id}/withdraw',
    name: 'withdraw',
    summary: "Take back one's own proposal",
    problems: [...stepProblems],
    answer: (api, { parameters }) => api.withdraw(parameters.id),
    dependsOn: (api, { parameters }) => api.proposal(parameters.id),
  }),
  defineRoute({
    ...step,
    path: '/api/proposals/{id}/publish',
    name: 'publish',
    summary: "Publish another's proposal, and put one's name to it",
    body: publishBodySchema,
    problems: [...stepProblems, 'conflict', 'fallen-behind', 'override-needed', 'already-there', 'fields-invalid'],
    answer: (api, { parameters, body }) => api.publish(parameters.id, body),
    dependsOn: (api, { parameters }) => api.proposal(parameters.id),
  }),
];
