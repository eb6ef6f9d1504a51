import { describe, expect, it } from 'vitest';
import { createPagePublication } from '../../../server/pages/page-publication.ts';
import { refreshDerived } from '../../../server/pages/refresh-derived.ts';
import {
  compareViewSchema,
  homeViewSchema,
  pageDataSchema,
  pageViewSchema,
  previewViewSchema,
  revisionsViewSchema,
  shelfViewSchema,
  subjectViewSchema,
} from '../../../shared/contracts/views.ts';
import { anyVariant } from '../../../shared/pages/applicability.ts';
import { accepted, openBookWithDonor, openTestBook, refused, testbike } from '../../factories/book.ts';
import { connectorBlock, pageText } from '../../factories/page-texts.ts';

/** A donor with pinouts of two revisions: the second cavity's wire was corrected. */
async function openBookWithPinouts() {
  const book = await openBookWithDonor();
  await book.publish(testbike.pinouts, pageText({ body: connectorBlock('headlight', 'Y/B') }));
  await book.publish(testbike.pinouts, pageText({ body: connectorBlock('headlight', 'Y/R') }));
  return book;
}

describe('reading the book', () => {
  it('gives a page with its history, its neighbours and its rendering', async () => {
    const { pages } = await openBookWithPinouts();
    const page = pageViewSchema.parse(accepted(await pages.page(null, testbike.pinouts, anyVariant)));
    expect(page).toMatchObject({
      address: 'donors/testbike-500/pinouts',
      subjectTitle: 'Testbike 500',
      revision: 2,
      newestRevision: 2,
      retired: false,
      author: { name: 'Writer' },
      publishedBy: { name: 'Moderator' },
      facts: { model: 'Testbike 500', markets: ['UK', 'EU'] },
      choices: { years: { from: 1978, to: 1981 }, markets: ['EU', 'UK'] },
    });
    expect(page.lastRevisions.map(({ number }) => number)).toEqual([2, 1]);
    expect(page.siblings.map((sibling) => sibling.page)).toEqual(['overview', 'pinouts']);
    expect(page.html).toContain('id="headlight.2"');
  });

  it('gives an old revision as it was, and says which is the newest', async () => {
    const { pages } = await openBookWithPinouts();
    const old = accepted(await pages.revision(null, testbike.pinouts, 1, anyVariant));
    expect([old.revision, old.newestRevision]).toEqual([1, 2]);
    expect(old.html).toContain('Y/B');
    expect(old.html).not.toContain('Y/R');
    expect(refused(await pages.revision(null, testbike.pinouts, 3, anyVariant)).code).toBe('not-found');
  });

  it('gives a page’s data with the address, claim and mark of each line', async () => {
    const { pages } = await openBookWithPinouts();
    const data = pageDataSchema.parse(accepted(await pages.pageData(null, testbike.pinouts, anyVariant)));
    expect(data.markdown).toBe(pageText({ body: connectorBlock('headlight', 'Y/R') }));
    expect(data.blocks).toHaveLength(1);
    expect(data.lines.map(({ address, mark }) => `${address} ${mark}`)).toEqual([
      'donors/testbike-500/pinouts#headlight.1 cited',
      'donors/testbike-500/pinouts#headlight.2 cited',
      'donors/testbike-500/pinouts#headlight.3 cited',
    ]);
    for (const { claim } of data.lines) expect(claim).toMatch(/^[0-9a-f]{16}$/);
  });

  it('gives a changed line another claim, and the lines beside it the same', async () => {
    const { pages, publish } = await openBookWithPinouts();
    const claims = async () =>
      accepted(await pages.pageData(null, testbike.pinouts, anyVariant)).lines.map(({ claim }) => claim);
    const before = await claims();
    await publish(testbike.pinouts, pageText({ body: connectorBlock('headlight', 'Y/G') }));
    const after = await claims();
    expect(after.map((claim, index) => claim === before[index])).toEqual([true, false, true]);
  });

  it('compares two revisions by row', async () => {
    const { pages } = await openBookWithPinouts();
    const compared = compareViewSchema.parse(accepted(await pages.compare(null, testbike.pinouts, 1, 2)));
    expect([compared.from.number, compared.to.number, compared.difference.coarse]).toEqual([1, 2, false]);
    const changed = compared.difference.lines.filter(({ kind }) => kind !== 'same');
    expect(changed).toHaveLength(1);
    expect(changed[0]).toMatchObject({ kind: 'changed', table: true });
    expect(changed[0]?.words.filter(({ kind }) => kind !== 'same').map(({ text }) => text)).toEqual(['Y/B', 'Y/R']);
    expect(refused(await pages.compare(null, testbike.pinouts, 1, 9)).code).toBe('not-found');
  });

  it('lists a page’s revisions, the newest first', async () => {
    const { pages } = await openBookWithPinouts();
    const { revisions } = revisionsViewSchema.parse(accepted(await pages.revisions(null, testbike.pinouts)));
    expect(revisions.map(({ number }) => number)).toEqual([2, 1]);
    for (const { proposal } of revisions) expect(proposal).not.toBeNull();
  });

  it('gives shelves, a subject and the home page their counts', async () => {
    const { pages } = await openBookWithPinouts();
    const { subjects } = shelfViewSchema.parse(accepted(await pages.shelf(null, 'donors')));
    expect(subjects).toMatchObject([
      {
        slug: 'testbike-500',
        pages: 2,
        connectors: 1,
        lines: 3,
        cited: 3,
        zones: [{ zone: 'headlight', connectors: 1 }],
      },
    ]);
    expect(accepted(await pages.shelf(null, 'parts')).subjects).toEqual([]);
    const subject = subjectViewSchema.parse(accepted(await pages.subject(null, testbike.overview)));
    expect(subject.pages.map(({ page }) => page)).toEqual(['overview', 'pinouts']);
    expect(subject.connectors).toEqual([
      { page: 'pinouts', id: 'headlight', name: 'Headlight', zone: 'headlight', cavities: 3, layout: 'xxx' },
    ]);
    const home = homeViewSchema.parse(accepted(await pages.home(null)));
    expect(home.shelves).toEqual([
      { shelf: 'donors', subjects: 1, lines: 3 },
      { shelf: 'parts', subjects: 0, lines: 0 },
      { shelf: 'reference', subjects: 0, lines: 0 },
    ]);
    expect(home.lately.map(({ page }) => page)).toEqual(['pinouts', 'overview']);
  });

  it('sets lines back that the chosen bike does not have', async () => {
    const { pages, publish } = await openBookWithDonor();
    const body = `:::connector{#tail layout="2" seen="wire side" first="top left" latch="top" cite="m1"}
| Cavity | Wire | Years |
| ------ | ---- | ----- |
| 1 | Y | 1978-1979 |
| 2 | B | |
:::`;
    await publish(testbike.pinouts, pageText({ body }));
    const seen = async (year: number | null) =>
      accepted(await pages.page(null, testbike.pinouts, { year, market: null, frame: null })).html.includes('set-back');
    expect([await seen(null), await seen(1979), await seen(1980)]).toEqual([false, false, true]);
  });

  it('says of what is not there that it is not', async () => {
    const { pages } = await openBookWithDonor();
    const missing = { ...testbike.overview, subject: 'not-there' };
    const answers = [
      await pages.subject(null, missing),
      await pages.page(null, missing, anyVariant),
      await pages.page(null, { ...testbike.overview, shelf: 'parts' }, anyVariant),
      await pages.page(null, testbike.quirks, anyVariant),
      await pages.pageData(null, missing, anyVariant),
      await pages.revisions(null, missing),
      await pages.compare(null, missing, 1, 1),
    ];
    expect(answers.map((answer) => refused(answer).code)).toEqual(answers.map(() => 'not-found'));
  });
});

