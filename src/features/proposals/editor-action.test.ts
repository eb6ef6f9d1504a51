import { QueryClient } from '@tanstack/react-query';
import { createStaticHandler, RouterContextProvider } from 'react-router';
import { describe, expect, it, vi } from 'vitest';
import { fakeApi, proposalView, viewer } from '../../../tests/factories/desk.ts';
import type { Api } from '../../../shared/contracts/api.ts';
import type { ProposeBody } from '../../../shared/contracts/bodies.ts';
import { problem } from '../../../shared/lib/problem.ts';
import { accept, refuse } from '../../../shared/lib/result.ts';
import { apiContext, queryClientContext } from '../../lib/api-context.ts';
import { editorAction, type EditorOutcome } from './editor-action.ts';

const markdown = '---\ntitle: Front connectors\n---\nTyped.\n';
const typed = {
  shelf: 'donors',
  subject: 'qf550',
  page: 'pinouts',
  'base-revision': '3',
  // As a form without a script sends it.
  markdown: markdown.replaceAll('\n', '\r\n'),
  summary: 'Cavity 3 is earth',
  'kept-as': 'key',
};

/** Posts the editor's form, as the server does it for a browser without a script. */
async function post(api: Partial<Api>, fields: Record<string, string>, address = '/edit') {
  const requestContext = new RouterContextProvider();
  requestContext.set(apiContext, fakeApi(api));
  requestContext.set(queryClientContext, new QueryClient());
  const handler = createStaticHandler([{ path: '/edit', id: 'edit', action: editorAction }]);
  const request = new Request(`http://club.example${address}`, {
    method: 'POST',
    body: new URLSearchParams({ ...typed, ...fields }),
  });
  const context = await handler.query(request, { requestContext });
  if (context instanceof Response) return { response: context, outcome: null, status: context.status };
  const outcome: EditorOutcome | null = context.actionData?.['edit'] ?? null;
  return { response: null, outcome, status: context.statusCode };
}

const signedOut = problem('sign-in-needed', 'Sign in first', 'Proposals are made by members.');
const wrongKind = problem('not-acceptable-text', 'Only a subject’s first page is an overview', 'The text is kept.');

describe('keeping a draft', () => {
  it('proposes what was typed, with the book’s own line ends, and leads to the proposal', async () => {
    const propose = vi.fn<Api['propose']>(async () => accept(proposalView()));
    const { response } = await post({ propose }, { do: 'keep' });
    expect(propose).toHaveBeenCalledWith({
      shelf: 'donors',
      subject: 'qf550',
      page: 'pinouts',
      baseRevision: 3,
      markdown,
      summary: 'Cavity 3 is earth',
    });
    expect(response?.headers.get('location')).toBe('/proposals/p1');
  });

  it('gives back every field with what the book says of it', async () => {
    const refusal = problem('fields-invalid', 'Something is missing', 'Mend it.', { fields: { summary: 'Say what.' } });
    const { outcome, status } = await post({ propose: async () => refuse(refusal) }, { do: 'keep', summary: '' });
    expect(status).toBe(422);
    expect(outcome).toMatchObject({ problem: refusal, values: { markdown, summary: '', baseRevision: 3 } });
  });

  it('says of an address that is taken where the address is written', async () => {
    const refusal = problem('already-there', 'There is already a page at /donors/qf550/pinouts', 'Your text is kept.');
    const { outcome } = await post({ propose: async () => refuse(refusal) }, { do: 'keep', 'base-revision': '' });
    expect(outcome?.problem?.fields).toEqual({
      page: 'There is already a page at /donors/qf550/pinouts. Choose another.',
    });
  });
});

describe('a new subject', () => {
  const blank = { do: 'keep', subject: '', page: 'overview', 'base-revision': '' };

  it('gets its address from the title in the text where nobody wrote another', async () => {
    const asked: ProposeBody[] = [];
    const propose: Api['propose'] = async (body) => {
      asked.push(body);
      return accept(proposalView());
    };
    await post({ propose }, blank);
    await post({ propose }, { ...blank, subject: 'my-own' });
    expect(asked.map(({ subject, baseRevision }) => [subject, baseRevision])).toEqual([
      ['front-connectors', null],
      ['my-own', null],
    ]);
  });

  it('asks for a title while the skeleton’s stands there, and asks the book for nothing', async () => {
    const { outcome, status } = await post({}, { ...blank, placeholder: 'Front connectors' });
    expect(status).toBe(422);
    expect(outcome?.problem?.fields).toHaveProperty('subject');
    expect(outcome?.values.markdown).toBe(markdown);
  });
});

