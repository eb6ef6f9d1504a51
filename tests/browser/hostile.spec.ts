import { expect, test, type Page } from '@playwright/test';
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

/** What a page did that it should not have done. */
async function watch(page: Page, pages: readonly string[]): Promise<void> {
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
  for (const markdown of pages) {
    await page.setContent(`<!doctype html><title>quiet</title><main style="position:relative">${htmlOf(markdown)}</main>`);
    const seen = await page.evaluate(() => {
      const everything = [...document.querySelectorAll<HTMLElement>('main *')];
      for (const element of everything) {
        for (const kind of ['mouseover', 'focus', 'load', 'error']) element.dispatchEvent(new Event(kind));
      }
      const over = everything.filter((element) => getComputedStyle(element).position === 'fixed');
      return { title: document.title, over: over.length, frames: window.frames.length, polluted: 'polluted' in {} };
    });
    expect(seen, markdown).toEqual({ title: 'quiet', over: 0, frames: 0, polluted: false });
  }
  // A photograph of the book's own is the one thing that a page may ask for.
  expect(asked.filter((url) => !/\/photos\/[0-9a-f]{64}\.webp$/.test(url))).toEqual([]);
  expect(dialogs).toEqual([]);
  expect(complaints).toEqual([]);
}

/** Texts as pages of twenty, each text a paragraph. */
function inTwenties(texts: readonly string[]): readonly string[] {
  const pages: string[] = [];
  for (let at = 0; at < texts.length; at += 20) pages.push(texts.slice(at, at + 20).join('\n\n'));
  return pages;
}

test('what a member writes anywhere in a page runs nothing, opens no dialog and asks nobody for anything', async ({ page }) => {
  await watch(page, ownLines.map(pageEverywhere));
});

test('whole pages written to do harm run nothing, and neither do the published texts', async ({ page }) => {
  await watch(page, [...ownPages, ...inTwenties(ownLines), ...inTwenties(publishedLines)]);
});