describe('a page that was retired', () => {
  it('is still there, says so, and is in no list, until its next revision brings it back', async () => {
    const { pages, database, publish } = await openBookWithPinouts();
    database.sqlite.exec(`UPDATE pages SET retired_at = '2026-02-01T00:00:00.000Z' WHERE slug = 'pinouts';
      UPDATE subjects SET version = version + 1`);
    expect(accepted(await pages.page(null, testbike.pinouts, anyVariant))).toMatchObject({
      retired: true,
      revision: 2,
    });
    expect(accepted(await pages.subject(null, testbike.overview)).pages.map(({ page }) => page)).toEqual(['overview']);
    expect(accepted(await pages.home(null)).lately.map(({ page }) => page)).toEqual(['overview']);
    expect([...pages.publishedDocuments()].map(({ address }) => address.page)).toEqual(['overview']);
    expect(pages.publishedDocument(testbike.pinouts)).toBeNull();
    await publish(testbike.pinouts, pageText());
    expect(accepted(await pages.page(null, testbike.pinouts, anyVariant))).toMatchObject({
      retired: false,
      revision: 3,
    });
  });
});

describe('a book that is kept to members', () => {
  it('is closed to visitors and to who is suspended, in every call', async () => {
    const { pages, people } = openTestBook({ reading: 'members' });
    const calls = (actor: typeof people.writer | null) => [
      pages.home(actor),
      pages.shelf(actor, 'donors'),
      pages.subject(actor, testbike.overview),
      pages.page(actor, testbike.overview, anyVariant),
      pages.pageData(actor, testbike.overview, anyVariant),
      pages.revisions(actor, testbike.overview),
      pages.revision(actor, testbike.overview, 1, anyVariant),
      pages.compare(actor, testbike.overview, 1, 1),
      pages.preview(actor, { markdown: '' }, '192.0.2.1'),
    ];
    const codes = async (actor: typeof people.writer | null) =>
      (await Promise.all(calls(actor))).map((answer) => (answer.ok ? 'accepted' : answer.refusal.code));
    expect(new Set(await codes(null))).toEqual(new Set(['sign-in-needed']));
    expect(new Set(await codes({ ...people.writer, suspended: true }))).toEqual(new Set(['not-allowed']));
    expect(accepted(await pages.home(people.hobbyist)).lately).toEqual([]);
  });
});

