import { describe, expect, test } from 'vitest';
import { eq } from 'drizzle-orm';
import { members, sessions } from '../../server/db/schema/members.ts';
import { openHttpClub, sendJson, testPassword, type Browser, type HttpClub } from '../factories/http-club.ts';

async function nameOf(browser: Browser): Promise<string | null> {
  const viewer = await (await browser('/api/session')).json();
  return viewer.member?.name ?? null;
}

function suspend(club: HttpClub, id: string): void {
  club.context.database.query
    .update(members)
    .set({ suspendedAt: '2026-01-01T12:00:00.000Z' })
    .where(eq(members.id, id))
    .run();
}

function storedSessions(club: HttpClub) {
  return club.context.database.query.select().from(sessions).all();
}

describe('signing in', () => {
  test('gives the member and a cookie that scripts cannot read and other sites do not send', async () => {
    const club = await openHttpClub();
    const { email } = club.people.writer;
    const response = await club.openBrowser()('/api/session', sendJson('POST', { email, password: testPassword }));
    expect(response.status).toBe(200);
    expect(await response.json()).toEqual({ member: club.people.writer, waiting: 0 });
    const [cookie = ''] = response.headers.getSetCookie();
    expect(cookie).toMatch(/^earthstrap=s%3A[^;]+; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Lax$/);
    const days = (Date.parse(/Expires=([^;]+)/.exec(cookie)?.[1] ?? '') - Date.now()) / 86_400_000;
    expect(days).toBeGreaterThan(29.9);
    expect(days).toBeLessThan(30.1);
  });

  test('behind TLS gives a cookie that is never sent without it', async () => {
    const club = await openHttpClub({ environment: { BASE_URL: 'https://book.example' } });
    const { email } = club.people.writer;
    const browser = club.openBrowser();
    const headers = { origin: 'https://book.example' };
    const response = await browser('/api/session', sendJson('POST', { email, password: testPassword }, headers));
    expect(response.headers.getSetCookie()[0]).toMatch(
      /^__Host-earthstrap=.*; Path=\/; .*; HttpOnly; Secure; SameSite=Lax$/,
    );
    expect(await nameOf(browser)).toBe('Writer');
  });

  test('takes the e-mail address in any case and with spaces about it', async () => {
    const club = await openHttpClub();
    const body = { email: ` ${club.people.writer.email.toUpperCase()} `, password: testPassword };
    expect((await club.openBrowser()('/api/session', sendJson('POST', body))).status).toBe(200);
  });

  test('answers an unknown e-mail address and a wrong password with the same words', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const wrong = await browser(
      '/api/session',
      sendJson('POST', { email: club.people.writer.email, password: 'a wrong one' }),
    );
    const unknown = await browser(
      '/api/session',
      sendJson('POST', { email: 'nobody@earthstrap.example', password: 'a wrong one' }),
    );
    expect([wrong.status, unknown.status]).toEqual([401, 401]);
    const [saidToWrong, saidToUnknown] = [await wrong.json(), await unknown.json()];
    expect({ ...saidToUnknown, instance: saidToWrong.instance }).toEqual(saidToWrong);
    expect(saidToWrong).toMatchObject({ code: 'sign-in-failed', status: 401 });
    expect(storedSessions(club)).toEqual([]);
  });

  test('names the field that is missing', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/api/session', sendJson('POST', { email: '', password: '' }));
    expect(response.status).toBe(422);
    expect((await response.json()).fields).toEqual({
      email: 'Write your e-mail address.',
      password: 'Write your password.',
    });
  });

  test('gives the browser a new session, so that nobody can have laid out the old one', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    const [first] = storedSessions(club);
    await browser('/api/session', sendJson('POST', { email: club.people.moderator.email, password: testPassword }));
    const now = storedSessions(club);
    expect(now).toHaveLength(1);
    expect(now[0]?.id).not.toBe(first?.id);
    expect(now[0]?.memberId).toBe(club.people.moderator.id);
  });

  test('keeps no cookie that could be used in the store', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()(
      '/api/session',
      sendJson('POST', { email: club.people.writer.email, password: testPassword }),
    );
    const value = decodeURIComponent(/=([^;]+)/.exec(response.headers.getSetCookie()[0] ?? '')?.[1] ?? '');
    const sessionId = value.slice(2).split('.')[0] ?? '';
    expect(sessionId.length).toBeGreaterThan(20);
    expect(JSON.stringify(storedSessions(club))).not.toContain(sessionId);
  });

  test('tells who is suspended so, only to who knows the password', async () => {
    const club = await openHttpClub();
    const { id, email } = club.people.writer;
    suspend(club, id);
    const browser = club.openBrowser();
    expect((await browser('/api/session', sendJson('POST', { email, password: 'a wrong one' }))).status).toBe(401);
    const right = await browser('/api/session', sendJson('POST', { email, password: testPassword }));
    expect(right.status).toBe(403);
    expect(await nameOf(browser)).toBeNull();
  });
});

