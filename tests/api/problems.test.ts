import { connect } from 'node:net';
import { describe, expect, test } from 'vitest';
import { openHttpClub, sendJson, type HttpClub } from '../factories/http-club.ts';

async function problemOf(response: Response) {
  expect(response.headers.get('content-type')).toBe('application/problem+json; charset=utf-8');
  expect(response.headers.get('cache-control')).toBe('no-store');
  const body = await response.json();
  expect(body.status).toBe(response.status);
  expect(body.type).toBe(`/problems/${String(body.code)}`);
  expect(body.title).not.toBe('');
  expect(body.detail).not.toBe('');
  expect(body.instance).toBe(`urn:uuid:${String(response.headers.get('x-request-id'))}`);
  return body;
}

/** Sends bytes as they are, for what `fetch` would not. */
function sendBytes(club: HttpClub, bytes: string): Promise<string> {
  return new Promise((resolve, reject) => {
    const socket = connect(Number(new URL(club.origin).port), '127.0.0.1', () => socket.end(bytes));
    let answer = '';
    socket.on('data', (part) => (answer += part.toString()));
    socket.on('end', () => resolve(answer));
    socket.on('error', reject);
  });
}

describe('a problem says what happened', () => {
  test('where there is no such call', async () => {
    const club = await openHttpClub();
    for (const path of ['/api', '/api/nothing', '/api/pages', '/api/pages/donors/testbike-500/pinouts/nothing']) {
      expect(await problemOf(await club.openBrowser()(path))).toMatchObject({ code: 'not-found', status: 404 });
    }
  });

  test('where there is no such page, shelf or slug', async () => {
    const club = await openHttpClub();
    for (const path of [
      'donors/testbike-500/nothing',
      'donors/nothing/overview',
      'bikes/testbike-500/pinouts',
      'donors/Test_Bike/pinouts',
    ]) {
      expect(await problemOf(await club.openBrowser()(`/api/pages/${path}`))).toMatchObject({ code: 'not-found' });
    }
  });

  test('where the method is not one of the call’s, with those that are', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/api/session', { method: 'PATCH' });
    expect(await problemOf(response)).toMatchObject({ code: 'method-not-allowed', status: 405 });
    expect(response.headers.get('allow')).toBe('GET, HEAD, POST, DELETE, OPTIONS');
    const asked = await club.openBrowser()('/api/session', { method: 'OPTIONS' });
    expect(asked.status).toBe(204);
    expect(asked.headers.get('allow')).toBe('GET, HEAD, POST, DELETE, OPTIONS');
  });

  test('where the JSON cannot be read', async () => {
    const club = await openHttpClub();
    const init = { method: 'POST', body: '{"email":', headers: { 'content-type': 'application/json' } };
    expect(await problemOf(await club.openBrowser()('/api/session', init))).toMatchObject({
      code: 'bad-request',
      status: 400,
    });
  });

  test('where the body is something else than JSON', async () => {
    const club = await openHttpClub();
    const init = {
      method: 'POST',
      body: 'email=a&password=b',
      headers: { 'content-type': 'application/x-www-form-urlencoded' },
    };
    expect(await problemOf(await club.openBrowser()('/api/session', init))).toMatchObject({ code: 'bad-request' });
  });

  test('where the body is too long', async () => {
    const club = await openHttpClub();
    const response = await club.openBrowser()('/api/preview', sendJson('POST', { markdown: 'x'.repeat(500_000) }));
    expect(await problemOf(response)).toMatchObject({ code: 'too-large', status: 413 });
  });

  test('where the address asks for what cannot be read', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const page = '/api/pages/donors/testbike-500/pinouts';
    for (const query of ['?year=soon', '?year=1', '?year=1980&year=1981', `?market=${'x'.repeat(41)}`]) {
      const body = await problemOf(await browser(page + query));
      expect(body).toMatchObject({ code: 'bad-request', status: 400 });
      expect(Object.keys(body.fields)).toHaveLength(1);
    }
    expect(await problemOf(await browser(`${page}/compare?from=1`))).toMatchObject({ code: 'bad-request' });
    expect(await problemOf(await browser(`${page}/revisions/first`))).toMatchObject({ code: 'not-found' });
    expect(await problemOf(await browser('/api/pages/donors/%E0%A4/pinouts'))).toMatchObject({ code: 'bad-request' });
  });

  test('where another site could have sent it, and nothing was changed', async () => {
    const club = await openHttpClub();
    const browser = await club.signedIn(club.people.writer);
    const elsewhere = { origin: 'https://elsewhere.example' };
    const response = await browser('/api/session', { method: 'DELETE', headers: elsewhere });
    expect(await problemOf(response)).toMatchObject({ code: 'cross-site', status: 403 });
    expect((await (await browser('/api/session')).json()).member.name).toBe('Writer');
  });

  test('to a program that does not say where it comes from', async () => {
    const club = await openHttpClub();
    const answer = await sendBytes(
      club,
      'POST /api/session HTTP/1.1\r\nHost: localhost\r\nContent-Type: application/json\r\nContent-Length: 2\r\nConnection: close\r\n\r\n{}',
    );
    expect(answer).toContain('HTTP/1.1 403');
    expect(answer).toContain('"code":"cross-site"');
  });

  test('where we failed, with a number that is in the log and nothing of the failure', async () => {
    const club = await openHttpClub();
    club.context.database.sqlite.exec('ALTER TABLE pages RENAME TO pages_gone');
    const response = await club.openBrowser()('/api/shelves/donors');
    const body = await problemOf(response);
    expect(body).toMatchObject({ code: 'unexpected', status: 500 });
    expect(body.detail).toContain(response.headers.get('x-request-id'));
    expect(JSON.stringify(body)).not.toMatch(/sqlite|pages_gone|no such table/i);
  });
});

describe('health', () => {
  test('is 200 while the store answers, and 503 when it does not', async () => {
    const club = await openHttpClub();
    expect((await club.openBrowser()('/healthz')).status).toBe(200);
    club.context.database.close();
    expect((await club.openBrowser()('/healthz')).status).toBe(503);
  });
});
