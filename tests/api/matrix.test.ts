import { describe, expect, test } from 'vitest';
import { apiRoutes } from '../../server/http/api-router.ts';
import type { Member } from '../../shared/members/member.ts';
import { accepted, testbike } from '../factories/book.ts';
import { openHttpClub, sendJson, testPassword, type HttpClub } from '../factories/http-club.ts';
import { connectorBlock, pageText } from '../factories/page-texts.ts';
import { matrix } from './matrix-table.ts';

const askers = ['visitor', 'closed', 'member', 'author', 'moderator', 'admin'] as const;
type AskerName = (typeof askers)[number];

const changed = pageText({ body: connectorBlock('headlight', 'L/W') });
const change = { ...testbike.pinouts, baseRevision: 1, markdown: changed, summary: 'Main beam is blue.' };
const page = '/api/pages/donors/testbike-500/pinouts';

/** A proposal of this author that waits, or that was sent back to them. */
async function proposalOf({ context }: HttpClub, author: Member, moderator: Member, sentBack = false): Promise<string> {
  const { proposals } = context.services;
  const { id } = accepted(await proposals.propose(author, change));
  accepted(await proposals.send(author, id));
  if (sentBack) accepted(await proposals.sendBack(moderator, id, { note: 'Which manual?' }));
  return id;
}

interface Asked {
  readonly path: string;
  readonly init?: RequestInit;
}

/** How each call is asked, as it would succeed for somebody; what it is about is made anew for every asker. */
const requests: Readonly<Record<string, (club: HttpClub) => Asked | Promise<Asked>>> = {
  'GET /api/session': () => ({ path: '/api/session' }),
  'POST /api/session': ({ people }) => ({
    path: '/api/session',
    init: sendJson('POST', { email: people.hobbyist.email, password: testPassword }),
  }),
  'DELETE /api/session': () => ({ path: '/api/session', init: { method: 'DELETE' } }),
  'PUT /api/account/password': () => ({
    path: '/api/account/password',
    init: sendJson('PUT', { current: testPassword, next: testPassword }),
  }),
  'GET /api/home': () => ({ path: '/api/home' }),
  'GET /api/shelves/{shelf}': () => ({ path: '/api/shelves/donors' }),
  'GET /api/shelves/{shelf}/{subject}': () => ({ path: '/api/shelves/donors/testbike-500' }),
  'GET /api/pages/{shelf}/{subject}/{page}': () => ({ path: `${page}?year=1980&market=UK` }),
  'GET /api/pages/{shelf}/{subject}/{page}/view': () => ({ path: `${page}/view` }),
  'GET /api/pages/{shelf}/{subject}/{page}/revisions': () => ({ path: `${page}/revisions` }),
  'GET /api/pages/{shelf}/{subject}/{page}/revisions/{number}': () => ({ path: `${page}/revisions/1` }),
  'GET /api/pages/{shelf}/{subject}/{page}/compare': () => ({ path: `${page}/compare?from=1&to=1` }),
  'GET /api/search': () => ({ path: '/api/search?q=Y%2FR' }),
  'POST /api/preview': () => ({ path: '/api/preview', init: sendJson('POST', { markdown: changed }) }),
  'GET /api/start': () => ({ path: '/api/start?shelf=donors&subject=testbike-500&page=pinouts' }),
  'GET /api/proposals': () => ({ path: '/api/proposals?state=waiting' }),
  'POST /api/proposals': () => ({ path: '/api/proposals', init: sendJson('POST', change) }),
  'GET /api/proposals/{id}': async (club) => ({ path: await step(club, '') }),
  'POST /api/proposals/{id}/versions': async (club) => ({
    path: await step(club, '/versions', true),
    init: sendJson('POST', { markdown: changed, summary: 'Said better.', baseRevision: 1 }),
  }),
  'POST /api/proposals/{id}/notes': async (club) => ({
    path: await step(club, '/notes'),
    init: sendJson('POST', { text: 'Which manual?' }),
  }),
  'POST /api/proposals/{id}/send': async (club) => ({
    path: await step(club, '/send', true),
    init: { method: 'POST' },
  }),
  'POST /api/proposals/{id}/send-back': async (club) => ({
    path: await step(club, '/send-back'),
    init: sendJson('POST', { note: 'Which manual?' }),
  }),
  'POST /api/proposals/{id}/decline': async (club) => ({
    path: await step(club, '/decline'),
    init: sendJson('POST', { reason: 'It is not so on any bike we know.' }),
  }),
  'POST /api/proposals/{id}/withdraw': async (club) => ({
    path: await step(club, '/withdraw'),
    init: { method: 'POST' },
  }),
  'POST /api/proposals/{id}/publish': async (club) => ({
    path: await step(club, '/publish'),
    init: sendJson('POST', {}),
  }),
};

async function step(club: HttpClub, name: string, sentBack = false): Promise<string> {
  return `/api/proposals/${await proposalOf(club, club.people.writer, club.people.moderator, sentBack)}${name}`;
}

/** The table's rows: each call with a status for every asker. */
function readMatrix(): Map<string, readonly number[]> {
  const rows = new Map<string, readonly number[]>();
  for (const line of matrix.split('\n').slice(2)) {
    const [method, path, ...statuses] = line.split(/\s+/).filter((word) => word !== '');
    if (method !== undefined && path !== undefined) rows.set(`${method} ${path}`, statuses.map(Number));
  }
  return rows;
}

test('the table has every call, and no other', () => {
  const calls = apiRoutes.map(({ method, path }) => `${method.toUpperCase()} ${path}`);
  expect([...readMatrix().keys()].sort()).toEqual(calls.sort());
  for (const statuses of readMatrix().values()) expect(statuses).toHaveLength(askers.length);
});

describe('every call answers as the table says', () => {
  test.each(askers)('to: %s', async (name: AskerName) => {
    const club = await openHttpClub({ environment: name === 'closed' ? { READING: 'members' } : {} });
    const { hobbyist, writer, moderator, admin } = club.people;
    const people = { visitor: null, closed: null, member: hobbyist, author: writer, moderator, admin };
    const person = people[name];
    const openBrowser = () => (person === null ? club.openBrowser() : club.signedIn(person));
    let browser = await openBrowser();
    const at = askers.indexOf(name);
    const asked: Record<string, number> = {};
    const expected: Record<string, number> = {};
    for (const [call, statuses] of readMatrix()) {
      const { path, init } = (await requests[call]?.(club)) ?? { path: 'no request is written for this call' };
      asked[call] = (await browser(path, init)).status;
      expected[call] = statuses[at] ?? Number.NaN;
      if (call.includes('/session')) browser = await openBrowser();
    }
    expect(asked).toEqual(expected);
  });
});

test.each(['moderator', 'admin'] as const)('even the %s does not decide on their own proposal', async (name) => {
  const club = await openHttpClub();
  const person = club.people[name];
  const other = name === 'admin' ? club.people.moderator : club.people.admin;
  const browser = await club.signedIn(person);
  for (const [action, body] of [
    ['publish', {}],
    ['send-back', { note: 'Which manual?' }],
    ['decline', { reason: 'No.' }],
  ] as const) {
    const path = `/api/proposals/${await proposalOf(club, person, other)}/${action}`;
    expect((await browser(path, sendJson('POST', body))).status, action).toBe(403);
  }
});
