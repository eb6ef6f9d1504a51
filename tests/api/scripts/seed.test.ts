import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it, onTestFinished } from 'vitest';
import { createMemberService } from '../../../server/members/member-service.ts';
import { createBookEvents } from '../../../server/pages/book-events.ts';
import { createPagePublication } from '../../../server/pages/page-publication.ts';
import { createPageService } from '../../../server/pages/page-service.ts';
import { createParsePool } from '../../../server/pages/parse-pool.ts';
import type { ParsePool } from '../../../server/pages/parse-pool-types.ts';
import { createProposalService } from '../../../server/proposals/proposal-service.ts';
import { readSeedContent } from '../../../server/scripts/seed-content.ts';
import { demoPassword, isBookEmpty, seedDemo } from '../../../server/scripts/seed.ts';
import { anyVariant } from '../../../shared/pages/applicability.ts';
import { accepted, refused } from '../../factories/book.ts';
import { overviewText, pageText, stoppingBlock } from '../../factories/page-texts.ts';
import { createDirectParsePool } from '../../factories/parse-pool.ts';
import { openTestDatabase, temporaryFolder } from '../../setup/database.ts';

const contentFolder = fileURLToPath(new URL('../../../content', import.meta.url));
const now = (): number => Date.UTC(2026, 5, 1);

/** An empty book with its services, to be seeded. */
function openEmptyBook(parsePool: ParsePool = createDirectParsePool()) {
  const database = openTestDatabase();
  let ids = 0;
  const newId = (): string => `id-${String((ids += 1))}`;
  const publication = createPagePublication(database, newId);
  const events = createBookEvents((failure) => {
    throw failure;
  });
  const parts = { database, parsePool, publication, events, now, newId };
  return {
    parts,
    pages: createPageService({ database, parsePool, publication, reading: 'open' }),
    proposals: createProposalService({ ...parts, now: () => new Date(now()) }),
    members: createMemberService(parts),
  };
}

/** A folder like `content/`, with these files in it. */
function contentOf(files: Readonly<Record<string, string>>): string {
  const folder = temporaryFolder();
  for (const [file, text] of Object.entries(files)) {
    mkdirSync(join(folder, file, '..'), { recursive: true });
    writeFileSync(join(folder, file), text);
  }
  return folder;
}

describe('the demo', () => {
  it(
    'is published whole from content/, through the workers, in the words of its files',
    { timeout: 240_000 },
    async () => {
      const parsePool = createParsePool({ workers: 1, now: () => performance.now() });
      onTestFinished(() => parsePool.close());
      const { parts, pages, proposals, members } = openEmptyBook(parsePool);
      const content = readSeedContent(contentFolder);
      const report = await seedDemo(parts, contentFolder);
      expect(content.pages.length).toBeGreaterThan(0);
      expect(report).toMatchObject({ members: 5, pages: content.pages.length, proposals: content.proposals.length });
      expect(isBookEmpty(parts.database)).toBe(false);

      for (const { address, revisions } of content.pages) {
        const page = accepted(await pages.page(null, address, anyVariant));
        expect(page).toMatchObject({
          revision: revisions.length,
          author: { name: 'Demo writer' },
          publishedBy: { name: 'Demo moderator' },
        });
        expect(page.findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
        expect(parts.publication.markdown(address)).toBe(revisions.at(-1)?.markdown);
      }
      const severalRevisions = content.pages.find(({ revisions }) => revisions.length > 1);
      if (severalRevisions === undefined) throw new Error('no page has a history');
      const compared = accepted(await pages.compare(null, severalRevisions.address, 1, 2));
      expect(compared.difference.lines.some(({ kind }) => kind !== 'same')).toBe(true);

      const moderator = accepted(
        await members.signIn({ email: 'moderator@earthstrap.example', password: demoPassword }, '192.0.2.1'),
      );
      const ledger = accepted(await proposals.proposals(moderator, 'waiting', false)).proposals;
      expect(ledger.length).toBe(content.proposals.filter(({ sentBack }) => sentBack === null).length);
      expect(ledger.length).toBeGreaterThanOrEqual(2);
      expect(ledger.map(({ fallenBehind }) => fallenBehind)).not.toContain(true);
      for (const { id } of ledger) {
        expect(accepted(await proposals.proposal(moderator, id)).may.decide).toBe(true);
      }
      const times = accepted(await pages.home(null)).lately.map(({ publishedAt }) => Date.parse(publishedAt));
      expect(times.every((time) => time <= now())).toBe(true);
    },
  );

  it('lets its five people in, each as what they are, and nobody else', async () => {
    const { parts, members } = openEmptyBook();
    await seedDemo(parts, contentOf({ 'donors/d/overview.md': overviewText() }));
    const seen: string[] = [];
    for (const name of ['hobbyist', 'writer', 'moderator', 'second-moderator', 'admin']) {
      const credentials = { email: `${name}@earthstrap.example`, password: demoPassword };
      seen.push(accepted(await members.signIn(credentials, '192.0.2.1')).role);
    }
    expect(seen).toEqual(['member', 'member', 'moderator', 'moderator', 'admin']);
    const wrong = { email: 'admin@earthstrap.example', password: 'bench-lamp-43' };
    expect(refused(await members.signIn(wrong, '192.0.2.1')).code).toBe('sign-in-failed');
  });
});

describe('a seed that is broken', () => {
  const overview = { 'donors/d/overview.md': overviewText() };
  const cases: readonly [string, Readonly<Record<string, string>>, string][] = [
    [
      'with a page that a finding stops',
      { ...overview, 'donors/d/pinouts.md': pageText({ body: stoppingBlock() }) },
      'cavity-outside-face #headlight.9',
    ],
    [
      'with a page that cannot be read',
      { ...overview, 'donors/d/notes.md': pageText({ kind: 'notes', body: '> '.repeat(40) + 'deep' }) },
      'donors/d/notes',
    ],
    ['with a subject that has no overview', { 'donors/d/notes.md': pageText({ kind: 'notes' }) }, 'overview'],
    [
      'with an exchange that finds nothing',
      { ...overview, 'proposals.yaml': '- {page: donors/d/overview, summary: s, exchange: [{find: nowhere, put: x}]}' },
      '0 times',
    ],
    [
      'with an exchange that finds two places',
      {
        ...overview,
        'history.yaml':
          '- {page: donors/d/overview, summary: s, before: [{summary: t, exchange: [{find: Testbike, put: x}]}]}',
      },
      'times, not once',
    ],
    [
      'with a history of no page',
      {
        ...overview,
        'history.yaml': '- {page: donors/d/quirks, summary: s, before: [{summary: t, exchange: [{find: a, put: b}]}]}',
      },
      'there is no page donors/d/quirks',
    ],
    [
      'with a word that nobody knows',
      { ...overview, 'proposals.yaml': '- {page: donors/d/overview, summary: s, words: x}' },
      'cannot be read',
    ],
  ];
  for (const [name, files, said] of cases) {
    it(`${name} fails, says where, and leaves the book empty`, async () => {
      const { parts } = openEmptyBook();
      await expect(seedDemo(parts, contentOf(files))).rejects.toThrow(said);
      expect(isBookEmpty(parts.database)).toBe(true);
      expect(parts.database.sqlite.inTransaction).toBe(false);
      await seedDemo(parts, contentOf(overview));
      expect(isBookEmpty(parts.database)).toBe(false);
    });
  }
});