describe('looking at a text before it is proposed', () => {
  it('gives its rendering, outline, blocks and findings', async () => {
    const { pages } = await openBookWithDonor();
    const markdown = pageText({ body: `## Front\n\n${connectorBlock('front')}` });
    const preview = previewViewSchema.parse(accepted(await pages.preview(null, { markdown }, '192.0.2.1')));
    expect(preview.html).toContain('id="front.2"');
    expect(preview.outline.map(({ text }) => text)).toEqual(['Front']);
    expect(preview.blocks).toHaveLength(1);
  });

  it('knows the subject’s other pages where it is told the subject, and leaves out its own page', async () => {
    const { pages } = await openBookWithPinouts();
    const markdown = pageText({ body: connectorBlock('headlight') });
    const codes = async (where: object) =>
      accepted(await pages.preview(null, { markdown, ...where }, '192.0.2.1')).findings.map(({ code }) => code);
    expect(await codes({})).not.toContain('id-repeated');
    expect(await codes(testbike.pinouts)).not.toContain('id-repeated');
    expect(await codes({ ...testbike.pinouts, page: 'pinouts-rear' })).toContain('id-repeated');
    expect(await codes({ shelf: 'donors', subject: 'testbike-500' })).toContain('id-repeated');
  });

  it('refuses what cannot be read, in words that say that the text is kept', async () => {
    const { pages } = await openBookWithDonor();
    const deep = refused(await pages.preview(null, { markdown: `${'> '.repeat(40)}deep` }, '192.0.2.1'));
    expect([deep.code, deep.detail]).toEqual([
      'not-acceptable-text',
      expect.stringContaining('stands where you wrote it'),
    ]);
    const long = refused(await pages.preview(null, { markdown: 'a'.repeat(65 * 1024) }, '192.0.2.1'));
    expect([long.code, Object.keys(long.fields ?? {})]).toEqual(['fields-invalid', ['markdown']]);
  });
});

describe('what is derived from a page', () => {
  it('is made again from its text where another version of the dialect made it', async () => {
    const { database, parsePool, newId, pages } = await openBookWithPinouts();
    const before = accepted(await pages.subject(null, testbike.overview));
    const documents = [...pages.publishedDocuments()];
    database.sqlite.exec(`
      UPDATE page_digests SET dialect_version = 0, lines = 0, cited = 0;
      UPDATE search_documents SET dialect_version = 0, document = '{}';
      UPDATE renditions SET dialect_version = 0, text = '{}';
    `);
    const publication = createPagePublication(database, newId);
    expect(await refreshDerived(database, publication, parsePool)).toEqual([]);
    expect(accepted(await pages.subject(null, testbike.overview))).toEqual(before);
    expect([...pages.publishedDocuments()]).toEqual(documents);
    // The old revision's text is read again when somebody asks for it.
    const old = accepted(await pages.revision(null, testbike.pinouts, 1, anyVariant));
    expect(old.html).toContain('Y/B');
  });
});
