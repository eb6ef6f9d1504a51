import type { Browser, Page } from '@playwright/test';
import { openClubAt } from '../browser/club.ts';
import { openBrowser, slowProcessor, visit } from './browser.ts';
import { requireMadeBook } from './made-book.ts';
import { longestMainThreadTask } from './main-thread-tasks.ts';
import type { Pace } from './pace.ts';
import { median, type BenchRow } from './row.ts';
import { milliseconds } from './side-by-side.ts';

const pagesOfBook = 1000;
const longestMilliseconds = 50;
const keyMilliseconds = 90;
const queries = ['y/r headlight', 'dip beam earth', 'igniter pickup'];

/** Types as somebody who knows the keys does, and waits for what is answered. */
async function type(page: Page, query: string): Promise<void> {
  const field = page.locator('input[role=combobox]').first();
  await field.fill('');
  await field.pressSequentially(query, { delay: keyMilliseconds });
  await page.locator('[role=option]').first().waitFor();
  await page.waitForTimeout(300);
}

/** Milliseconds of the longest task of the page's own thread, from the field's focus until the last answer. */
function longestBlock(browser: Browser, url: string): Promise<number> {
  return visit(browser, async ({ page, devtools }) => {
    await devtools.send('Emulation.setCPUThrottlingRate', { rate: slowProcessor });
    await page.goto(url, { waitUntil: 'load' });
    const field = page.locator('input[role=combobox]').first();
    await field.waitFor();
    await page.waitForTimeout(500);
    const files = [/manifest\.json/, /search\/[\w-]{22}\.json/].map((name) => page.waitForResponse(name));
    await browser.startTracing(page, { categories: ['toplevel', 'disabled-by-default-devtools.timeline'] });
    await field.focus();
    // While the lines, the titles and the prose arrive and are opened.
    for (const query of queries) await type(page, query);
    await Promise.all(files);
    await page.waitForTimeout(3000);
    // And when everything is there.
    for (const query of queries) await type(page, query);
    return longestMainThreadTask(await browser.stopTracing());
  });
}

/** How long the search keeps the page's own thread busy in one go. */
export async function pageThreadRows({ visits }: Pace): Promise<BenchRow[]> {
  const club = await openClubAt(requireMadeBook(pagesOfBook));
  const browser = await openBrowser();
  try {
    const blocks: number[] = [];
    for (let round = 0; round < visits; round += 1) blocks.push(await longestBlock(browser, `${club.origin}/`));
    return [
      {
        what: "longest block of the page's thread while the index of 1,000 pages loads and while typing, CPU slowed 4 times",
        beside: `${String(longestMilliseconds)} ms`,
        measured: milliseconds(median(blocks)),
        yardstick: milliseconds(longestMilliseconds),
        ratio: median(blocks) / longestMilliseconds,
        budget: { kind: 'at most', ratio: 1 },
      },
    ];
  } finally {
    await browser.close();
    await club.close();
  }
}
