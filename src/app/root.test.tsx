// @vitest-environment jsdom
import { cleanup, configure, render, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { createMemoryRouter, RouterContextProvider, RouterProvider } from 'react-router';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Api } from '../../shared/contracts/api.ts';
import type { Viewer } from '../../shared/contracts/views.ts';
import { problem } from '../../shared/lib/problem.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import { apiContext, benchContext, queryClientContext } from '../lib/api-context.ts';
import { readBench } from '../lib/bench.ts';
import { createQueryClient, Providers } from './providers.tsx';
import { routes } from './routes.tsx';

// A busy machine is slow, not wrong.
configure({ asyncUtilTimeout: 15_000 });

const visitor: Viewer = { member: null, waiting: 0 };
const donor = {
  shelf: 'donors',
  slug: 'qf550',
  title: 'QF-550',
  summary: 'An air-cooled four.',
  maker: null,
  model: null,
  years: '1980-1983',
  markets: ['UK'],
  pages: 2,
  connectors: 0,
  lines: 0,
  cited: 0,
  zones: [],
} as const;

function bookFor(viewer: Viewer): Api {
  const book: Partial<Api> = {
    viewer: async () => accept(viewer),
    home: async () =>
      accept({ shelves: [], donors: [{ ...donor, markets: [...donor.markets], zones: [] }], lately: [] }),
    shelf: async (shelf) => accept({ shelf, subjects: [] }),
    subject: async () => refuse(problem('not-found', 'No such donor is in the book', 'Look along the shelf.')),
    page: async () => refuse(problem('not-found', 'No such page is in the book', 'Look along the shelf.')),
  };
  return book as Api;
}

async function open(address: string, viewer = visitor) {
  const api = bookFor(viewer);
  const queryClient = createQueryClient();
  const router = createMemoryRouter(routes, {
    initialEntries: [address],
    getContext() {
      const context = new RouterContextProvider();
      context.set(apiContext, api);
      context.set(queryClientContext, queryClient);
      context.set(benchContext, readBench(document.cookie));
      return context;
    },
  });
  // In the browser the server has loaded the first sheet.
  await waitFor(() => expect(router.state.initialized).toBe(true));
  render(
    <Providers api={api} queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return { router, user: userEvent.setup() };
}

beforeEach(() => {
  // jsdom lays nothing out, and asks no device.
  window.scrollTo = vi.fn();
  window.matchMedia = vi.fn().mockReturnValue({ matches: false });
});

afterEach(() => {
  cleanup();
  for (const name of ['bench', 'variant', 'face']) document.cookie = `${name}=; Max-Age=0; Path=/`;
});

describe('the bench rail', () => {
  it('leads to a shelf, names the page after it and puts the focus on its title', async () => {
    const { user } = await open('/');
    await screen.findByRole('heading', { level: 1, name: 'What is on your bench?' });
    const [places] = screen.getAllByRole('link', { name: 'Donors' });
    if (places === undefined) throw new Error('no way to the donors');
    await user.click(places);
    const title = await screen.findByRole('heading', { level: 1, name: 'Donors' });
    await waitFor(() => expect(document.activeElement).toBe(title));
    expect(document.title).toBe('Donors · Earthstrap');
    expect(window.scrollTo).toHaveBeenLastCalledWith(0, 0);
  });

  it('says how many proposals wait for who decides, and nothing of them to a visitor', async () => {
    const member = {
      id: 'i',
      name: 'Ines',
      email: 'ines@earthstrap.example',
      role: 'moderator',
      suspended: false,
    } as const;
    await open('/', { member, waiting: 1 });
    expect(await screen.findByRole('link', { name: '1 waits for you' })).toBeDefined();
    cleanup();
    await open('/');
    await screen.findByRole('heading', { level: 1 });
    expect(screen.queryByRole('link', { name: /wait/ })).toBeNull();
    expect(screen.getByRole('link', { name: 'Sign in' })).toBeDefined();
  });

  it('stays round a sheet that is not in the book', async () => {
    await open('/donors/nothing');
    expect(await screen.findByRole('heading', { level: 1, name: 'No such donor is in the book' })).toBeDefined();
    expect(screen.getAllByRole('search').length).toBeGreaterThan(1);
  });
});

describe('the bench', () => {
  it('takes a donor in the browser, where no server answers, and shows it on the first sheet', async () => {
    const { user } = await open('/');
    await user.selectOptions(await screen.findByRole('combobox', { name: 'Donor' }), 'qf550');
    await user.click(screen.getByRole('button', { name: 'Put it on the bench' }));
    expect(await screen.findByRole('link', { name: 'Open its pages' })).toBeDefined();
    expect(readBench(document.cookie).donor).toBe('qf550');
  });
});

describe('the choice of a face', () => {
  it('changes the sheet at once and is kept', async () => {
    const { user } = await open('/');
    await user.click(await screen.findByRole('button', { name: 'Garage' }));
    await waitFor(() => expect(document.documentElement.dataset['face']).toBe('garage'));
    expect(document.cookie).toContain('face=garage');
    expect(screen.getByRole('button', { name: 'Garage' }).getAttribute('aria-pressed')).toBe('true');
    await user.click(screen.getByRole('button', { name: 'As the system' }));
    await waitFor(() => expect(document.documentElement.dataset['face']).toBeUndefined());
    expect(document.cookie).not.toContain('face=');
  });
});
