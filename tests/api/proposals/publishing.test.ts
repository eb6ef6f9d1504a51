import { describe, expect, it } from 'vitest';
import { createAuditLog } from '../../../server/db/audit-log.ts';
import type { PageAddress } from '../../../shared/pages/address.ts';
import { accepted, openBookWithDonor, openTestBook, refused, testbike } from '../../factories/book.ts';
import { connectorBlock, overviewText, pageText, stoppingBlock } from '../../factories/page-texts.ts';

type Book = ReturnType<typeof openTestBook>;

/** How many rows the tables of a publication have: what a refused one must not have changed. */
function counts({ database }: Book): unknown {
  const tables = [
    'subjects',
    'pages',
    'revisions',
    'revision_bodies',
    'renditions',
    'page_digests',
    'search_documents',
    'overrides',
  ];
  const select = tables.map((table) => `(SELECT count(*) FROM ${table}) AS ${table}`);
  return database.sqlite.prepare(`SELECT ${select.join(', ')}, (SELECT sum(version) FROM subjects) AS version`).get();
}

describe('publishing', () => {
  it('makes a donor of an overview: its first revision, in everything that is derived from it', async () => {
    const book = openTestBook();
    const published = await book.publish(testbike.overview, overviewText());
    expect([published.state, published.publishedAs, published.decidedBy?.name]).toEqual(['published', 1, 'Moderator']);
    const page = accepted(await book.pages.page(null, testbike.overview, { year: null, market: null, frame: null }));
    expect([page.title, page.revision, page.author.name, page.publishedBy?.name]).toEqual([
      'Testbike 500',
      1,
      'Writer',
      'Moderator',
    ]);
    expect(page.html).toContain('A donor invented for a test.');
    expect(book.pages.publishedDocument(testbike.overview)).toMatchObject({
      revision: 1,
      subjectTitle: 'Testbike 500',
    });
    expect(book.told).toEqual([{ kind: 'published', address: testbike.overview, revision: 1 }]);
    expect(counts(book)).toMatchObject({ subjects: 1, pages: 1, revisions: 1, revision_bodies: 1, version: 1 });
  });

  it('counts revisions by publications only, and raises the subject’s version each time', async () => {
    const book = await openBookWithDonor();
    await book.publish(testbike.pinouts, pageText({ body: 'One.' }));
    await book.propose(testbike.pinouts, pageText({ body: 'Never sent.' }));
    const second = await book.publish(testbike.pinouts, pageText({ body: 'Two.' }));
    expect(second.publishedAs).toBe(2);
    expect(book.publication.standing(testbike.pinouts)).toMatchObject({
      subject: { version: 3 },
      page: { revision: 2 },
    });
  });

  it('keeps the text as it was written, with the lines’ ends of the book', async () => {
    const book = await openBookWithDonor();
    const markdown = pageText({ body: 'Two  spaces,\ta tab, Ω and “quotes”.' });
    await book.publish(testbike.pinouts, markdown.replaceAll('\n', '\r\n'));
    expect(book.publication.markdown(testbike.pinouts)).toBe(markdown);
  });

  it('takes one of two that start from the same revision, and says to the other that it has fallen behind', async () => {
    const book = await openBookWithDonor();
    await book.publish(testbike.pinouts, pageText({ body: 'The horn’s lead is brown.' }));
    const { writer, hobbyist, moderator, secondModerator } = book.people;
    const one = await book.proposeAndSend(testbike.pinouts, pageText({ body: 'The horn’s lead is black.' }), writer);
    const other = await book.proposeAndSend(
      testbike.pinouts,
      pageText({ body: 'The horn’s lead is green.' }),
      hobbyist,
    );
    const outcomes = await Promise.all([
      book.proposals.publish(moderator, one.id, {}),
      book.proposals.publish(secondModerator, other.id, {}),
    ]);
    expect(outcomes.map((outcome) => (outcome.ok ? outcome.value.publishedAs : outcome.refusal.code))).toEqual([
      2,
      'fallen-behind',
    ]);
    expect(book.publication.markdown(testbike.pinouts)).toContain('is black.');
    const behind = accepted(await book.proposals.proposal(hobbyist, other.id));
    expect([behind.state, behind.fallenBehind, behind.publishedRevision, behind.baseRevision]).toEqual([
      'waiting',
      true,
      2,
      1,
    ]);
    expect(behind.versions.at(-1)?.markdown).toContain('is green.');
    expect(behind.publishedMarkdown).toContain('is black.');
    const changed = behind.meanwhile?.lines.filter(({ kind }) => kind !== 'same');
    expect(changed?.map(({ words }) => words.map(({ kind, text }) => `${kind}: ${text}`))).toEqual([
      ['same: The horn’s lead is ', 'removed: brown', 'added: black', 'same: .'],
    ]);
  });

  it('goes on when its author brings it up to date', async () => {
    const book = await openBookWithDonor();
    await book.publish(testbike.pinouts, pageText({ body: 'One.' }));
    const waiting = await book.proposeAndSend(testbike.pinouts, pageText({ body: 'Mine.' }), book.people.hobbyist);
    await book.publish(testbike.pinouts, pageText({ body: 'Two.' }));
    const merged = { markdown: pageText({ body: 'Two and mine.' }), summary: 'Both', baseRevision: 2 };
    const updated = accepted(await book.proposals.addVersion(book.people.hobbyist, waiting.id, merged));
    expect([updated.state, updated.fallenBehind, updated.versions.length]).toEqual(['waiting', false, 2]);
    expect(accepted(await book.proposals.publish(book.people.moderator, waiting.id, {})).publishedAs).toBe(3);
  });

  it('is decided again, not refused, when another page of the subject is published at the same time', async () => {
    const book = await openBookWithDonor();
    const pinouts = await book.proposeAndSend(testbike.pinouts, pageText({ body: 'Pinouts.' }));
    const quirks = await book.proposeAndSend(testbike.quirks, pageText({ title: 'Quirks', kind: 'quirks' }));
    const outcomes = await Promise.all(
      [pinouts, quirks].map(({ id }) => book.proposals.publish(book.people.moderator, id, {})),
    );
    expect(outcomes.map((outcome) => (outcome.ok ? outcome.value.state : outcome.refusal.code))).toEqual([
      'published',
      'published',
    ]);
    expect(book.publication.standing(testbike.pinouts).subject?.version).toBe(3);
  });

  it('finds what another page said meanwhile: the second of two connectors with one name is stopped', async () => {
    const book = await openBookWithDonor();
    const other: PageAddress = { ...testbike.pinouts, page: 'pinouts-rear' };
    const one = await book.proposeAndSend(testbike.pinouts, pageText({ body: connectorBlock('headlight') }));
    const two = await book.proposeAndSend(other, pageText({ body: connectorBlock('headlight') }));
    expect(two.findings.map(({ code }) => code)).not.toContain('id-repeated');
    const outcomes = await Promise.all(
      [one, two].map(({ id }) => book.proposals.publish(book.people.moderator, id, {})),
    );
    expect(outcomes.map((outcome) => (outcome.ok ? outcome.value.state : outcome.refusal.code))).toEqual([
      'published',
      'override-needed',
    ]);
  });

  it('is of the version that was read: a newer one is answered with a refusal', async () => {
    const book = await openBookWithDonor();
    const { id } = await book.proposeAndSend(testbike.pinouts, pageText({ body: 'One.' }));
    const newer = { markdown: pageText({ body: 'Two.' }), summary: 'Better', baseRevision: null };
    accepted(await book.proposals.addVersion(book.people.writer, id, newer));
    const before = counts(book);
    expect(refused(await book.proposals.publish(book.people.moderator, id, { version: 1 })).code).toBe('conflict');
    expect(counts(book)).toEqual(before);
    expect(accepted(await book.proposals.publish(book.people.moderator, id, { version: 2 })).state).toBe('published');
    expect(book.publication.markdown(testbike.pinouts)).toContain('Two.');
  });

  it('writes the audit a row that its chain holds', async () => {
    const book = await openBookWithDonor();
    const { id } = await book.publish(testbike.pinouts, pageText());
    const row = book.database.sqlite.prepare('SELECT * FROM audit ORDER BY number DESC LIMIT 1').get();
    expect(row).toMatchObject({ actor_id: 'moderator', action: 'publish', subject: 'donors/testbike-500/pinouts' });
    expect(JSON.parse((row as { details: string }).details)).toMatchObject({ proposal: id, version: 1, revision: 1 });
    expect(createAuditLog(book.database).firstBrokenLink()).toBeNull();
  });

  it('tells nobody before it is committed, and nobody at all when it is refused', async () => {
    const book = await openBookWithDonor();
    const { id } = await book.proposeAndSend(testbike.pinouts, pageText({ body: stoppingBlock() }));
    refused(await book.proposals.publish(book.people.moderator, id, {}));
    expect(book.told).toEqual([]);
    const seen: unknown[] = [];
    book.events.listen(() =>
      seen.push(book.publication.standing(testbike.quirks).page?.revision, book.database.sqlite.inTransaction),
    );
    await book.publish(testbike.quirks, pageText({ title: 'Quirks', kind: 'quirks' }));
    expect(seen).toEqual([1, false]);
  });
});

