import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { createBookEvents } from '../../server/pages/book-events.ts';
import type { PublishedDocument } from '../../server/pages/page-service-types.ts';
import { createSearchService, type SearchService } from '../../server/search/search-service.ts';
import type { SearchView } from '../../shared/contracts/views.ts';
import { searchViewSchema } from '../../shared/contracts/views.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { formatPageAddress, type PageAddress } from '../../shared/pages/address.ts';
import { isLinesFile, openLinesIndex } from '../../shared/search/lines-index.ts';
import { createProseIndex } from '../../shared/search/prose-index.ts';
import { isProseFile, prosePages } from '../../shared/search/prose-file.ts';
import { search } from '../../shared/search/search.ts';
import type { Member } from '../../shared/members/member.ts';
import { demoTexts } from '../factories/demo-documents.ts';
import { expectGolden } from './expect-golden.ts';
import { goldenQueries } from './golden-list.ts';

const member: Member = {
  id: 'm',
  name: 'Hobbyist',
  email: 'hobbyist@earthstrap.example',
  role: 'member',
  suspended: false,
};
const onceUponATime = { revision: 1, publishedAt: '2026-01-01T12:00:00.000Z' };
let published: Map<string, PublishedDocument>;
const services: SearchService[] = [];

function openService(reading: 'open' | 'members' = 'open') {
  const book = new Map(published);
  const events = createBookEvents((failure) => {
    throw failure;
  });
  const service = createSearchService({
    pages: {
      publishedDocuments: () => [...book.values()],
      publishedDocument: (address: PageAddress) => book.get(formatPageAddress(address)) ?? null,
    },
    events,
    reading,
    onFailure: (failure) => {
      throw failure;
    },
  });
  services.push(service);
  return { service, events, book };
}

async function ask(service: SearchService, query: string): Promise<SearchView> {
  const answer = await service.search(null, query, null, anyVariant);
  if (!answer.ok) throw new Error(answer.refusal.title);
  return answer.value;
}

beforeAll(() => {
  published = new Map(demoTexts().map((text) => [formatPageAddress(text.address), { ...text, ...onceUponATime }]));
}, 120_000);

afterAll(async () => {
  await Promise.all(services.map((service) => service.close()));
});

describe('the server searches in a thread of its own', () => {
  test('and answers the golden list as the indexes do', { timeout: 120_000 }, async () => {
    const { service } = openService();
    for (const entry of goldenQueries()) {
      const { query, bench, year, market } = entry;
      const answer = await service.search(null, query, bench, { year, market, frame: null });
      if (!answer.ok) throw new Error(answer.refusal.title);
      expect(searchViewSchema.safeParse(answer.value).error).toBeUndefined();
      expectGolden(entry, answer.value);
    }
  });

  test('and finds what was published a moment ago, and no longer what it replaced', { timeout: 120_000 }, async () => {
    const { service, events, book } = openService();
    const address: PageAddress = { shelf: 'donors', subject: 'torimachi-qf550', page: 'quirks' };
    const page = published.get(formatPageAddress(address));
    if (page === undefined) throw new Error('the demo has no such page');
    const isOfPage = (hit: { readonly address: string }): boolean => hit.address.startsWith(formatPageAddress(address));
    expect((await ask(service, 'thermal flasher')).hits.some(isOfPage)).toBe(true);
    const sections = [{ id: 's-a-wasp-in-the-horn', heading: 'A wasp in the horn', text: 'It hums.' }];
    const outline = [{ level: 2, text: 'A wasp in the horn', id: 's-a-wasp-in-the-horn', line: 9 }];
    book.set(formatPageAddress(address), { ...page, outline, sections, blocks: [], revision: 2 });
    events.tell({ kind: 'published', address, revision: 2 });
    expect((await ask(service, 'wasp horn')).hits[0]?.address).toBe(
      'donors/torimachi-qf550/quirks#s-a-wasp-in-the-horn',
    );
    expect((await ask(service, 'thermal flasher')).hits.some(isOfPage)).toBe(false);
    book.delete(formatPageAddress(address));
    events.tell({ kind: 'published', address, revision: 3 });
    expect((await ask(service, 'wasp horn')).hits.some(isOfPage)).toBe(false);
  });

  test('and refuses a visitor where the club reads among itself', async () => {
    const { service } = openService('members');
    expect(await service.search(null, 'horn', null, anyVariant)).toMatchObject({ ok: false, refusal: { status: 401 } });
    expect(await service.manifest(null)).toMatchObject({ ok: false, refusal: { status: 401 } });
    expect(await service.file(null, 'anything.json')).toMatchObject({ ok: false, refusal: { status: 401 } });
    expect(await service.search({ ...member, suspended: true }, 'horn', null, anyVariant)).toMatchObject({
      ok: false,
      refusal: { status: 403 },
    });
  });
});

describe('the files that browsers fetch', () => {
  test('answer as the server does, and are named by what they say', { timeout: 120_000 }, async () => {
    const { service } = openService();
    const manifest = await service.manifest(member);
    if (!manifest.ok) throw new Error(manifest.refusal.title);
    const [lines, prose] = await Promise.all(
      [manifest.value.lines.name, manifest.value.prose.name].map(async (name): Promise<unknown> => {
        const file = await service.file(member, name);
        if (!file.ok || file.value === null) throw new Error(`no file ${name}`);
        return JSON.parse(Buffer.from(file.value.identity).toString('utf8'));
      }),
    );
    if (!isLinesFile(lines) || !isProseFile(prose)) throw new Error('not files of the index');
    const index = openLinesIndex(lines);
    const browser = { lines: index, prose: createProseIndex() };
    for (const page of prosePages(index, prose)) browser.prose.setPage(page);
    for (const query of ['yellow red headlight', 'lithium freezing', 'headlight 9', 'torimachi']) {
      expect(search(browser, query)).toEqual(await ask(service, query));
    }
    const again = await openService().service.manifest(member);
    expect(again).toEqual(manifest);
  });

  test(
    'change their names when something is published, and the old ones are still there for who has just read of them',
    { timeout: 120_000 },
    async () => {
      const { service, events, book } = openService();
      const before = await service.manifest(member);
      if (!before.ok) throw new Error(before.refusal.title);
      const address: PageAddress = { shelf: 'donors', subject: 'torimachi-qf550', page: 'quirks' };
      book.delete(formatPageAddress(address));
      events.tell({ kind: 'published', address, revision: 2 });
      await expect
        .poll(
          async () => {
            const now = await service.manifest(member);
            return now.ok && now.value.prose.name !== before.value.prose.name;
          },
          { timeout: 60_000 },
        )
        .toBe(true);
      expect(await service.file(member, before.value.prose.name)).toMatchObject({
        ok: true,
        value: { name: before.value.prose.name },
      });
      expect(await service.file(member, 'nothing.json')).toEqual({ ok: true, value: null });
    },
  );
});
