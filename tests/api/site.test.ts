import { describe, expect, test } from 'vitest';
import { openHttpClub, testPassword, type Browser, type HttpClub } from '../factories/http-club.ts';
import { connectorBlock, pageText } from '../factories/page-texts.ts';
import { realSite } from '../factories/real-site.ts';

const pinouts = '/donors/testbike-500/pinouts';

function openSite(environment: Record<string, string> = {}): Promise<HttpClub> {
  return openHttpClub({ site: realSite, environment });
}

function submit(browser: Browser, path: string, fields: Record<string, string>) {
  return browser(path, { method: 'POST', body: new URLSearchParams(fields) });
}

/** The hidden fields of the form in the main part of a page. */
function hiddenFields(html: string): Record<string, string> {
  const main = /<main.*?<\/main>/s.exec(html)?.[0] ?? '';
  const inputs = [...main.matchAll(/<input type="hidden" name="([^"]+)"(?: value="([^"]*)")?/g)];
  return Object.fromEntries(inputs.map(([, name, value]) => [name, value ?? '']));
}

describe('the site, carried by the server', () => {
  test('shows a page with its title in the head, its faces and lines, and no script but files', async () => {
    const club = await openSite();
    const response = await club.openBrowser()(pinouts);
    expect(response.status).toBe(200);
    const html = await response.text();
    const [head = '', body = ''] = html.split('</head>');
    expect(head).toMatch(/<title>[^<]*Testbike 500[^<]*<\/title>/);
    expect(body).toContain('id="headlight.2"');
    expect(body).toMatch(/<svg[^>]*class="[^"]*face/);
    const scripts = [...html.matchAll(/<script([^>]*)>/g)].map(([, attributes]) => attributes ?? '');
    expect(scripts.length).toBeGreaterThan(1);
    for (const attributes of scripts) expect(attributes).toMatch(/ src="|type="application\/json"/);
    expect(html).not.toMatch(/ style="| on[a-z]+="/);
  });

  test('keeps what every visitor sees alike: shelves, subjects, pages, revisions', async () => {
    const club = await openSite();
    for (const path of [
      '/',
      '/donors',
      '/donors/testbike-500',
      pinouts,
      `${pinouts}/revisions`,
      `${pinouts}?year=1980&market=UK`,
    ]) {
      const first = await (await club.openBrowser()(path)).text();
      expect(await (await club.openBrowser()(path)).text(), path).toBe(first);
      expect(club.context.keptPages.get(path), path).not.toBeNull();
    }
  });

  test('keeps nothing that belongs to somebody: sign-in, proposals, what members read', async () => {
    const club = await openSite();
    const member = await club.signedIn(club.people.writer);
    for (const path of ['/sign-in', '/proposals', '/nothing', '/donors/nothing']) await club.openBrowser()(path);
    for (const path of ['/', pinouts, '/proposals', '/account']) await member(path);
    for (const path of ['/', pinouts, '/sign-in', '/proposals', '/account', '/nothing', '/donors/nothing']) {
      expect(club.context.keptPages.get(path), path).toBeNull();
    }
  });

  test('signs in and out by forms alone', async () => {
    const club = await openSite();
    const browser = club.openBrowser();
    const form = hiddenFields(await (await browser('/sign-in?next=%2Fproposals')).text());
    const wrong = await submit(browser, '/sign-in', {
      ...form,
      email: club.people.writer.email,
      password: 'a wrong one',
    });
    expect(wrong.status).toBe(401);
    expect(await wrong.text()).toContain(`value="${club.people.writer.email}"`);
    const right = await submit(browser, '/sign-in', {
      ...form,
      email: club.people.writer.email,
      password: testPassword,
    });
    expect([right.status, right.headers.get('location')]).toEqual([302, '/proposals']);
    expect((await browser('/proposals')).status).toBe(200);
    await submit(browser, '/sign-out', {});
    expect((await browser('/proposals')).status).toBe(401);
  });

  test('takes a change from a form alone, and what was typed is never lost', async () => {
    const club = await openSite();
    const browser = await club.signedIn(club.people.writer);
    const form = hiddenFields(await (await browser(`${pinouts}/propose`)).text());
    const markdown = pageText({ body: connectorBlock('headlight', 'L/W') });
    const path = `${pinouts}/propose`;
    const unsaid = await submit(browser, path, { ...form, markdown, summary: '', do: 'send' });
    expect(unsaid.status).toBe(422);
    expect(await unsaid.text()).toContain('L/W');
    const sent = await submit(browser, path, { ...form, markdown, summary: 'Main beam is blue.', do: 'send' });
    expect(sent.status).toBe(302);
    const proposal = await (await browser(sent.headers.get('location') ?? '')).text();
    expect(proposal).toContain('Main beam is blue.');
  });

  test('sends visitors of a closed club to sign in, and then where they were going', async () => {
    const club = await openSite({ READING: 'members' });
    const browser = club.openBrowser();
    const sentTo = (await browser(pinouts)).headers.get('location') ?? '';
    expect(sentTo).toBe(`/sign-in?next=${encodeURIComponent(pinouts)}`);
    const page = await browser(sentTo);
    expect(page.status).toBe(200);
    const html = await page.text();
    expect(html).not.toContain('Testbike');
    const form = hiddenFields(html);
    const signedIn = await submit(browser, '/sign-in', {
      ...form,
      email: club.people.hobbyist.email,
      password: testPassword,
    });
    expect(signedIn.headers.get('location')).toBe(pinouts);
    expect((await browser(pinouts)).status).toBe(200);
  });
});
