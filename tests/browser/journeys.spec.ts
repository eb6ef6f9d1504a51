import { expect as expectSoon, test, type Browser, type BrowserContext, type Page } from '@playwright/test';
import { openClub, type Club } from './club.ts';
import { signIn } from './sheets.ts';

/*
 * What people come for, from beginning to end, on a phone and at a table, with JavaScript and without: a wire found at
 * the bench, and a connector that a member adds, from its mistakes to somebody else's search.
 */

/** A shared machine may take its time; what is waited for ends the waiting. */
const expect = expectSoon.configure({ timeout: 20_000 });

interface Way {
  readonly width: number;
  readonly script: boolean;
}

const ways: readonly Way[] = [
  { width: 390, script: true },
  { width: 1280, script: true },
  { width: 390, script: false },
  { width: 1280, script: false },
];

/** A window of one person's own, and whatever it complains of. */
interface Desk {
  readonly context: BrowserContext;
  readonly page: Page;
  readonly complaints: string[];
}

async function sitDown(browser: Browser, { width, script }: Way): Promise<Desk> {
  const context = await browser.newContext({
    viewport: { width, height: 844 },
    javaScriptEnabled: script,
    reducedMotion: 'reduce',
  });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(`${page.url()}: ${message.text()}`);
  });
  page.on('pageerror', (error) => complaints.push(`${page.url()}: ${error.message}`));
  return { context, page, complaints };
}

/** Asks the book by the field of the sheet that one is on. */
async function ask(page: Page, question: string): Promise<void> {
  const field = page.locator('main input[name="q"]');
  await field.fill(question);
  await field.press('Enter');
  await page.waitForURL((url) => url.pathname === '/search' && url.searchParams.get('q') === question);
}

const donor = 'torimachi-qf550';
const frontPage = `/donors/${donor}/pinouts-front`;

/** A connector as somebody types it late in the evening: cavity 7 of six, and a colour that is none. */
const withMistakes = `
## Plug for warm hands

:::connector{#warm-hands name="Plug for warm hands" zone="headlight" layout="2x3" seen="wire side" first="top left" latch="top" contacts="sockets" cite="c1"}
| Cavity | Wire | mm² | Circuit |
| ------ | ---- | --- | ------- |
| 7 | Q/Z | 0.85 | Hand warmer |
:::
`;
const mended = withMistakes.replace('| 7 | Q/Z |', '| 6 | Lg/R |');
const answered = mended.replace('Hand warmer |', 'Hand warmer, switched |');
const question = 'light green red hand warmer';

function textField(page: Page) {
  return page.getByLabel('The page’s text');
}

/** Has a text looked over: by itself as it is typed, or by the button. */
async function lookOver(page: Page, { script }: Way, text: string): Promise<void> {
  await textField(page).fill(text);
  if (!script) await page.getByRole('button', { name: 'Look it over' }).click();
  await expect(page.locator('.editor-look')).toContainText('Of the text as it stands');
}

