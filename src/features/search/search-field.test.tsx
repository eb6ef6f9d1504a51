// @vitest-environment jsdom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider, useLocation } from 'react-router';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import type { Api } from '../../../shared/contracts/api.ts';
import type { SearchHit, SearchView } from '../../../shared/contracts/views.ts';
import { accept } from '../../../shared/lib/result.ts';
import { ApiProvider } from '../../lib/use-api.ts';
import { SearchField } from './search-field.tsx';

const line: SearchHit = {
  kind: 'line',
  address: 'donors/testbike/pinouts#headlight.2',
  path: '/donors/testbike/pinouts#headlight.2',
  title: 'Headlight, cavity 2: Main beam',
  subjectTitle: 'Testbike 100',
  excerpt: 'Pinouts',
  mark: 'cited',
  line: {
    where: 'Headlight, cavity 2',
    colour: 'Y/R',
    colourWords: 'yellow, red tracer',
    size: '0.85 mm²',
    circuit: 'Main beam',
    goesTo: 'dip-switch.HI',
    applies: null,
    appliesHere: true,
    hazard: { signal: 'caution', text: 'Try every lamp before the road.' },
    wireSvg: '<svg></svg>',
    faceSvg: null,
  },
};
const section: SearchHit = {
  ...line,
  kind: 'section',
  address: 'a',
  path: '/donors/testbike/quirks#s-beams',
  title: 'Beams',
  excerpt: 'Yellow it is.',
  line: null,
};
const view: SearchView = { query: 'yellow', hits: [line, section], remarks: [], bench: null };

/** The server answers; the index never comes, for jsdom has no workers. */
beforeEach(() => {
  vi.stubGlobal(
    'Worker',
    class {
      postMessage(): void {}
      addEventListener(): void {}
    },
  );
  vi.stubGlobal('fetch', () => Promise.reject(new Error('no network in this test')));
  Element.prototype.scrollIntoView = () => undefined;
});

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function Here() {
  const { pathname, search, hash } = useLocation();
  return <p data-testid="here">{pathname + search + hash}</p>;
}

function renderField(path = '/'): ReturnType<typeof userEvent.setup> {
  const api = { search: (query: string) => Promise.resolve(accept({ ...view, query })) } as unknown as Api;
  const place = (
    <>
      <SearchField placement="rail" />
      <Here />
    </>
  );
  const router = createMemoryRouter([{ path: '*', element: place }], { initialEntries: [path] });
  render(
    <ApiProvider value={api}>
      <QueryClientProvider client={new QueryClient()}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </ApiProvider>,
  );
  return userEvent.setup();
}

const here = (): string | null => screen.getByTestId('here').textContent;

test('shows the likeliest answers as one types: the line itself with its wire and its signal word', async () => {
  const user = renderField();
  const field = screen.getByRole('combobox', { name: 'Search the book' });
  expect(field.getAttribute('aria-expanded')).toBe('false');
  await user.type(field, 'yellow');
  const options = await screen.findAllByRole('option');
  expect(field.getAttribute('aria-expanded')).toBe('true');
  expect(options).toHaveLength(3);
  expect(options[0]?.textContent).toContain('Y/R');
  expect(options[0]?.textContent).toContain('yellow, red tracer');
  expect(options[0]?.textContent).toContain('caution');
  expect(options[1]?.textContent).toContain('Yellow it is.');
});

test('arrows move through the answers and back to the field, and Enter opens the one that is chosen', async () => {
  const user = renderField();
  const field = screen.getByRole('combobox');
  await user.type(field, 'yellow');
  await screen.findAllByRole('option');
  const chosen = (): string[] => screen.getAllByRole('option', { selected: true }).map(({ id }) => id);
  await user.keyboard('{ArrowDown}{ArrowDown}');
  expect(chosen()).toEqual([field.getAttribute('aria-activedescendant')]);
  await user.keyboard('{ArrowUp}{ArrowUp}');
  expect(screen.queryAllByRole('option', { selected: true })).toEqual([]);
  expect(field.hasAttribute('aria-activedescendant')).toBe(false);
  await user.keyboard('{ArrowDown}{Enter}');
  await waitFor(() => expect(here()).toBe('/donors/testbike/pinouts#headlight.2'));
});

test('Enter with none chosen, and the last option, lead to all answers', async () => {
  const user = renderField();
  await user.type(screen.getByRole('combobox'), 'yellow red{Enter}');
  await waitFor(() => expect(here()).toBe('/search?q=yellow%20red'));
});

test('Escape closes the list and keeps what was typed', async () => {
  const user = renderField();
  const field = screen.getByRole('combobox');
  await user.type(field, 'yellow');
  await screen.findAllByRole('option');
  await user.keyboard('{Escape}');
  expect(screen.queryAllByRole('option')).toEqual([]);
  expect(field).toHaveProperty('value', 'yellow');
});

test('a click on an answer opens it', async () => {
  const user = renderField();
  await user.type(screen.getByRole('combobox'), 'yellow');
  await user.click((await screen.findAllByRole('option'))[1] ?? document.body);
  await waitFor(() => expect(here()).toBe('/donors/testbike/quirks#s-beams'));
});

test('stands aside on the search sheet, which has a field of its own', () => {
  renderField('/search?q=yellow');
  expect(screen.queryByRole('combobox')).toBeNull();
});
