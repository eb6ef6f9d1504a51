import type { Browser, Page } from '@playwright/test';
import { openClubAt } from '../browser/club.ts';
import { openBrowser, slowProcessor, visit } from './browser.ts';
import { requireMadeBook } from './made-book.ts';
import { longestMainThreadTask } from './main-thread-tasks.ts';
import { opened } from './opened.ts';
import type { Pace } from './pace.ts';
import { median, type BenchRow } from './row.ts';
import { milliseconds } from './side-by-side.ts';

const pagesOfBook = 1000;
const longestMilliseconds = 50;
const indexFile = /\/search\/[\w-]{22}\.json$/;
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

/** Waits for both files of the index, the lines and the prose. */
async function untilIndexCame(files: ReadonlySet<string>): Promise<void> {
  for (let attempt = 0; attempt < 600 && files.size < 2; attempt += 1) {
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  if (files.size < 2) throw new Error('the index was not fetched within a minute');
}

/** Milliseconds of the longest task of the page's own thread, from the field's focus until the last answer. */
function longestBlock(browser: Browser, url: string): Promise<number> {
  return visit(browser, async ({ page, devtools }) => {
    const files = new Set<string>();
    page.on('response', (response) => {
      if (indexFile.test(response.url())) files.add(response.url());
    });
    await devtools.send('Emulation.setCPUThrottlingRate', { rate: slowProcessor });
    await page.goto(url, { waitUntil: 'load' });
    const field = page.locator('input[role=combobox]').first();
    await field.waitFor();
    await browser.startTracing(page, { categories: ['toplevel', 'disabled-by-default-devtools.timeline'] });
    await field.focus();
    // While the lines, the titles and the prose arrive and are opened.
    for (const query of queries) await type(page, query);
    await untilIndexCame(files);
    await page.waitForTimeout(3000);
    // And when everything is there.
    for (const query of queries) await type(page, query);
    return longestMainThreadTask(await browser.stopTracing());
  });
}

/** How long the search keeps the page's own thread busy in one go. */
export function pageThreadRows({ visits }: Pace): Promise<BenchRow[]> {
  return opened(async (open) => {
    const club = await open(openClubAt(requireMadeBook(pagesOfBook)));
    const browser = await open(openBrowser());
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
  });
}
