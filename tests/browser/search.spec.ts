import { expect, request, test, type APIRequestContext, type Page } from '@playwright/test';
import { demoPassword, openClub, type Club } from './club.ts';

let club: Club;

test.beforeAll(async () => {
  club = await openClub();
});

test.afterAll(async () => {
  await club.close();
});

const headlight = '/donors/torimachi-qf550/pinouts-front#headlight.2~1980-1981';

function field(page: Page) {
  return page.getByRole('searchbox', { name: 'What are you looking for?' });
}

/** The first answer's link, as somebody reads it. */
function firstAnswer(page: Page) {
  return page.locator('[data-answer]').first();
}

/** Waits until this browser's own index answers, prose and all. */
async function indexIsThere(page: Page): Promise<void> {
  await expect(page.locator('#search-standing')).not.toContainText('loading', { timeout: 30_000 });
}

async function signedIn(who: string): Promise<APIRequestContext> {
  const context = await request.newContext({ baseURL: club.origin, extraHTTPHeaders: { origin: club.origin } });
  const answer = await context.post('/api/session', {
    data: { email: `${who}@earthstrap.example`, password: demoPassword },
  });
  expect(answer.ok()).toBe(true);
  return context;
}

/** Publishes a changed page the way it happens in the club: one proposes and sends, another publishes. */
async function publish(
  shelf: string,
  subject: string,
  name: string,
  change: (markdown: string) => string,
): Promise<void> {
  const writer = await signedIn('writer');
  const moderator = await signedIn('moderator');
  const page = await (await writer.get(`/api/pages/${shelf}/${subject}/${name}`)).json();
  const body = {
    shelf,
    subject,
    page: name,
    baseRevision: page.revision,
    markdown: change(page.markdown),
    summary: 'A wasp.',
  };
  const proposal = await (await writer.post('/api/proposals', { data: body })).json();
  expect((await writer.post(`/api/proposals/${proposal.id}/send`)).ok()).toBe(true);
  expect((await moderator.post(`/api/proposals/${proposal.id}/publish`, { data: {} })).ok()).toBe(true);
  await writer.dispose();
  await moderator.dispose();
}

test('a colour and a connector, typed in the rail, lead to the cavity', async ({ page }) => {
  await page.goto(`${club.origin}/donors/torimachi-qf550`);
  const rail = page.getByRole('combobox', { name: 'Search the book' });
  await expect(rail).toBeVisible();
  await page.keyboard.press('/');
  await expect(rail).toBeFocused();
  await page.keyboard.type('yellow red headlight');
  const first = page.getByRole('option').first();
  await expect(first).toContainText('Headlight bucket, headlamp plug, cavity 2', { timeout: 30_000 });
  await expect(first).toContainText('Y/R');
  await page.keyboard.press('ArrowDown');
  await expect(first).toHaveAttribute('aria-selected', 'true');
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(club.origin + headlight);
});

test('the answer is drawn before any click, follows the typing without the server, and stands in the address', async ({
  page,
}) => {
  await page.goto(`${club.origin}/search?q=yellow+red+headlight`);
  await indexIsThere(page);
  const answer = page.locator('.answer-line').first();
  await expect(answer).toContainText('yellow, red tracer');
  await expect(answer).toContainText('cited');
  await expect(answer.locator('.ringed')).toHaveCount(1);
  await expect(answer.getByRole('note')).toContainText(/caution/i);
  await page.route('**/api/**', (route) => route.abort());
  await field(page).fill('');
  await expect(page.getByText('yellow red headlight')).toBeVisible();
  await field(page).pressSequentially('torimachi headlight pin 3');
  await expect(firstAnswer(page)).toHaveText('Headlight bucket, headlamp plug, cavity 3');
  await expect(page).toHaveURL(`${club.origin}/search?q=torimachi+headlight+pin+3`);
  await field(page).press('ArrowDown');
  await expect(firstAnswer(page)).toBeFocused();
  await page.keyboard.press('ArrowUp');
  await expect(field(page)).toBeFocused();
});

test('a cavity that does not exist is answered by no line, and by the page that says what is there', async ({
  page,
}) => {
  await page.goto(`${club.origin}/search?q=qf550+headlight+9`);
  await indexIsThere(page);
  await expect(page.locator('.answer-line')).toHaveCount(0);
  await expect(page.locator('.search-remarks')).toContainText('None that is merely near is shown');
  await expect(firstAnswer(page)).toHaveText('Front connectors: Headlight bucket, headlamp plug');
  await expect(page.locator('.answer').first()).toContainText('2 (Y/R or Y/B)');
});

test('what is published is found in an open page within a minute', async ({ page }) => {
  await page.clock.install();
  await page.goto(`${club.origin}/search?q=vespiary`);
  await page.clock.runFor(5_000);
  await expect(page.getByText('Nothing in the book answers')).toBeVisible();
  await expect
    .poll(async () => {
      await page.clock.runFor(500);
      return page.locator('#search-standing').innerText();
    })
    .toBe('No answers.');
  await publish(
    'donors',
    'kestova-360',
    'notes',
    (markdown) => `${markdown}\n\n## A vespiary in the horn\n\nIt hums at any voltage.\n`,
  );
  await expect
    .poll(
      async () => {
        // Half a minute at a time, at most two: the page asks by its own clock, the server makes its files by the world's.
        await page.clock.runFor(1_000);
        return page.locator('[data-answer]').allInnerTexts();
      },
      { intervals: [100], timeout: 60_000 },
    )
    .toContain('A vespiary in the horn');
});

test('without a network the answers go on, and it is said', async ({ page, context }) => {
  await page.clock.install();
  await page.goto(`${club.origin}/search?q=horn`);
  await expect
    .poll(async () => {
      await page.clock.runFor(500);
      return page.locator('#search-standing').innerText();
    })
    .not.toContain('loading');
  await context.setOffline(true);
  await field(page).fill('torimachi headlight 1');
  await page.clock.runFor(35_000);
  await expect(firstAnswer(page)).toHaveText('Headlight bucket, headlamp plug, cavity 1');
  await expect(page.getByText('The network is gone')).toBeVisible();
});

test('without JavaScript the form leads to the same answers', async ({ browser }) => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  await page.goto(club.origin);
  await page.locator('main').getByRole('searchbox').fill('Y/R headlight');
  await page.locator('main').getByRole('button', { name: 'Find' }).click();
  await expect(page).toHaveURL(`${club.origin}/search?q=Y%2FR+headlight`);
  await expect(firstAnswer(page)).toHaveAttribute('href', headlight);
  await expect(page.locator('.answer-line').first().locator('.ringed')).toHaveCount(1);
  await context.close();
});

test('a line that the bike on the bench rules out is set back and says why', async ({ page, context }) => {
  await context.addCookies([
    { name: 'bench', value: 'torimachi-qf550', url: club.origin },
    { name: 'variant', value: encodeURIComponent('year=1983'), url: club.origin },
  ]);
  await page.goto(`${club.origin}/search?q=main+beam+headlight`);
  await indexIsThere(page);
  await expect(firstAnswer(page)).toHaveAttribute('href', '/donors/torimachi-qf550/pinouts-front#headlight.2~1982-');
  const setBack = page.locator('.answer-set-back', { hasText: 'Headlight bucket' });
  await expect(setBack).toContainText('Set back: it holds 1980 to 1981, not 1983');
  await expect(page.locator('.search-remarks')).toContainText('Torimachi QF-550 is on your bench');
});
