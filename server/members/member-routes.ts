import { passwordBodySchema, signInBodySchema } from '../../shared/contracts/bodies.ts';
import { viewerSchema } from '../../shared/contracts/views.ts';
import { defineRoute } from '../http/route.ts';

/** Who is signed in, signing in and out, and one's own password. */
export const memberRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/session',
    name: 'viewer',
    summary: 'Who is signed in, and how many proposals wait for them',
    view: viewerSchema,
    answer: (api) => api.viewer(),
  }),
  defineRoute({
    method: 'post',
    path: '/api/session',
    name: 'signIn',
    summary: 'Sign in: gives the member, and a cookie',
    body: signInBodySchema,
    view: viewerSchema,
    problems: ['sign-in-failed', 'fields-invalid', 'not-allowed', 'too-many-requests'],
    answer: (api, { body }) => api.signIn(body),
  }),
  defineRoute({
    method: 'delete',
    path: '/api/session',
    name: 'signOut',
    summary: 'Sign out',
    status: 204,
    view: null,
    answer: (api) => api.signOut(),
  }),
  defineRoute({
    method: 'put',
    path: '/api/account/password',
    name: 'changePassword',
    summary: "Change one's own password; one's other browsers are signed out",
    body: passwordBodySchema,
    status: 204,
    view: null,
    problems: ['sign-in-needed', 'fields-invalid', 'too-many-requests'],
    answer: (api, { body }) => api.changePassword(body),
  }),
];