for (const way of ways) {
  const how = `${String(way.width)} px, ${way.script ? 'with' : 'without'} JavaScript`;

  test.describe(how, () => {
    let club: Club;
    test.beforeAll(async () => {
      club = await openClub();
    });
    test.afterAll(async () => {
      await club.close();
    });

    test('the hobbyist finds the yellow and red wire on the bike on the bench in two acts', async ({ browser }) => {
      test.setTimeout(180_000);
      const { context, page, complaints } = await sitDown(browser, way);
      await page.goto(`${club.origin}/bench`);
      await page.getByLabel('Donor').selectOption(donor);
      await page.getByRole('button', { name: 'Put it on the bench' }).click();
      await expect(page.getByRole('heading', { level: 1 })).toContainText('QF-550');
      await page.goto(club.origin);

      await ask(page, 'yellow red headlight');
      // The answer is there before anything is opened: the line, and the face with its cavity ringed.
      const answer = page.locator('.answer-line').first();
      await expect(answer).toContainText('Torimachi QF-550');
      await expect(answer).toContainText('Y/R');
      await expect(answer).toContainText('yellow, red tracer');
      await expect(answer.locator('svg .ringed')).not.toHaveCount(0);

      await answer.getByRole('link').first().click();
      await page.waitForURL((url) => url.pathname === frontPage && url.hash.startsWith('#headlight.2'));
      const line = page.locator('[data-line^="headlight.2~1980"]').first();
      await expect(line).toContainText('Main beam');
      await expect(line).toBeInViewport();
      // Ringed is what is drawn so, with the accent that nothing else on a face has.
      const face = page.locator('[data-connector="headlight"] .face-seen');
      const wall = face.locator('.seat[data-seat="2"] .seat-wall');
      const other = face.locator('.seat[data-seat="1"] .seat-wall');
      const accent = await page.locator('.rail-name .sign').evaluate((sign) => getComputedStyle(sign).color);
      await expect(wall).toHaveCSS('stroke', accent);
      await expect(other).not.toHaveCSS('stroke', accent);

      expect(complaints).toEqual([]);
      await context.close();
    });

    test('a connector that a member adds goes from its mistakes to everybody’s search', async ({ browser }) => {
      test.setTimeout(400_000);
      const [hobbyist, writer, moderator] = await Promise.all([1, 2, 3].map(() => sitDown(browser, way)));
      if (hobbyist === undefined || writer === undefined || moderator === undefined) throw new Error('three sit down');
      await signIn(writer.page, club, 'writer');
      await signIn(moderator.page, club, 'moderator');

      await test.step('somebody looks for it in vain, and leaves the search open', async () => {
        if (way.script) await hobbyist.page.clock.install();
        await hobbyist.page.goto(`${club.origin}/search`);
        await ask(hobbyist.page, question);
        await expect(hobbyist.page.locator('main')).not.toContainText('warm-hands');
      });

      await test.step('the writer is shown both mistakes, mends them and sends', async () => {
        const { page } = writer;
        await page.goto(club.origin + frontPage);
        await page.getByRole('link', { name: 'Propose a change' }).first().click();
        await expect(textField(page)).toBeVisible();
        const published = await textField(page).inputValue();
        await lookOver(page, way, published + withMistakes);
        const findings = page.locator('.findings');
        await expect(findings).toContainText('Cavity 7 is not on the face');
        await expect(findings).toContainText('Q/Z');
        await lookOver(page, way, published + mended);
        await expect(findings).not.toContainText('Q/Z');
        await expect(findings).not.toContainText('not on the face');
        await expect(page.locator('[data-connector="warm-hands"]')).toContainText('light green, red tracer');
        await page.getByLabel('What did you change, and why?').fill('The plug for the hand warmer, measured');
        await page.getByRole('button', { name: 'Send to the moderators' }).click();
        await expect(page.locator('.title-line-kind')).toHaveText('Waiting');
      });
      const { pathname } = new URL(writer.page.url());

      await test.step('the moderator sends it back with a note', async () => {
        const { page } = moderator;
        await page.goto(`${club.origin}/proposals`);
        const row = page.getByRole('row').filter({ hasText: 'The plug for the hand warmer, measured' });
        await row.getByRole('link', { name: /Decide on it/ }).click();
        await page.waitForURL((url) => url.pathname === pathname);
        await expect(page.locator('.difference')).toContainText('Hand warmer');
        await page.locator('summary').filter({ hasText: 'Send back' }).click();
        await page.getByLabel('What its author should do').fill('Is it switched, or live at all times?');
        await page.getByRole('button', { name: 'Send it back with this note' }).click();
        await expect(page.locator('main')).toContainText('It was sent back to its author');
        // What waits next is offered.
        await expect(page.getByRole('link', { name: /^Next: / })).toBeVisible();
      });

      await test.step('the writer answers and sends again', async () => {
        const { page } = writer;
        await page.goto(`${club.origin}/proposals`);
        const row = page.getByRole('row').filter({ hasText: 'The plug for the hand warmer, measured' });
        await row.getByRole('link', { name: /Answer it/ }).click();
        await expect(page.locator('main')).toContainText('Is it switched, or live at all times?');
        const sent = await textField(page).inputValue();
        await textField(page).fill(sent.replace(mended.trim(), answered.trim()));
        await page.getByRole('button', { name: 'Send to the moderators' }).click();
        await expect(page.locator('.title-line-kind')).toHaveText('Waiting');
      });

      await test.step('the moderator publishes', async () => {
        const { page } = moderator;
        await page.goto(club.origin + pathname);
        await page.getByRole('button', { name: 'Publish' }).click();
        await expect(page.locator('main')).toContainText(/published it on/);
        await page.getByRole('link', { name: 'Open the page' }).click();
        await expect(page.locator('[data-line="warm-hands.6"]')).toContainText('Hand warmer, switched');
      });

      await test.step('the open search finds it within a minute; without a script, when it is asked again', async () => {
        const { page } = hobbyist;
        if (way.script) await page.clock.runFor(60_000);
        else await page.reload();
        const answer = page.locator('.answer-line').first();
        await expect(answer).toContainText('Hand warmer, switched');
        await expect(answer).toContainText('light green, red tracer');
      });

      for (const { context, complaints } of [hobbyist, writer, moderator]) {
        expect(complaints).toEqual([]);
        await context.close();
      }
    });
  });
}