describe('guessing', () => {
  async function guess(browser: Browser, email: string, password = 'a wrong one'): Promise<Response> {
    return browser('/api/session', sendJson('POST', { email, password }));
  }

  test('is slowed after five wrong passwords, with the wait in words and in a header', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const { email } = club.people.writer;
    for (let time = 0; time < 5; time += 1) expect((await guess(browser, email)).status).toBe(401);
    const paused = await guess(browser, email, testPassword);
    expect(paused.status).toBe(429);
    expect(paused.headers.get('retry-after')).toBe('2');
    expect(await paused.json()).toMatchObject({ code: 'too-many-requests', retryAfterSeconds: 2 });
  });

  test('locks nobody out: after the pause the right password signs in, and all is forgotten', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const { email } = club.people.writer;
    for (let time = 0; time < 5; time += 1) await guess(browser, email);
    club.wait(2000);
    expect((await guess(browser, email, testPassword)).status).toBe(200);
    expect((await guess(browser, email)).status).toBe(401);
    expect((await guess(browser, email)).status).toBe(401);
  });

  test('one member leaves the others alone', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    for (let time = 0; time < 6; time += 1) await guess(browser, club.people.writer.email);
    expect((await guess(browser, club.people.hobbyist.email, testPassword)).status).toBe(200);
  });

  test('many at once counts as many', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const { email } = club.people.writer;
    const all = await Promise.all(Array.from({ length: 12 }, () => guess(browser, email)));
    expect(all.filter(({ status }) => status === 401)).toHaveLength(5);
    expect(all.filter(({ status }) => status === 429)).toHaveLength(7);
  });

  test('behind a server of this machine is counted by the address that it names', async () => {
    const club = await openHttpClub({ environment: { BASE_URL: 'http://book.example' } });
    const { email } = club.people.writer;
    const from = (address: string, password: string) => {
      const headers = { 'x-forwarded-for': `198.51.100.1, ${address}`, origin: 'http://book.example' };
      return club.openBrowser()('/api/session', sendJson('POST', { email, password }, headers));
    };
    for (let time = 0; time < 5; time += 1) await from('203.0.113.9', 'a wrong one');
    expect((await from('203.0.113.9', testPassword)).status).toBe(429);
    expect((await from('203.0.113.10', testPassword)).status).toBe(200);
  });

  test('who writes down the address of somebody else is not believed', async () => {
    const club = await openHttpClub();
    const { email } = club.people.writer;
    for (let time = 0; time < 5; time += 1) await guess(club.openBrowser(), email);
    const headers = { 'x-forwarded-for': '203.0.113.9' };
    const response = await club.openBrowser()(
      '/api/session',
      sendJson('POST', { email, password: 'a wrong one' }, headers),
    );
    expect(response.status).toBe(429);
  });
});

