// @vitest-environment jsdom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, configure, render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { createMemoryRouter, RouterContextProvider, RouterProvider } from 'react-router';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { fakeApi, proposalView, startView, viewer } from '../../../tests/factories/desk.ts';
import type { Api } from '../../../shared/contracts/api.ts';
import type { PreviewView } from '../../../shared/contracts/views.ts';
import { problem } from '../../../shared/lib/problem.ts';
import { accept, refuse } from '../../../shared/lib/result.ts';
import { apiContext, queryClientContext } from '../../lib/api-context.ts';
import { viewerQuery } from '../../lib/queries.ts';
import { ApiProvider } from '../../lib/use-api.ts';
import { editorAction } from './editor-action.ts';
import { startOfProposal, type EditorStart } from './editor-start.ts';
import { Editor } from './editor.tsx';

const findings: PreviewView['findings'] = [
  { code: 'uncited', severity: 'hint', message: 'No source is named.', line: 2 },
  { code: 'cavity-outside-face', severity: 'stop', message: 'Cavity 9 is outside `headlight`.', line: 4 },
];

function open(
  answers: Partial<Api> = {},
  start: EditorStart = startOfProposal(startView(), false),
  taken: string[] = [],
) {
  const api = fakeApi({
    viewer: async () => accept(viewer('member')),
    preview: async () => accept({ html: '<p>As it will look</p>', outline: [], blocks: [], findings }),
    ...answers,
  });
  const queryClient = new QueryClient();
  queryClient.setQueryData(viewerQuery(api).queryKey, viewer('member'));
  const context = new RouterContextProvider();
  context.set(apiContext, api);
  context.set(queryClientContext, queryClient);
  const router = createMemoryRouter(
    [
      { path: '/edit', action: editorAction, element: <Editor start={start} taken={taken} /> },
      { path: '/proposals/:id', element: <p>The proposal’s sheet</p> },
    ],
    { initialEntries: ['/edit'], getContext: () => context },
  );
  const view = render(
    <ApiProvider value={api}>
      <QueryClientProvider client={queryClient}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </ApiProvider>,
  );
  return { user: userEvent.setup(), close: view.unmount };
}

const text = (): HTMLTextAreaElement => screen.getByLabelText('The page’s text');
const summary = (): HTMLInputElement => screen.getByLabelText('What did you change, and why?');

// A shared machine may take its time; what is waited for ends the waiting.
configure({ asyncUtilTimeout: 15_000 });

beforeEach(() => {
  localStorage.clear();
  // jsdom lays nothing out.
  Element.prototype.scrollIntoView = vi.fn();
});
afterEach(cleanup);

describe('what the book finds', () => {
  it('stands beside the text, what stops it first, and leads to the line in the text', async () => {
    const { user } = open();
    await screen.findByText('As it will look');
    const rows = screen.getAllByRole('listitem').map((row) => row.textContent);
    expect(rows[0]).toContain('Stops it: Cavity 9 is outside headlight.');
    expect(rows[1]).toContain('Hint: No source is named.');
    await user.click(screen.getByRole('button', { name: 'Go to line 4' }));
    expect(document.activeElement).toBe(text());
    expect(text().value.slice(text().selectionStart, text().selectionEnd)).toBe('As published.');
  });

  it('is where “Look it over” leads, without a post', async () => {
    const { user } = open();
    await user.click(screen.getByRole('button', { name: 'Look it over' }));
    expect(document.activeElement).toBe(screen.getByRole('heading', { name: 'What the book finds' }));
  });
});

