import { describe, expect, test } from 'vitest';
import { accepted, testbike } from '../factories/book.ts';
import { openHttpClub, sendJson, type HttpClub } from '../factories/http-club.ts';
import { connectorBlock, pageText } from '../factories/page-texts.ts';

const page = '/api/pages/donors/testbike-500/pinouts';
const changed = pageText({ body: connectorBlock('headlight', 'L/W') });

async function publishChange(club: HttpClub): Promise<void> {
  const { proposals } = club.context.services;
  const { writer, moderator } = club.people;
  const draft = accepted(
    await proposals.propose(writer, {
      ...testbike.pinouts,
      baseRevision: 1,
      markdown: changed,
      summary: 'Main beam is blue.',
    }),
  );
  accepted(await proposals.send(writer, draft.id));
  accepted(await proposals.publish(moderator, draft.id, {}));
}

describe('a read', () => {
  test('carries a tag, and is answered 304 while nothing changed', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const tag = (await browser(page)).headers.get('etag') ?? '';
    expect(tag).toMatch(/^"[\w-]+"$/);
    const again = await browser(page, { headers: { 'if-none-match': tag } });
    expect([again.status, await again.text(), again.headers.get('etag')]).toEqual([304, '', tag]);
    await publishChange(club);
    expect((await browser(page, { headers: { 'if-none-match': tag } })).status).toBe(200);
  });

  test('of a visitor may be kept by anybody, of a member by their browser', async () => {
    const club = await openHttpClub();
    expect((await club.openBrowser()(page)).headers.get('cache-control')).toBe('public, max-age=0, must-revalidate');
    const member = await club.signedIn(club.people.writer);
    expect((await member(page)).headers.get('cache-control')).toBe('private, no-cache');
  });

  test('answers HEAD with the headers of GET', async () => {
    const club = await openHttpClub();
    const [get, head] = [await club.openBrowser()(page), await club.openBrowser()(page, { method: 'HEAD' })];
    expect(head.status).toBe(200);
    expect(await head.text()).toBe('');
    for (const name of ['etag', 'content-type']) expect(head.headers.get(name)).toBe(get.headers.get(name));
  });

  test('is compressed for who takes it, with a tag of its own', async () => {
    const club = await openHttpClub();
    const browser = club.openBrowser();
    const plain = await browser(page, { headers: { 'accept-encoding': 'identity' } });
    const brotli = await browser(page, { headers: { 'accept-encoding': 'br' } });
    expect(brotli.headers.get('content-encoding')).toBe('br');
    expect(brotli.headers.get('etag')).not.toBe(plain.headers.get('etag'));
    expect(await brotli.text()).toBe(await plain.text());
    const known = { 'if-none-match': brotli.headers.get('etag') ?? '', 'accept-encoding': 'gzip' };
    expect((await browser(page, { headers: known })).status).toBe(304);
  });
});

describe('a write that depends on what was read', () => {
  async function openWithWaiting() {
    const club = await openHttpClub();
    const { proposals } = club.context.services;
    const { writer } = club.people;
    const draft = accepted(
      await proposals.propose(writer, {
        ...testbike.pinouts,
        baseRevision: 1,
        markdown: changed,
        summary: 'Main beam is blue.',
      }),
    );
    accepted(await proposals.send(writer, draft.id));
    const moderator = await club.signedIn(club.people.moderator);
    const path = `/api/proposals/${draft.id}`;
    const tag = (await moderator(path)).headers.get('etag') ?? '';
    return { club, moderator, path, tag, draft };
  }

  test('passes where it is as it was read', async () => {
    const { moderator, path, tag } = await openWithWaiting();
    const response = await moderator(`${path}/publish`, sendJson('POST', {}, { 'if-match': tag }));
    expect(response.status).toBe(200);
    expect((await response.json()).state).toBe('published');
  });

  test('is answered 412 where it has changed since, and changes nothing', async () => {
    const { club, moderator, path, tag, draft } = await openWithWaiting();
    accepted(await club.context.services.proposals.addNote(club.people.writer, draft.id, { text: 'Wait a moment.' }));
    const response = await moderator(`${path}/publish`, sendJson('POST', {}, { 'if-match': tag }));
    expect(response.status).toBe(412);
    expect(await response.json()).toMatchObject({ code: 'behind-what-was-read' });
    expect((await (await moderator(path)).json()).state).toBe('waiting');
  });

  test('from who may not read it is refused as it would be without', async () => {
    const { club, path } = await openWithWaiting();
    const visitor = await club.openBrowser()(`${path}/publish`, sendJson('POST', {}, { 'if-match': '"other"' }));
    expect(visitor.status).toBe(401);
  });

  test('made what can be read where it says', async () => {
    const club = await openHttpClub();
    const writer = await club.signedIn(club.people.writer);
    const body = { ...testbike.pinouts, baseRevision: 1, markdown: changed, summary: 'Main beam is blue.' };
    const response = await writer('/api/proposals', sendJson('POST', body));
    expect(response.status).toBe(201);
    expect(response.headers.get('cache-control')).toBe('no-store');
    const made = await response.json();
    expect(response.headers.get('location')).toBe(`/api/proposals/${String(made.id)}`);
    expect(await (await writer(response.headers.get('location') ?? '')).json()).toEqual(made);
  });

  test('with a base that was never published is answered 409', async () => {
    const club = await openHttpClub();
    const writer = await club.signedIn(club.people.writer);
    const body = { ...testbike.pinouts, baseRevision: null, markdown: changed, summary: 'Anew.' };
    const response = await writer('/api/proposals', sendJson('POST', body));
    expect(response.status).toBe(409);
  });
});
