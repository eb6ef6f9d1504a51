// @vitest-environment jsdom
import { isRouteErrorResponse, UNSAFE_ErrorResponseImpl as ErrorResponseImpl } from 'react-router';
import { beforeEach, describe, expect, it } from 'vitest';
import { problem } from '../../shared/lib/problem.ts';
import { readPageState, writePageState } from './page-state.ts';
import { createQueryClient } from './providers.tsx';

const html = '<p>It hides behind the <b>steering head</b>.</p>';
const page = { address: 'donors/qf550/pinouts', title: 'Pinouts', html };
const nothingLoaded = { loaderData: {}, actionData: null, errors: null };

/** Writes a state for a sheet's markup and reads it in a browser that has that markup. */
function carry(router: Parameters<typeof writePageState>[0], body: string, given: Readonly<Record<string, unknown>>) {
  const server = createQueryClient();
  for (const [key, value] of Object.entries(given)) server.setQueryData([key], value, { updatedAt: 1000 });
  const text = writePageState(router, server, body);
  document.body.innerHTML = body;
  const browser = createQueryClient();
  const hydration = readPageState(text, browser, document);
  return { text, browser, hydration };
}

beforeEach(() => {
  document.body.innerHTML = '';
});

describe('the state of a page', () => {
  it('does not repeat the HTML that stands in the markup, and finds it there again', () => {
    const { text, browser } = carry(nothingLoaded, `<div data-html-of="${page.address}">${html}</div>`, { page });
    expect(text).not.toContain('steering head');
    expect(browser.getQueryData(['page'])).toEqual(page);
  });

  it('does so for a proposal by its id, too', () => {
    const proposal = { id: 'p7', html };
    const { text, browser } = carry(nothingLoaded, `<div data-html-of="p7">${html}</div>`, { proposal });
    expect(text).not.toContain('steering head');
    expect(browser.getQueryData(['proposal'])).toEqual(proposal);
  });

  it('carries HTML that no element of the sheet shows', () => {
    const { browser } = carry(nothingLoaded, '<p>another sheet</p>', { page });
    expect(browser.getQueryData(['page'])).toEqual(page);
  });

  it('counts as fresh, however long ago the sheet was kept', () => {
    const before = Date.now();
    const { browser } = carry(nothingLoaded, '', { page });
    expect(browser.getQueryState(['page'])?.dataUpdatedAt).toBeGreaterThanOrEqual(before);
  });

  it('ends no element, whatever a member wrote', () => {
    const { text, browser } = carry(nothingLoaded, '', { page: { title: '</script><!--<script>' } });
    expect(text).not.toContain('<');
    expect(browser.getQueryData(['page'])).toEqual({ title: '</script><!--<script>' });
  });

  it('carries a refusal whole, and of a surprise only that there was one', () => {
    const refusal = problem('not-found', 'No such page', 'Look along the shelf.');
    const errors = { page: new ErrorResponseImpl(404, '', refusal), root: new Error('no such table: pages') };
    const { text, hydration } = carry({ ...nothingLoaded, errors }, '', {});
    expect(text).not.toContain('no such table');
    const carried: unknown = hydration.errors?.['page'];
    expect(isRouteErrorResponse(carried) && carried.data).toEqual(refusal);
    expect(hydration.errors?.['root']).toBeInstanceOf(Error);
  });

  it('gives the router what loaders and actions gave', () => {
    const router = {
      loaderData: { root: null, page: { address: 'x' } },
      actionData: { page: { values: { text: 'typed' } } },
      errors: null,
    };
    const { hydration } = carry(router, '', {});
    expect(hydration).toEqual(router);
  });
});