describe('a session', () => {
  test('reads the member again on every request', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    club.context.database.query
      .update(members)
      .set({ role: 'moderator' })
      .where(eq(members.id, club.people.writer.id))
      .run();
    expect((await (await browser('/api/session')).json()).member.role).toBe('moderator');
  });

  test('of who is suspended is a visitor’s from the next request on', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    suspend(club, club.people.writer.id);
    expect(await nameOf(browser)).toBeNull();
    expect((await browser('/api/proposals')).status).toBe(401);
    expect(storedSessions(club)[0]?.memberId).toBeNull();
  });

  test('rolls on while it is used, and ends thirty days after it was', async () => {
    const club = await openHttpClub();
    const day = 24 * 3600 * 1000;
    const browser = await club.signedIn(club.people.writer);
    club.wait(29 * day);
    expect(await nameOf(browser)).toBe('Writer');
    club.wait(29 * day);
    expect(await nameOf(browser)).toBe('Writer');
    club.wait(30 * day);
    expect(await nameOf(browser)).toBeNull();
  });

  test('is not written again for every page that is read', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    const before = storedSessions(club);
    club.wait(30 * 60 * 1000);
    await nameOf(browser);
    expect(storedSessions(club)).toEqual(before);
    club.wait(30 * 60 * 1000);
    await nameOf(browser);
    expect(storedSessions(club)).not.toEqual(before);
  });

  test('that has expired is pruned', async () => {
    const club = await openHttpClub();
    await club.signedIn(club.people.writer);
    club.wait(31 * 24 * 3600 * 1000);
    await club.signedIn(club.people.moderator);
    expect(club.context.sessions.prune(club.context.now())).toBe(1);
    expect(storedSessions(club).map(({ memberId }) => memberId)).toEqual(['moderator']);
  });

  test('ends with signing out, for the server and for the browser', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    const response = await browser('/api/session', { method: 'DELETE' });
    expect(response.status).toBe(204);
    expect(response.headers.getSetCookie()[0]).toMatch(/^earthstrap=; .*Expires=Thu, 01 Jan 1970/);
    expect(storedSessions(club)).toEqual([]);
    expect(await nameOf(browser)).toBeNull();
  });

  test('with a forged cookie is a visitor’s', async () => {
    const club = await openHttpClub();
    await club.signedIn(club.people.writer);
    const [stored] = storedSessions(club);
    const forged = { headers: { cookie: `earthstrap=s%3A${String(stored?.id)}.forged` } };
    expect((await (await club.openBrowser()('/api/session', forged)).json()).member).toBeNull();
  });

  test('is not given to visitors', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/api/home');
    expect(response.headers.getSetCookie()).toEqual([]);
    expect(storedSessions(club)).toEqual([]);
  });
});

describe('changing the password', () => {
  const next = 'another password of the test';

  test('signs out the member’s other browsers and keeps this one', async () => {
    const club = await openHttpClub();
    const here = await club.signedIn(club.people.writer);
    const there = await club.signedIn(club.people.writer);
    const response = await here('/api/account/password', sendJson('PUT', { current: testPassword, next }));
    expect(response.status).toBe(204);
    expect(await nameOf(here)).toBe('Writer');
    expect(await nameOf(there)).toBeNull();
    const { email } = club.people.writer;
    expect((await there('/api/session', sendJson('POST', { email, password: testPassword }))).status).toBe(401);
    expect((await there('/api/session', sendJson('POST', { email, password: next }))).status).toBe(200);
  });

  test('needs the one that there is, and says at which field', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    const response = await browser('/api/account/password', sendJson('PUT', { current: 'a wrong one', next }));
    expect(response.status).toBe(422);
    expect(Object.keys((await response.json()).fields)).toEqual(['current']);
  });

  test('is slowed like signing in', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    const change = () => browser('/api/account/password', sendJson('PUT', { current: 'a wrong one', next }));
    for (let time = 0; time < 5; time += 1) expect((await change()).status).toBe(422);
    expect((await change()).status).toBe(429);
  });
});