describe('a text that was typed and never sent', () => {
  it('is offered to its writer after a reload, and taken back with its summary', async () => {
    const first = open();
    await first.user.clear(text());
    await first.user.type(text(), 'Typed in the garage');
    await first.user.type(summary(), 'Because');
    first.close();
    const { user } = open();
    expect(text().value).toContain('As published.');
    await user.click(screen.getByRole('button', { name: 'Take it back' }));
    expect(text().value).toBe('Typed in the garage');
    expect(summary().value).toBe('Because');
    expect(screen.queryByRole('button', { name: 'Take it back' })).toBeNull();
  });

  it('is not thrown away by typing on without an answer', async () => {
    const first = open();
    await first.user.type(text(), 'one');
    first.close();
    const second = open();
    await second.user.type(text(), 'two');
    second.close();
    open();
    expect(screen.getAllByRole('button', { name: 'Take it back' })).toHaveLength(2);
  });

  it('is not offered to anybody else', async () => {
    const first = open();
    await first.user.type(text(), 'mine');
    first.close();
    localStorage.setItem(
      localStorage.key(0) ?? '',
      (localStorage.getItem(localStorage.key(0) ?? '') ?? '').replaceAll('"memberId":"writer"', '"memberId":"other"'),
    );
    open();
    expect(screen.queryByRole('button', { name: 'Take it back' })).toBeNull();
  });

  it('is forgotten when the book has acknowledged it', async () => {
    const { user } = open({ propose: async () => accept(proposalView()) });
    await user.type(text(), 'more');
    await user.type(summary(), 'why');
    await user.click(screen.getByRole('button', { name: 'Keep as draft' }));
    await screen.findByText('The proposal’s sheet');
    expect(localStorage).toHaveLength(0);
  });

  it('stays, in the form and in the browser, where the book refuses it', async () => {
    const refusal = problem('fields-invalid', 'Something is missing', 'Mend it.', { fields: { summary: 'Say what.' } });
    const { user } = open({ propose: async () => refuse(refusal) });
    await user.type(text(), 'more');
    await user.click(screen.getByRole('button', { name: 'Send to the moderators' }));
    await waitFor(() => expect(document.activeElement).toBe(summary()));
    expect(summary().getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByText('Say what.')).toBeDefined();
    expect(text().value).toContain('more');
    expect(localStorage).toHaveLength(1);
  });
});

describe('a session that ended while somebody wrote', () => {
  it('asks who they are in the same form, and goes on', async () => {
    let signedIn = false;
    const { user } = open({
      viewer: async () => accept(signedIn ? viewer('member') : { member: null, waiting: 0 }),
      signIn: async () => {
        signedIn = true;
        return accept(viewer('member'));
      },
      propose: async () =>
        signedIn ? accept(proposalView()) : refuse(problem('sign-in-needed', 'Sign in first', 'Members propose.')),
    });
    await user.type(summary(), 'why');
    await user.click(screen.getByRole('button', { name: 'Keep as draft' }));
    await user.type(await screen.findByLabelText('Password'), 'bench-lamp-42');
    expect(screen.getByLabelText<HTMLInputElement>('E-mail address').value).toBe('writer@earthstrap.example');
    await user.click(screen.getByRole('button', { name: 'Keep as draft' }));
    await screen.findByText('The proposal’s sheet');
  });
});

describe('the address of a new donor', () => {
  const skeleton = startView({
    subject: null,
    page: 'overview',
    subjectTitle: null,
    baseRevision: null,
    markdown: '---\ntitle: Maker and model\n---\n',
  });

  it('follows the title in the text until another is written', async () => {
    const { user } = open({}, startOfProposal(skeleton, true), ['strand-650']);
    const address = (): HTMLInputElement => screen.getByLabelText('Address');
    expect(address().value).toBe('');
    await user.clear(text());
    await user.type(text(), '---\ntitle: Strand 650\n---\n');
    expect(address().value).toBe('strand-650');
    expect(screen.getByText(/a donor of this address already/)).toBeDefined();
    await user.clear(address());
    await user.type(address(), 'new');
    expect(screen.getByText(/uses “new” itself/)).toBeDefined();
    await user.type(address(), '-strand');
    await user.type(text(), 'More');
    expect(address().value).toBe('new-strand');
    expect(address().getAttribute('aria-invalid')).toBeNull();
  });
});
