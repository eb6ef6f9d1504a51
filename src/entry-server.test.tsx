import { describe, expect, it, vi } from 'vitest';
import type { Api } from '../shared/contracts/api.ts';
import type { PageView, Viewer } from '../shared/contracts/views.ts';
import { problem } from '../shared/lib/problem.ts';
import { accept, refuse } from '../shared/lib/result.ts';
import { anyVariant, type Variant } from '../shared/pages/applicability.ts';
import { render, type Rendered, type RenderOptions } from './entry-server.tsx';

const wren = { id: 'wren', name: 'Wren' };
const visitor: Viewer = { member: null, waiting: 0 };
const moderator: Viewer = {
  member: { ...wren, email: 'wren@earthstrap.example', role: 'moderator', suspended: false },
  waiting: 2,
};

const pageHtml = '<h2 id="s-plug">Plug</h2><p>It hides behind the </script> head.</p>';

function pageView(variant: Variant): PageView {
  return {
    address: 'donors/qf550/pinouts',
    shelf: 'donors',
    subject: 'qf550',
    subjectTitle: 'QF-550',
    page: 'pinouts',
    title: 'Front </script> of the loom',
    kind: 'pinouts',
    summary: 'The headlight bucket.',
    revision: 3,
    newestRevision: 3,
    retired: false,
    publishedAt: '2026-05-03T18:00:00.000Z',
    author: wren,
    publishedBy: null,
    sources: [],
    facts: {
      maker: null,
      model: null,
      years: null,
      markets: [],
      voltage: null,
      ignition: null,
      charging: null,
      battery: null,
      earth: null,
    },
    applies: null,
    variant,
    choices: { years: { from: 1978, to: 1981 }, markets: [], frames: [] },
    outline: [],
    findings: [],
    overrides: [],
    lastRevisions: [],
    siblings: [],
    html: pageHtml,
  };
}

const notFound = problem('not-found', 'No such page is in the book', 'Look along the shelf.');

function bookFor(viewer: Viewer): Api {
  const book: Partial<Api> = {
    viewer: async () => accept(viewer),
    page: async ({ page }, variant) => (page === 'pinouts' ? accept(pageView(variant)) : refuse(notFound)),
    home: async () => {
      throw new Error('the store is shut');
    },
  };
  // What a test does not stock is a surprise, as a broken store would be.
  return new Proxy(book, {
    get: (held, name) => Reflect.get(held, name) ?? (() => Promise.reject(new Error(String(name)))),
  }) as Api;
}

async function ask(path: string, more: Partial<RenderOptions> & RequestInit = {}): Promise<Rendered> {
  const { api = bookFor(visitor), variant = anyVariant, bench = null, onError, ...init } = more;
  return render(new Request(`http://127.0.0.1:3000${path}`, init), {
    api,
    variant,
    bench,
    ...(onError === undefined ? {} : { onError }),
  });
}

async function askPage(path: string, more: Partial<RenderOptions> = {}) {
  const rendered = await ask(path, more);
  if (rendered.kind !== 'page') throw new Error(`answered with ${String(rendered.response.status)}`);
  return rendered;
}

describe('a page on the server', () => {
  it('is the sheet with its text, its title in the head and its own address', async () => {
    const page = await askPage('/donors/qf550/pinouts?year=1980');
    expect(page.status).toBe(200);
    expect(page.head).toContain('<title>Front &lt;/script&gt; of the loom · Pinouts · QF-550 · Earthstrap</title>');
    expect(page.head).toContain('<link rel="canonical" href="/donors/qf550/pinouts"/>');
    expect(page.body).not.toContain('<title>');
    expect(page.body).toContain(pageHtml);
    expect(page.body).toContain('Shown for 1980');
    expect(page.body).toContain('3 May 2026');
  });

  it('leaves a state that runs nothing, ends no element and does not repeat the text', async () => {
    const { state } = await askPage('/donors/qf550/pinouts');
    expect(state.startsWith('<script type="application/json" id="state">')).toBe(true);
    expect(state.match(/<\/?script/g)).toEqual(['<script', '</script']);
    expect(state).not.toContain('It hides behind');
  });

  it('may be kept for visitors and never for a member', async () => {
    expect(await askPage('/donors/qf550/pinouts')).toMatchObject({ keepable: true });
    const forMember = await askPage('/donors/qf550/pinouts', { api: bookFor(moderator) });
    expect(forMember.keepable).toBe(false);
    expect(forMember.body).toContain('2 wait for you');
  });

  it('is shown for the bike on the bench only where it is of that bike', async () => {
    const variant = { ...anyVariant, year: 1980 };
    expect((await askPage('/donors/qf550/pinouts', { variant, bench: 'qf550' })).body).toContain('Shown for 1980');
    expect((await askPage('/donors/qf550/pinouts', { variant, bench: 'kestova-360' })).body).toContain(
      'Which one is yours?',
    );
  });

  it('has one address where it is an overview', async () => {
    const rendered = await ask('/donors/qf550/overview?year=1980');
    if (rendered.kind !== 'response') throw new Error('answered with a page');
    expect(rendered.response.status).toBe(301);
    expect(rendered.response.headers.get('location')).toBe('/donors/qf550?year=1980');
  });
});

describe('a refusal on the server', () => {
  it.each([
    '/donors/qf550/nothing',
    '/nowhere/at/all/here',
    '/donors/QF550/pinouts',
    '/donors/qf550/pinouts/revisions/x',
  ])('of %s is a sheet with its status that offers the search and is not kept', async (path) => {
    const page = await askPage(path);
    expect(page).toMatchObject({ status: 404, keepable: false });
    expect(page.head).toContain('noindex');
    expect(page.body).toContain('role="search"');
  });

  it('says what the book said', async () => {
    expect((await askPage('/donors/qf550/nothing')).body).toContain(notFound.title);
  });

  it('tells the log of a surprise, and the reader only that there was one', async () => {
    const onError = vi.fn();
    const page = await askPage('/', { onError });
    expect(page.status).toBe(500);
    expect(onError).toHaveBeenCalledWith(expect.objectContaining({ message: 'the store is shut' }));
    expect(page.head + page.body + page.state).not.toContain('the store is shut');
    expect(page.body).toContain('Something broke on our side');
  });
});

describe('the bench form on the server', () => {
  async function put(fields: Record<string, string>): Promise<Response> {
    const rendered = await ask('/bench', { method: 'POST', body: new URLSearchParams(fields) });
    if (rendered.kind !== 'response') throw new Error('answered with a page');
    return rendered.response;
  }

  it('keeps the bike in cookies and goes back with it in the address', async () => {
    const response = await put({ donor: 'qf550', year: '1980', market: 'UK', next: '/donors/qf550/pinouts' });
    expect(response.status).toBe(302);
    expect(response.headers.get('location')).toBe('/donors/qf550/pinouts?year=1980&market=UK');
    expect(response.headers.getSetCookie().map((cookie) => cookie.split(';')[0])).toEqual([
      'bench=qf550',
      'variant=year%3D1980%26market%3DUK',
    ]);
  });

  it('is cleared without a donor, and leads to no other site', async () => {
    const response = await put({ donor: '', next: 'https://elsewhere.example/' });
    expect(response.headers.get('location')).toBe('/bench');
    expect(response.headers.getSetCookie().every((cookie) => cookie.includes('Max-Age=0'))).toBe(true);
  });
});
