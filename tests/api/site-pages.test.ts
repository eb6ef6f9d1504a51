import { describe, expect, test } from 'vitest';
import { openHttpClub, testPassword, type Browser } from '../factories/http-club.ts';

const donor = '/donors/testbike-500';

function submit(browser: Browser, path: string, fields: Record<string, string>, headers: Record<string, string> = {}) {
  return browser(path, { method: 'POST', body: new URLSearchParams(fields), headers });
}

describe('a form without JavaScript', () => {
  test('signs in, is sent on, and keeps the cookies of both the session and the page', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const response = await submit(browser, '/sign-in', { email: club.people.writer.email, password: testPassword });
    expect([response.status, response.headers.get('location')]).toEqual([302, '/']);
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(response.headers.getSetCookie().map((cookie) => cookie.split('=')[0])).toEqual(['bench', 'earthstrap']);
    expect(await (await browser(donor)).text()).toContain('for Writer, bench testbike-500');
  });

  test('is answered with its page and the status of the refusal', async () => {
    const club = await openHttpClub();
    const response = await submit(club.openBrowser(), '/sign-in', {
      email: club.people.writer.email,
      password: 'wrong',
    });
    expect(response.status).toBe(401);
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(await response.text()).toContain('That did not sign you in');
  });

  test('signs out', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    await submit(browser, '/sign-out', {});
    expect(await (await browser(donor)).text()).toContain('for visitor');
  });

  test('of another site is refused with a page, and nothing is done', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    const response = await submit(browser, '/sign-out', {}, { origin: 'https://elsewhere.example' });
    expect(response.status).toBe(403);
    expect(response.headers.get('content-type')).toBe('text/html; charset=utf-8');
    expect(await response.text()).toContain('This did not come from our own pages');
    expect(await (await browser(donor)).text()).toContain('for Writer');
  });

  test('that is too long is refused with a page', async () => {
    const club = await openHttpClub();
    const response = await submit(club.openBrowser(), '/sign-in', { email: 'x'.repeat(500_000), password: 'y' });
    expect(response.status).toBe(413);
    expect(await response.text()).toContain('<h1>This is too long</h1>');
  });
});

describe('the site', () => {
  test('says kindly that it failed, with the number that is in the log and nothing of the failure', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/broken');
    expect(response.status).toBe(500);
    const text = await response.text();
    expect(text).toContain('<h1>Something went wrong on our side</h1>');
    expect(text).toContain(response.headers.get('x-request-id'));
    expect(text).not.toContain('this page is broken');
  });

  test('answers what is not there with a page of its own', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/donors/nothing');
    expect(response.status).toBe(404);
    expect(response.headers.get('content-type')).toBe('text/html; charset=utf-8');
  });

  test.each(['PUT', 'DELETE', 'PATCH'])('does not take %s', async (method) => {
    const club = await openHttpClub();
    const response = await club.openBrowser()(donor, { method });
    expect([response.status, response.headers.get('allow')]).toEqual([405, 'GET, HEAD, POST']);
  });

  test('is not taken for another one by two slashes', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('//elsewhere.example/');
    expect([response.status, response.headers.get('location')]).toEqual([404, null]);
  });

  test('answers an address that cannot be read with a page', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/donors/%E0%A4');
    expect(response.status).toBeGreaterThanOrEqual(400);
    expect(response.status).toBeLessThan(500);
  });
});

describe('a club that keeps its reading to members', () => {
  const environment = { READING: 'members' };

  test('sends visitors to sign in, and remembers where they were going', async () => {
    const club = await openHttpClub({ environment });
    const response = await club.openBrowser()(`${donor}?year=1980`);
    expect(response.status).toBe(302);
    expect(response.headers.get('location')).toBe(`/sign-in?next=${encodeURIComponent(`${donor}?year=1980`)}`);
    expect(response.headers.get('cache-control')).toBe('no-store');
  });

  test('lets them sign in, and keeps nothing that members read', async () => {
    const club = await openHttpClub({ environment });
    const browser = await club.signedIn(club.people.hobbyist);
    const response = await browser(donor);
    expect(await response.text()).toContain('<h1>Testbike 500</h1>');
    expect(response.headers.get('cache-control')).toBe('private, no-cache');
    expect((await club.openBrowser()(donor)).status).toBe(302);
    expect((await club.openBrowser()('/sign-in')).status).not.toBe(302);
  });

  test('answers their programs 401', async () => {
    const club = await openHttpClub({ environment });
    for (const path of [
      '/api/home',
      '/api/shelves/donors',
      '/api/pages/donors/testbike-500/pinouts',
      '/api/search?q=y/r',
    ]) {
      expect((await club.openBrowser()(path)).status, path).toBe(401);
    }
    const member = await club.signedIn(club.people.hobbyist);
    const response = await member('/api/shelves/donors');
    expect([response.status, response.headers.get('cache-control')]).toEqual([200, 'private, no-cache']);
  });

  test('tells search engines to stay away, and names no page', async () => {
    const club = await openHttpClub({ environment });
    expect(await (await club.openBrowser()('/robots.txt')).text()).toBe('User-agent: *\nDisallow: /\n');
    expect(await (await club.openBrowser()('/sitemap.xml')).text()).not.toContain('testbike');
  });
});

describe('search engines', () => {
  test('are told every published page', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/sitemap.xml');
    expect(response.headers.get('content-type')).toBe('application/xml; charset=utf-8');
    const named = [...(await response.text()).matchAll(/<loc>([^<]*)<\/loc>/g)].map(([, address]) => address);
    expect(named).toEqual(
      ['/donors', donor, `${donor}/pinouts`, '/parts', '/reference'].map((path) => club.origin + path),
    );
  });

  test('are told where the map is', async () => {
    const club = await openHttpClub();
    expect(await (await club.openBrowser()('/robots.txt')).text()).toContain(`Sitemap: ${club.origin}/sitemap.xml`);
  });
});

describe('security headers', () => {
  async function policyOf(environment: Record<string, string> = {}) {
    const club = await openHttpClub({ environment });
    const { headers } = await club.openBrowser()('/api/home');
    return { headers, policy: (headers.get('content-security-policy') ?? '').split(';') };
  }

  test('let no script or style run but our own files', async () => {
    const { policy } = await policyOf();
    expect(policy).toContain("script-src 'self'");
    expect(policy).toContain("style-src 'self'");
    expect(policy).toContain("object-src 'none'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy.join(' ')).not.toMatch(/unsafe|nonce|https?:|\*/);
  });

  test('send browsers to TLS only where there is TLS', async () => {
    const plain = await policyOf();
    expect(plain.headers.has('strict-transport-security')).toBe(false);
    expect(plain.policy).not.toContain('upgrade-insecure-requests');
    const secure = await policyOf({ BASE_URL: 'https://book.example' });
    expect(secure.headers.get('strict-transport-security')).toContain('max-age=');
    expect(secure.policy).toContain('upgrade-insecure-requests');
  });

  test('do not say what the server is made of', async () => {
    const { headers } = await policyOf();
    expect(headers.has('x-powered-by')).toBe(false);
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('referrer-policy')).toBe('same-origin');
  });
});
