import { request } from 'node:http';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { accepted, testbike } from '../factories/book.ts';
import { openHttpClub, type HttpClub } from '../factories/http-club.ts';
import { overviewText } from '../factories/page-texts.ts';
import { createPlainSite } from '../factories/plain-site.ts';

const donor = '/donors/testbike-500';

async function openClubWithSite() {
  const site = createPlainSite();
  return { site, club: await openHttpClub({ site }) };
}

/** The answer as it came over the wire, nothing decompressed. */
function askForBytes(club: HttpClub, path: string, headers: Record<string, string> = {}, method = 'GET') {
  return new Promise<{ status: number; headers: Record<string, unknown>; bytes: Buffer }>((resolve, reject) => {
    const asked = request(`${club.origin}${path}`, { method, headers }, (response) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () =>
        resolve({ status: response.statusCode ?? 0, headers: response.headers, bytes: Buffer.concat(parts) }),
      );
    });
    asked.on('error', reject);
    asked.end();
  });
}

async function publishAnotherTitle(club: HttpClub, title: string): Promise<void> {
  const { proposals } = club.context.services;
  const { writer, moderator } = club.people;
  const markdown = overviewText(title);
  const draft = accepted(
    await proposals.propose(writer, { ...testbike.overview, baseRevision: 1, markdown, summary: 'Named.' }),
  );
  accepted(await proposals.send(writer, draft.id));
  accepted(await proposals.publish(moderator, draft.id, {}));
}

describe('a page that every visitor sees alike', () => {
  test('is rendered once', async () => {
    const { site, club } = await openClubWithSite();
    const first = await (await club.openBrowser()(donor)).text();
    const second = await (await club.openBrowser()(donor)).text();
    expect(second).toBe(first);
    expect(second).toContain('<h1>Testbike 500</h1>');
    expect(site.rendered).toEqual([`GET ${donor}`]);
  });

  test('is rendered once for all who ask at the same time', async () => {
    const { site, club } = await openClubWithSite();
    const texts = await Promise.all(
      Array.from({ length: 20 }, async () => (await askForBytes(club, donor)).bytes.toString()),
    );
    expect(new Set(texts).size).toBe(1);
    expect(site.rendered).toEqual([`GET ${donor}`]);
  });

  test.each([
    ['br', brotliDecompressSync],
    ['gzip', gunzipSync],
  ] as const)(
    'is sent in %s from the first, and better compressed once there was time',
    async (encoding, decompress) => {
      const { club } = await openClubWithSite();
      const headers = { 'accept-encoding': encoding };
      const first = await askForBytes(club, donor, headers);
      await club.context.keptPages.compressed();
      const later = await askForBytes(club, donor, headers);
      const identity = await askForBytes(club, donor);
      expect(identity.headers['content-encoding']).toBeUndefined();
      for (const answer of [first, later]) {
        expect(answer.headers['content-encoding']).toBe(encoding);
        expect(answer.headers['content-length']).toBe(String(answer.bytes.length));
        expect(answer.headers['etag']).toBe(identity.headers['etag']);
        expect(decompress(answer.bytes)).toEqual(identity.bytes);
      }
      expect(later.bytes.length).toBeLessThanOrEqual(first.bytes.length);
    },
  );

  test('may be kept by anybody who asks again before using it, and says what it depends on', async () => {
    const { club } = await openClubWithSite();
    for (const time of ['rendered', 'kept']) {
      const { headers } = await askForBytes(club, donor);
      expect(headers['cache-control'], time).toBe('public, max-age=0, must-revalidate');
      expect(headers['vary'], time).toBe('Accept-Encoding, Cookie');
      expect(headers['content-type'], time).toBe('text/html; charset=utf-8');
    }
  });

  test('is answered 304 to who has it', async () => {
    const { club } = await openClubWithSite();
    const { headers } = await askForBytes(club, donor);
    const tag = String(headers['etag']);
    for (const known of [tag, `"other", ${tag}`, '*']) {
      const again = await askForBytes(club, donor, { 'if-none-match': known });
      expect([again.status, again.bytes.length, again.headers['etag']]).toEqual([304, 0, tag]);
    }
    expect((await askForBytes(club, donor, { 'if-none-match': '"other"' })).status).toBe(200);
  });

  test('answers HEAD with its headers and nothing else', async () => {
    const { club } = await openClubWithSite();
    const { headers, bytes } = await askForBytes(club, donor);
    const head = await askForBytes(club, donor, {}, 'HEAD');
    expect(head.status).toBe(200);
    expect(head.bytes).toHaveLength(0);
    expect(head.headers['content-length']).toBe(String(bytes.length));
    expect(head.headers['etag']).toBe(headers['etag']);
  });

  test('carries the same security headers whether it was rendered or kept', async () => {
    const { club } = await openClubWithSite();
    const [rendered, kept] = [await askForBytes(club, donor), await askForBytes(club, donor)];
    for (const name of ['content-security-policy', 'x-content-type-options', 'referrer-policy', 'x-frame-options']) {
      expect(kept.headers[name], name).toBeDefined();
      expect(kept.headers[name], name).toBe(rendered.headers[name]);
    }
  });

  test('is made again after a publication', async () => {
    const { site, club } = await openClubWithSite();
    const before = await askForBytes(club, donor);
    await publishAnotherTitle(club, 'Testbike 500 T');
    const after = await askForBytes(club, donor, { 'if-none-match': String(before.headers['etag']) });
    expect(after.status).toBe(200);
    expect(after.bytes.toString()).toContain('<h1>Testbike 500 T</h1>');
    expect(site.rendered).toHaveLength(2);
  });

  test('is not kept where something was published while it was made', async () => {
    const site = createPlainSite();
    let whileRendering = async (): Promise<void> => {};
    const slow = {
      ...site,
      async render(...given: Parameters<typeof site.render>) {
        const rendered = await site.render(...given);
        await whileRendering();
        return rendered;
      },
    };
    const club = await openHttpClub({ site: slow });
    whileRendering = () => publishAnotherTitle(club, 'Testbike 500 T');
    expect((await askForBytes(club, donor)).bytes.toString()).toContain('<h1>Testbike 500</h1>');
    whileRendering = async () => {};
    expect((await askForBytes(club, donor)).bytes.toString()).toContain('<h1>Testbike 500 T</h1>');
  });
});

