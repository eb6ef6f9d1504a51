// @vitest-environment jsdom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, configure, render, screen, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { createMemoryRouter, RouterContextProvider, RouterProvider } from 'react-router';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { fakeApi, moderator, proposalSummary, proposalView, viewer } from '../../../tests/factories/desk.ts';
import type { Api } from '../../../shared/contracts/api.ts';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { problem } from '../../../shared/lib/problem.ts';
import { accept, refuse } from '../../../shared/lib/result.ts';
import { apiContext, queryClientContext } from '../../lib/api-context.ts';
import { ApiProvider } from '../../lib/use-api.ts';
import { proposalRoutes } from './routes.tsx';

/** Opens the sheet of a proposal, for a moderator unless somebody else is named. */
async function open(proposal: ProposalView, answers: Partial<Api> = {}, who = viewer('moderator', moderator)) {
  const api = fakeApi({
    viewer: async () => accept(who),
    proposal: async () => accept(proposal),
    proposals: async () =>
      accept({ proposals: [proposalSummary({ id: proposal.id }), proposalSummary({ id: 'p2', title: 'Quirks' })] }),
    ...answers,
  });
  const queryClient = new QueryClient();
  const context = new RouterContextProvider();
  context.set(apiContext, api);
  context.set(queryClientContext, queryClient);
  const router = createMemoryRouter([{ id: 'root', HydrateFallback: () => null, children: proposalRoutes }], {
    initialEntries: [`/proposals/${proposal.id}`],
    getContext: () => context,
  });
  render(
    <ApiProvider value={api}>
      <QueryClientProvider client={queryClient}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </ApiProvider>,
  );
  await screen.findByRole('heading', { level: 1 });
  return userEvent.setup();
}

const stop = {
  code: 'cavity-repeated',
  severity: 'stop',
  message: 'Cavity 3 stands twice.',
  line: 3,
  address: '#headlight.3',
} as const;

// A shared machine may take its time; what is waited for ends the waiting.
configure({ asyncUtilTimeout: 15_000 });

beforeEach(() => {
  // jsdom lays nothing out.
  Element.prototype.scrollIntoView = vi.fn();
  window.scrollTo = vi.fn();
});
afterEach(cleanup);

it('publishes the version that was read', async () => {
  const publish = vi.fn<Api['publish']>(async () => accept(proposalView({ state: 'published' })));
  const user = await open(proposalView(), { publish });
  await user.click(screen.getByRole('button', { name: 'Publish' }));
  expect(publish).toHaveBeenCalledWith('p1', { version: '1', overrides: [] });
});

it('asks for a reason beside each finding that stops it, and keeps what was typed where one is missing', async () => {
  const other = { ...stop, code: 'id-repeated', message: 'Two blocks have one name.', address: '#horn' };
  const missing = [{ code: other.code, address: other.address, message: other.message }];
  const refusal = problem('override-needed', 'Something stops it', 'Nothing was published.', { missing });
  const publish = vi.fn<Api['publish']>(async () => refuse(refusal));
  const user = await open(proposalView({ findings: [stop, other] }), { publish });
  const reason = screen.getByLabelText<HTMLTextAreaElement>('Why headlight.3 may be published all the same');
  await user.type(reason, 'Two looms');
  await user.click(screen.getByRole('button', { name: 'Publish' }));
  expect(publish).toHaveBeenCalledWith('p1', {
    version: '1',
    overrides: [{ code: 'cavity-repeated', address: '#headlight.3', reason: 'Two looms' }],
  });
  await screen.findByText('Give a reason, or send it back.');
  expect(document.activeElement).toBe(screen.getByLabelText('Why horn may be published all the same'));
  expect(reason.value).toBe('Two looms');
  expect(reason.getAttribute('aria-invalid')).toBeNull();
});

it('does not offer to publish what has fallen behind, nor what cannot be read', async () => {
  await open(proposalView({ fallenBehind: true, publishedRevision: 4, publishedMarkdown: 'Newer.' }));
  expect(screen.queryByRole('button', { name: 'Publish' })).toBeNull();
  expect(screen.getByText(/published anew meanwhile, and this would undo it/)).toBeDefined();
  expect(screen.getByRole('region', { name: 'What was published meanwhile' })).toBeDefined();
  cleanup();
  await open(proposalView({ findings: [{ ...stop, code: 'text-unread' }] }));
  expect(screen.queryByRole('button', { name: 'Publish' })).toBeNull();
});

it('says to an author who is a moderator that nobody decides on their own', async () => {
  const may = { revise: true, send: false, withdraw: true, note: true, decide: false };
  await open(proposalView({ may, author: moderator }));
  expect(screen.getByText(/Nobody decides on their own proposal/)).toBeDefined();
  for (const name of ['Publish', 'Send it back with this note', 'Decline it for this reason']) {
    expect(screen.queryByRole('button', { name })).toBeNull();
  }
});

it('lets an author start from what was published meanwhile', async () => {
  const may = { revise: true, send: false, withdraw: true, note: true, decide: false };
  const behind = { fallenBehind: true, publishedRevision: 4, publishedMarkdown: 'Newer.' } as const;
  await open(proposalView({ may, ...behind }), {}, viewer('member'));
  const link = screen.getByRole('link', { name: 'Start from revision 4, with my text beside it' });
  expect(link.getAttribute('href')).toBe('/proposals/p1/revise?from=published');
});

it('offers what waits next once this one is decided', async () => {
  await open(proposalView({ state: 'declined', may: { ...proposalView().may, decide: false, note: false } }));
  expect(screen.getByRole('link', { name: 'Next: Quirks' }).getAttribute('href')).toBe('/proposals/p2');
});

it('keeps a note that the book refuses, and says why at its field', async () => {
  const refusal = problem('fields-invalid', 'Something is missing', 'Mend it.', {
    fields: { note: 'Write a sentence first.' },
  });
  const user = await open(proposalView(), { sendBack: async () => refuse(refusal) });
  await user.click(screen.getByText('Send back'));
  await user.click(screen.getByRole('button', { name: 'Send it back with this note' }));
  await screen.findByText('Write a sentence first.');
  expect(document.activeElement).toBe(screen.getByLabelText('What its author should do'));
});

it('shows what was said, by whom, and of which line', async () => {
  const note = { author: moderator, kind: 'note', address: '#headlight.3', line: null } as const;
  const sent = { id: 'n1', text: 'Is it earth?', createdAt: '2026-05-03T10:00:00.000Z' };
  await open(proposalView({ notes: [{ ...note, ...sent }] }));
  const row = screen.getByText('Is it earth?').closest('li') ?? document.body;
  expect(row.textContent).toContain('Merle wrote on 3 May 2026, of headlight.3');
  expect(within(row).getByRole('link').getAttribute('href')).toContain('#headlight.3');
});
