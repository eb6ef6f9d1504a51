import { expect, test } from '@playwright/test';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { ownLines, ownPages, pageEverywhere, publishedLines } from '../factories/hostile-pages.ts';

/*
 * Needs no server: each text is rendered as the book would and put into a blank page without any policy, so that only the
 * rendering stands between the text and the reader.
 */

function htmlOf(markdown: string): string {
  const page = readPage(markdown);
  return page.ok ? renderPage(page.value, { address: null, variant: anyVariant, marks: 'shown' }) : '';
}

const texts = [...ownLines.map(pageEverywhere), ...ownLines, ...ownPages, ...publishedLines.map(pageEverywhere)];

test('nothing that a member writes runs, opens a dialog, covers the page or asks another site for anything', async ({ page }) => {
  const asked: string[] = [];
  const dialogs: string[] = [];
  const complaints: string[] = [];
  await page.route('**/*', async (route) => {
    asked.push(route.request().url());
    await route.abort();
  });
  page.on('dialog', (dialog) => {
    dialogs.push(dialog.message());
    void dialog.dismiss();
  });
  page.on('pageerror', (error) => complaints.push(error.message));
  for (const text of texts) {
    await page.setContent(`<!doctype html><title>quiet</title><main style="position:relative;z-index:1">${htmlOf(text)}</main>`);
    const seen = await page.evaluate(() => {
      for (const element of document.querySelectorAll<HTMLElement>('main *')) {
        for (const kind of ['mouseover', 'focus', 'load', 'error', 'toggle', 'animationstart']) {
          element.dispatchEvent(new Event(kind));
        }
      }
      const over = [...document.querySelectorAll('main *')].filter((element) => getComputedStyle(element).position === 'fixed');
      return { title: document.title, over: over.length, frames: window.frames.length, polluted: 'polluted' in {} };
    });
    expect(seen, text).toEqual({ title: 'quiet', over: 0, frames: 0, polluted: false });
  }
  // A photograph of the book's own is the one thing that a page may ask for.
  expect(asked.filter((url) => !/\/photos\/[0-9a-f]{64}\.webp$/.test(url))).toEqual([]);
  expect(dialogs).toEqual([]);
  expect(complaints).toEqual([]);
});