describe('visitors who chose differently', () => {
  test('have a page each, by address', async () => {
    const { site, club } = await openClubWithSite();
    const browser = club.openBrowser();
    for (const query of ['', '?year=1980', '?year=1980&market=UK', '?market=UK&year=1980', '?year=1980'])
      await browser(donor + query);
    expect(site.rendered).toEqual([`GET ${donor}`, `GET ${donor}?year=1980`, `GET ${donor}?year=1980&market=UK`]);
  });

  test('have a page each, by what is on their bench', async () => {
    const { site, club } = await openClubWithSite();
    const bench = { cookie: `bench=testbike-500; variant=${encodeURIComponent('year=1980')}` };
    for (const time of ['rendered', 'kept'])
      expect((await askForBytes(club, donor, bench)).bytes.toString(), time).toContain('bench testbike-500 1980');
    expect((await askForBytes(club, donor)).bytes.toString()).toContain('bench nothing any year');
    // Another program's cookie changes nothing.
    await askForBytes(club, donor, { cookie: 'other=1' });
    expect(site.rendered).toHaveLength(2);
  });

  test('in a way that nothing is kept for are answered all the same', async () => {
    const { site, club } = await openClubWithSite();
    for (const query of ['?q=1', '?year=1980&year=1981', `?market=${'x'.repeat(400)}`]) {
      for (const time of ['once', 'again']) expect((await askForBytes(club, donor + query)).status, time).toBe(200);
    }
    expect(site.rendered).toHaveLength(6);
  });

  test('with damaged cookies are answered as if they had none', async () => {
    const { club } = await openClubWithSite();
    const { bytes } = await askForBytes(club, donor, { cookie: 'bench=%E0%A4; variant; ;=;x' });
    expect(bytes.toString()).toContain('bench nothing any year');
  });
});

describe('a member', () => {
  test('never gets a visitor’s page, nor a visitor a member’s', async () => {
    const { club } = await openClubWithSite();
    await club.openBrowser()(donor);
    const member = await club.signedIn(club.people.writer);
    const response = await member(donor);
    expect(await response.text()).toContain('for Writer');
    expect(response.headers.get('cache-control')).toBe('private, no-cache');
    expect(response.headers.get('vary')).toBe('Accept-Encoding, Cookie');
    expect(await (await club.openBrowser()(donor)).text()).toContain('for visitor');
  });

  test('is answered 304 where their page is as it was', async () => {
    const { club } = await openClubWithSite();
    const member = await club.signedIn(club.people.writer);
    const tag = (await member(donor)).headers.get('etag') ?? '';
    expect((await member(donor, { headers: { 'if-none-match': tag } })).status).toBe(304);
  });

  test('is a visitor again after signing out', async () => {
    const { site, club } = await openClubWithSite();
    await club.openBrowser()(donor);
    const browser = await club.signedIn(club.people.writer);
    await browser('/api/session', { method: 'DELETE' });
    expect(await (await browser(donor)).text()).toContain('for visitor');
    expect(site.rendered).toHaveLength(1);
  });
});

test('a page that cannot be made leaves nobody waiting', async () => {
  const { site, club } = await openClubWithSite();
  const answers = await Promise.all(Array.from({ length: 5 }, () => askForBytes(club, '/broken')));
  expect(answers.map(({ status }) => status)).toEqual([500, 500, 500, 500, 500]);
  expect(site.rendered).toHaveLength(5);
});

test('a page that is not there is not kept', async () => {
  const { site, club } = await openClubWithSite();
  for (const time of ['once', 'again']) expect((await club.openBrowser()('/donors/nothing')).status, time).toBe(404);
  expect(site.rendered).toHaveLength(2);
});