describe('sending to the moderators', () => {
  it('keeps it and sends it', async () => {
    const send = vi.fn<Api['send']>(async () => accept(proposalView()));
    const { response } = await post({ propose: async () => accept(proposalView({ id: 'p7' })), send }, { do: 'send' });
    expect(send).toHaveBeenCalledWith('p7');
    expect(response?.status).toBe(302);
  });

  it('goes on with the draft that it made where sending was refused, and makes no second one', async () => {
    const api = { propose: async () => accept(proposalView({ id: 'p7' })), send: async () => refuse(wrongKind) };
    const { outcome } = await post(api, { do: 'send' });
    expect(outcome).toMatchObject({ problem: wrongKind, values: { proposal: 'p7', markdown } });

    const addVersion = vi.fn<Api['addVersion']>(async () => accept(proposalView({ id: 'p7' })));
    await post({ addVersion, send: async () => accept(proposalView()) }, { do: 'send', proposal: 'p7' });
    expect(addVersion).toHaveBeenCalledWith('p7', { markdown, summary: 'Cavity 3 is earth', baseRevision: 3 });
  });

  it('does not send anew what waits already: the further text is sent by being written', async () => {
    const addVersion = vi.fn<Api['addVersion']>(async () => accept(proposalView()));
    const { response } = await post({ addVersion }, { do: 'send', proposal: 'p1', waiting: 'true' });
    expect(response?.headers.get('location')).toBe('/proposals/p1');
  });
});

describe('looking a text over', () => {
  it('shows the page and keeps nothing', async () => {
    const view = { html: '<p>Typed.</p>', outline: [], blocks: [], findings: [] };
    const preview = vi.fn<Api['preview']>(async () => accept(view));
    const { outcome, status } = await post({ preview }, { do: 'look' });
    expect(preview).toHaveBeenCalledWith({ markdown, shelf: 'donors', subject: 'qf550', page: 'pinouts' });
    expect(status).toBe(200);
    expect(outcome).toMatchObject({ problem: null, preview: { ...view, id: 'preview' }, values: { markdown } });
  });

  it('is all that a form does that says nothing else', async () => {
    const { outcome } = await post({ preview: async () => refuse(wrongKind) }, {});
    expect(outcome).toMatchObject({ problem: wrongKind, preview: null, values: { markdown } });
  });
});

describe('a session that ended while somebody wrote', () => {
  it('gives the text back and asks who they are', async () => {
    const { outcome, status } = await post({ propose: async () => refuse(signedOut) }, { do: 'send' });
    expect(status).toBe(401);
    expect(outcome).toMatchObject({ needsSignIn: true, values: { markdown, summary: 'Cavity 3 is earth' } });
  });

  const credentials = { do: 'keep', email: 'writer@earthstrap.example', password: 'bench-lamp-42' };
  const nobody = async () => accept({ member: null, waiting: 0 });

  it('goes on with the same text once they have signed in', async () => {
    let signedIn = false;
    const api: Partial<Api> = {
      viewer: async () => (signedIn ? accept(viewer('member')) : nobody()),
      signIn: async () => {
        signedIn = true;
        return accept(viewer('member'));
      },
      propose: async () => accept(proposalView()),
    };
    const { response } = await post(api, credentials);
    expect(response?.headers.get('location')).toBe('/proposals/p1');
  });

  it('has the browser send the form once more where the door lets them in with the next request only', async () => {
    const api = { viewer: nobody, signIn: async () => accept(viewer('member')) };
    const { response } = await post(api, credentials, '/edit?kind=notes');
    expect(response?.status).toBe(307);
    expect(response?.headers.get('location')).toBe('/edit?kind=notes&again=');
    // Where no cookie is kept that would go on for ever.
    const { outcome } = await post({ ...api, propose: async () => refuse(signedOut) }, credentials, '/edit?again=');
    expect(outcome).toMatchObject({ needsSignIn: true, values: { markdown } });
  });

  it('keeps the text through a wrong password, and never gives the password back', async () => {
    const refusal = problem('sign-in-failed', 'That did not sign you in', 'Try again.');
    const { outcome } = await post({ viewer: nobody, signIn: async () => refuse(refusal) }, credentials);
    expect(outcome).toMatchObject({ needsSignIn: true, problem: refusal, values: { markdown } });
    expect(JSON.stringify(outcome)).not.toContain('bench-lamp-42');
  });
});