describe('publishing a new subject', () => {
  it('refuses the second of two with one address, and keeps its text', async () => {
    const book = openTestBook();
    const one = await book.proposeAndSend(testbike.overview, overviewText('One'));
    const two = await book.proposeAndSend(testbike.overview, overviewText('Two'), book.people.hobbyist);
    accepted(await book.proposals.publish(book.people.moderator, one.id, {}));
    const before = counts(book);
    expect(refused(await book.proposals.publish(book.people.moderator, two.id, {})).code).toBe('already-there');
    expect(counts(book)).toEqual(before);
    const kept = accepted(await book.proposals.proposal(book.people.hobbyist, two.id));
    expect([kept.state, kept.versions.at(-1)?.markdown]).toEqual(['waiting', overviewText('Two')]);
  });

  it('lets its other pages wait beside its overview, and publishes them after it', async () => {
    const book = openTestBook();
    const overview = await book.proposeAndSend(testbike.overview, overviewText());
    const pinouts = await book.proposeAndSend(testbike.pinouts, pageText());
    const early = refused(await book.proposals.publish(book.people.moderator, pinouts.id, {}));
    expect([early.code, early.detail]).toEqual(['wrong-state', expect.stringContaining('publish the overview first')]);
    accepted(await book.proposals.publish(book.people.moderator, overview.id, {}));
    expect(accepted(await book.proposals.publish(book.people.moderator, pinouts.id, {})).publishedAs).toBe(1);
  });

  it('wants an overview to say so, and no other page to', async () => {
    const book = openTestBook();
    const overview = await book.propose(testbike.overview, pageText({ kind: 'notes' }));
    expect(refused(await book.proposals.send(book.people.writer, overview.id)).code).toBe('not-acceptable-text');
    const pinouts = await book.propose(testbike.pinouts, overviewText());
    expect(refused(await book.proposals.send(book.people.writer, pinouts.id)).code).toBe('not-acceptable-text');
  });

  it('takes its new title from a new revision of its overview', async () => {
    const book = await openBookWithDonor();
    await book.publish(testbike.overview, overviewText('Testbike 500 and 550'));
    expect(book.publication.standing(testbike.overview).subject?.title).toBe('Testbike 500 and 550');
  });
});

