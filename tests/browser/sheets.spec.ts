import AxeBuilder from '@axe-core/playwright';
import { expect, test, type BrowserContext, type Page } from '@playwright/test';
import { openClub, type Club } from './club.ts';
import { sheets, signIn, type Looker, type Sheet } from './sheets.ts';

const long = process.env['EARTHSTRAP_LONG'] === '1';
let club: Club;

test.beforeAll(async () => {
  club = await openClub();
});

test.afterAll(async () => {
  await club.close();
});

/** Keeps what the page complains of; a sheet that is meant to be missing may answer 404. */
function complaintsOf(page: Page): string[] {
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error' && !message.text().includes('404')) complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(error.message));
  return complaints;
}

async function widthOverflow(page: Page): Promise<number> {
  return page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
}

async function axeFindings(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
    .analyze();
  return violations.map((found) => `${found.id}: ${found.nodes.map((node) => node.target.join(' ')).slice(0, 5).join(', ')}`);
}

const lookers: readonly Looker[] = ['visitor', 'writer', 'moderator'];

async function open(context: BrowserContext, looker: Looker): Promise<{ page: Page; complaints: string[] }> {
  const page = await context.newPage();
  const complaints = complaintsOf(page);
  if (looker !== 'visitor') await signIn(page, club, looker);
  return { page, complaints };
}

function sheetsFor(looker: Looker): readonly Sheet[] {
  return sheets.filter((sheet) => sheet.looker === looker);
}

for (const looker of lookers) {
  test(`every sheet that a ${looker} sees is without console errors and axe findings, in light and dark`, async ({ browser }) => {
    test.setTimeout(long ? 3_600_000 : 900_000);
    const widths = long ? [360, 390, 768, 1280] : [1280];
    for (const width of widths) {
      const context = await browser.newContext({ viewport: { width, height: 900 }, reducedMotion: 'reduce' });
      const { page, complaints } = await open(context, looker);
      for (const sheet of sheetsFor(looker)) {
        await page.goto(club.origin + sheet.path);
        for (const colorScheme of ['light', 'dark'] as const) {
          await page.emulateMedia({ colorScheme });
          expect(await axeFindings(page), `${sheet.name}, ${String(width)} px, ${colorScheme}`).toEqual([]);
        }
        expect(complaints, sheet.name).toEqual([]);
      }
      await context.close();
    }
  });

  test(`no sheet that a ${looker} sees scrolls sideways at 360 px, with JavaScript or without`, async ({ browser }) => {
    test.setTimeout(600_000);
    for (const javaScriptEnabled of [true, false]) {
      const context = await browser.newContext({ viewport: { width: 360, height: 740 }, javaScriptEnabled });
      const { page, complaints } = await open(context, looker);
      for (const sheet of sheetsFor(looker)) {
        await page.goto(club.origin + sheet.path);
        await expect(page.locator('h1'), sheet.name).toHaveCount(1);
        if (javaScriptEnabled) expect(await widthOverflow(page), sheet.name).toBeLessThanOrEqual(0);
        else expect(await page.locator('main').innerText(), sheet.name).not.toBe('');
      }
      expect(complaints).toEqual([]);
      await context.close();
    }
  });
}
