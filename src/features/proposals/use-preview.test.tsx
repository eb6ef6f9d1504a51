// @vitest-environment jsdom
import { act, cleanup, renderHook } from '@testing-library/react';
import type { ReactNode } from 'react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { fakeApi } from '../../../tests/factories/desk.ts';
import type { Api } from '../../../shared/contracts/api.ts';
import type { PreviewView } from '../../../shared/contracts/views.ts';
import { problem } from '../../../shared/lib/problem.ts';
import { accept, refuse } from '../../../shared/lib/result.ts';
import { ApiProvider } from '../../lib/use-api.ts';
import { usePreview } from './use-preview.ts';

type Looked = Awaited<ReturnType<Api['preview']>>;

/** A book that answers a question when the test says so. */
function bookInNoHurry() {
  const asked: { markdown: string; answer: (looked: Looked) => Promise<void> }[] = [];
  const preview: Api['preview'] = ({ markdown }) =>
    new Promise((resolve) => {
      asked.push({ markdown, answer: (looked) => act(async () => resolve(looked)) });
    });
  return { asked, api: fakeApi({ preview }) };
}

function view(html: string): PreviewView {
  return { html, outline: [], blocks: [], findings: [] };
}

function type(api: Api) {
  return renderHook(({ markdown, typed }) => usePreview(() => ({ markdown }), typed, null), {
    initialProps: { markdown: 'first', typed: 0 },
    wrapper: ({ children }: { children: ReactNode }) => <ApiProvider value={api}>{children}</ApiProvider>,
  });
}

const rest = () => act(() => vi.advanceTimersByTimeAsync(400));

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

it('asks when the hands have rested, not at every key', async () => {
  const { asked, api } = bookInNoHurry();
  const { rerender } = type(api);
  rerender({ markdown: 'first k', typed: 1 });
  rerender({ markdown: 'first key', typed: 2 });
  expect(asked).toHaveLength(0);
  await rest();
  expect(asked.map(({ markdown }) => markdown)).toEqual(['first key']);
});

it('shows the answer to the last question, however late an earlier one comes', async () => {
  const { asked, api } = bookInNoHurry();
  const { rerender, result } = type(api);
  await rest();
  rerender({ markdown: 'second', typed: 1 });
  await rest();
  await asked[1]?.answer(accept(view('second')));
  await asked[0]?.answer(accept(view('first')));
  expect(result.current).toMatchObject({ read: { markdown: 'second', view: { html: 'second' } }, current: true });
});

it('keeps what was read last in sight while the next is read, and says that it is not the newest', async () => {
  const { asked, api } = bookInNoHurry();
  const { rerender, result } = type(api);
  await rest();
  await asked[0]?.answer(accept(view('first')));
  rerender({ markdown: 'second', typed: 1 });
  expect(result.current).toMatchObject({ read: { markdown: 'first' }, current: false, problem: null });
});

it('asks again by itself when the book was out of time or busy, as late as it was told', async () => {
  const { asked, api } = bookInNoHurry();
  const { result } = type(api);
  await rest();
  const rationed = problem('too-many-requests', 'Reading time is used up', 'Wait.', { retryAfterSeconds: 7 });
  await asked[0]?.answer(refuse(rationed));
  expect(result.current.problem).toBe(rationed);
  await act(() => vi.advanceTimersByTimeAsync(6_900));
  expect(asked).toHaveLength(1);
  await act(() => vi.advanceTimersByTimeAsync(200));
  expect(asked).toHaveLength(2);
  await asked[1]?.answer(accept(view('first')));
  expect(result.current).toMatchObject({ current: true, problem: null });
});

it('does not ask again for a text that cannot be read until it is changed', async () => {
  const { asked, api } = bookInNoHurry();
  const { result } = type(api);
  await rest();
  await asked[0]?.answer(refuse(problem('not-acceptable-text', 'The text cannot be read: line 3', 'Too deep.')));
  await act(() => vi.advanceTimersByTimeAsync(60_000));
  expect(asked).toHaveLength(1);
  expect(result.current).toMatchObject({ current: false, problem: { code: 'not-acceptable-text' } });
});
