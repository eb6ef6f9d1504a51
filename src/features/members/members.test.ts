import { QueryClient } from '@tanstack/react-query';
import { createStaticHandler, RouterContextProvider } from 'react-router';
import { describe, expect, it, vi } from 'vitest';
import { fakeApi, viewer } from '../../../tests/factories/desk.ts';
import type { Api } from '../../../shared/contracts/api.ts';
import { problem } from '../../../shared/lib/problem.ts';
import { accept, refuse } from '../../../shared/lib/result.ts';
import { apiContext, benchContext, queryClientContext } from '../../lib/api-context.ts';
import { emptyBench } from '../../lib/bench.ts';
import { memberRoutes } from './routes.tsx';

const nobody: Api['viewer'] = async () => accept({ member: null, waiting: 0 });
const somebody: Api['viewer'] = async () => accept(viewer('member'));

/** Opens an address, or posts a form to it, as the server does. */
async function open(address: string, api: Partial<Api>, form?: Record<string, string>) {
  const requestContext = new RouterContextProvider();
  requestContext.set(apiContext, fakeApi(api));
  requestContext.set(queryClientContext, new QueryClient());
  requestContext.set(benchContext, emptyBench);
  const body = form === undefined ? {} : { method: 'POST', body: new URLSearchParams(form) };
  const handler = createStaticHandler(memberRoutes.map((route) => ({ ...route })));
  const context = await handler.query(new Request(`http://club.example${address}`, body), { requestContext });
  if (context instanceof Response) return { leadsTo: context.headers.get('location'), status: context.status };
  const [outcome] = Object.values(context.actionData ?? {});
  return { leadsTo: null, status: context.statusCode, outcome, loaded: Object.values(context.loaderData)[0] };
}

const credentials = { email: 'writer@earthstrap.example', password: 'bench-lamp-42' };

describe('signing in', () => {
  it.each([
    ['/donors/qf550/pinouts/propose?revision=2', '/donors/qf550/pinouts/propose?revision=2'],
    ['https://elsewhere.example/', '/'],
    ['//elsewhere.example/', '/'],
    ['/\\elsewhere.example', '/'],
    ['', '/'],
  ])('and going to %j leads to %s', async (next, leadsTo) => {
    const signIn = vi.fn<Api['signIn']>(async () => accept(viewer('member')));
    const answer = await open('/sign-in', { viewer: nobody, signIn }, { ...credentials, next });
    expect(signIn).toHaveBeenCalledWith(credentials);
    expect(answer.leadsTo).toBe(leadsTo);
  });

  it('keeps the e-mail address where it is refused, and never gives the password back', async () => {
    const refusal = problem('too-many-requests', 'Too many wrong passwords', 'Wait 4 seconds.', {
      retryAfterSeconds: 4,
    });
    const answer = await open('/sign-in', { viewer: nobody, signIn: async () => refuse(refusal) }, credentials);
    expect(answer).toMatchObject({ status: 429, outcome: { problem: refusal, values: { email: credentials.email } } });
    expect(JSON.stringify(answer)).not.toContain(credentials.password);
  });

  it('is not asked of who is signed in', async () => {
    expect(await open('/sign-in?next=/proposals', { viewer: somebody })).toMatchObject({ leadsTo: '/proposals' });
    expect(await open('/sign-in', { viewer: somebody })).toMatchObject({ leadsTo: '/account' });
  });
});

describe('signing out', () => {
  it('takes a post, and not a link that somebody else may have laid out', async () => {
    const signOut = vi.fn<Api['signOut']>(async () => accept(null));
    expect(await open('/sign-out', { signOut })).toMatchObject({ leadsTo: '/account' });
    expect(signOut).not.toHaveBeenCalled();
    expect(await open('/sign-out', { signOut }, {})).toMatchObject({ leadsTo: '/' });
    expect(signOut).toHaveBeenCalledOnce();
  });
});

describe('the account', () => {
  const proposals: Api['proposals'] = async () => accept({ proposals: [] });

  it('leads who is not signed in to signing in, and back', async () => {
    expect(await open('/account', { viewer: nobody })).toMatchObject({ leadsTo: '/sign-in?next=%2Faccount' });
  });

  it('refuses a new password that was written in two ways, and does not ask the book', async () => {
    const form = { current: 'bench-lamp-42', 'next-password': 'three words of mine', again: 'three words of mime' };
    const answer = await open('/account', { viewer: somebody, proposals }, form);
    expect(answer).toMatchObject({ status: 422, outcome: { problem: { code: 'fields-invalid' } } });
    expect(answer.outcome).toHaveProperty('problem.fields.again');
    expect(JSON.stringify(answer)).not.toContain('three words');
  });

  it('changes the password and says so on the sheet that comes next', async () => {
    const changePassword = vi.fn<Api['changePassword']>(async () => accept(null));
    const form = { current: 'bench-lamp-42', 'next-password': 'three words of mine', again: 'three words of mine' };
    const { leadsTo } = await open('/account', { viewer: somebody, proposals, changePassword }, form);
    expect(changePassword).toHaveBeenCalledWith({ current: 'bench-lamp-42', next: 'three words of mine' });
    expect(await open(leadsTo ?? '', { viewer: somebody, proposals })).toMatchObject({
      loaded: { passwordChanged: true },
    });
  });
});