describe('a finding that stops', () => {
  it('stops publication until it is let through with a reason, which the page carries', async () => {
    const book = await openBookWithDonor();
    const { id, findings } = await book.proposeAndSend(testbike.pinouts, pageText({ body: stoppingBlock() }));
    const stop = findings.find(({ severity }) => severity === 'stop');
    expect(stop).toMatchObject({ code: 'cavity-outside-face', address: '#headlight.9' });
    const before = counts(book);
    const refusal = refused(await book.proposals.publish(book.people.moderator, id, {}));
    expect([refusal.code, refusal.status]).toEqual(['override-needed', 409]);
    expect(refusal.missing).toEqual([{ code: 'cavity-outside-face', address: '#headlight.9', message: stop?.message }]);
    expect(counts(book)).toEqual(before);

    const other = [{ code: 'cavity-outside-face', address: '#headlight.8', reason: 'Another line.' }];
    expect(refused(await book.proposals.publish(book.people.moderator, id, { overrides: other })).code).toBe(
      'override-needed',
    );
    const blank = [{ code: 'cavity-outside-face', address: '#headlight.9', reason: '  ' }];
    expect(refused(await book.proposals.publish(book.people.moderator, id, { overrides: blank })).code).toBe(
      'fields-invalid',
    );

    const overrides = [{ code: 'cavity-outside-face', address: '#headlight.9', reason: 'A pigtail behind the shell.' }];
    expect(accepted(await book.proposals.publish(book.people.moderator, id, { overrides })).overrides).toEqual(
      overrides,
    );
    const page = accepted(await book.pages.page(null, testbike.pinouts, { year: null, market: null, frame: null }));
    expect(page.overrides).toEqual(overrides);
    expect(page.findings[0]).toMatchObject({ code: 'cavity-outside-face', severity: 'stop' });
  });

  it('keeps no reason for what was not found', async () => {
    const book = await openBookWithDonor();
    const { id } = await book.proposeAndSend(testbike.pinouts, pageText());
    const overrides = [{ code: 'id-repeated', address: null, reason: 'To be on the safe side.' }];
    expect(accepted(await book.proposals.publish(book.people.moderator, id, { overrides })).overrides).toEqual([]);
  });
});
