import { describe, expect, it } from 'vitest';
import { reservedSlugs } from '../../../shared/pages/address.ts';
import { accepted, openBookWithDonor, openTestBook, refused, testbike } from '../../factories/book.ts';
import { connectorBlock, overviewText, pageText } from '../../factories/page-texts.ts';

describe('proposing', () => {
  it('makes a draft that only its author sees, with its page as it will look and what was found', async () => {
    const { proposals, people, propose } = await openBookWithDonor();
    const draft = await propose(testbike.pinouts, pageText({ body: connectorBlock() }));
    expect([draft.state, draft.title, draft.summary, draft.sentAt]).toEqual(['draft', 'Pinouts', 'Changed.', null]);
    expect(draft.versions).toMatchObject([{ number: 1, sentAt: null, baseRevision: null }]);
    expect(draft.html).toContain('id="headlight.2"');
    expect(draft.difference.lines.every(({ kind }) => kind === 'added')).toBe(true);
    for (const actor of [people.hobbyist, people.moderator, people.admin]) {
      expect(refused(await proposals.proposal(actor, draft.id)).code).toBe('not-found');
      expect(accepted(await proposals.proposals(actor, null, false)).proposals.map(({ id }) => id)).not.toContain(
        draft.id,
      );
    }
    expect(refused(await proposals.proposal(null, draft.id)).code).toBe('sign-in-needed');
    expect(accepted(await proposals.proposals(people.writer, 'draft', true)).proposals.map(({ id }) => id)).toEqual([
      draft.id,
    ]);
  });

  it('is for members', async () => {
    const { proposals, people } = await openBookWithDonor();
    const body = { ...testbike.pinouts, baseRevision: null, markdown: pageText(), summary: 'New' };
    expect(refused(await proposals.propose(null, body)).code).toBe('sign-in-needed');
    expect(refused(await proposals.propose({ ...people.writer, suspended: true }, body)).code).toBe('not-allowed');
  });

  it('says of each field what is wrong with it, and keeps nothing', async () => {
    const { proposals, people, database } = await openBookWithDonor();
    const before = database.sqlite.prepare('SELECT count(*) FROM proposals').get();
    const body = { ...testbike.pinouts, page: 'Not a slug', baseRevision: null, markdown: pageText(), summary: ' ' };
    const refusal = refused(await proposals.propose(people.writer, body));
    expect(refusal.code).toBe('fields-invalid');
    expect(Object.keys(refusal.fields ?? {}).sort()).toEqual(['page', 'summary']);
    expect(refused(await proposals.propose(people.writer, 'nothing')).code).toBe('fields-invalid');
    expect(database.sqlite.prepare('SELECT count(*) FROM proposals').get()).toEqual(before);
  });

  it('keeps the site’s own words from being addresses', async () => {
    const { proposals, people } = openTestBook();
    for (const slug of reservedSlugs) {
      const body = { baseRevision: null, markdown: pageText(), summary: 'New' };
      const page = await proposals.propose(people.writer, { ...testbike.pinouts, page: slug, ...body });
      const subject = await proposals.propose(people.writer, { ...testbike.overview, subject: slug, ...body });
      expect(refused(page).fields).toHaveProperty('page');
      expect(refused(subject).fields).toHaveProperty('subject');
    }
  });

  it('lets a new page move to another address until it is first sent, and never afterwards', async () => {
    const { proposals, people, propose } = await openBookWithDonor();
    const { id, state } = await propose(testbike.pinouts, pageText());
    const text = { markdown: pageText(), summary: 'Moved.', baseRevision: null };
    const moved = accepted(await proposals.addVersion(people.writer, id, { ...text, page: 'front-connectors' }));
    expect([moved.page, moved.state]).toEqual(['front-connectors', state]);
    for (const slug of ['new', 'overview']) {
      const refusal = refused(await proposals.addVersion(people.writer, id, { ...text, page: slug }));
      expect(['fields-invalid', 'already-there']).toContain(refusal.code);
    }
    accepted(await proposals.send(people.writer, id));
    const late = refused(await proposals.addVersion(people.writer, id, { ...text, page: 'elsewhere' }));
    expect(late.code).toBe('wrong-state');
    expect(accepted(await proposals.proposal(people.writer, id)).page).toBe('front-connectors');
  });

  it('refuses a new page where there is one, and a change of a revision that does not exist', async () => {
    const { proposals, people } = await openBookWithDonor();
    const body = { markdown: overviewText('Other'), summary: 'New' };
    const propose = (base: number | null) =>
      proposals.propose(people.writer, { ...testbike.overview, ...body, baseRevision: base });
    expect(refused(await propose(null)).code).toBe('already-there');
    expect(refused(await propose(2)).code).toBe('conflict');
    expect(accepted(await propose(1)).state).toBe('draft');
  });

  it('keeps a text that cannot be read, shows it as it was written, and says which line is at fault', async () => {
    const { proposals, people, propose } = await openBookWithDonor();
    const deep = pageText({ body: `${'> '.repeat(40)}deep <b>` });
    const draft = await propose(testbike.pinouts, deep);
    expect(draft.versions.at(-1)?.markdown).toBe(deep);
    expect(draft.findings).toMatchObject([{ code: 'text-unread', severity: 'stop' }]);
    expect(draft.findings[0]?.line).toBe(deep.split('\n').findIndex((line) => line.includes('deep')) + 1);
    expect(draft.html).toContain('deep &lt;b&gt;');
    const refusal = refused(await proposals.send(people.writer, draft.id));
    expect([refusal.code, refusal.detail]).toEqual([
      'not-acceptable-text',
      expect.stringContaining('what you wrote is kept'),
    ]);
    expect(accepted(await proposals.proposal(people.writer, draft.id)).state).toBe('draft');
  });
});

describe('a draft', () => {
  it('is changed freely and leaves one version when it is sent', async () => {
    const { proposals, people, propose } = await openBookWithDonor();
    const { id } = await propose(testbike.pinouts, pageText({ body: 'One.' }));
    for (const body of ['Two.', 'Three.']) {
      const text = { markdown: pageText({ title: 'Front pinouts', body }), summary: body, baseRevision: null };
      accepted(await proposals.addVersion(people.writer, id, text));
    }
    const sent = accepted(await proposals.send(people.writer, id));
    expect(sent).toMatchObject({ state: 'waiting', title: 'Front pinouts', summary: 'Three.' });
    expect(sent.versions).toHaveLength(1);
    expect(sent.versions[0]).toMatchObject({
      number: 1,
      markdown: pageText({ title: 'Front pinouts', body: 'Three.' }),
    });
    expect(sent.versions[0]?.sentAt).toBe(sent.sentAt);
  });

  it('is not sent where nothing changed, and is kept', async () => {
    const { proposals, people, propose, publication } = await openBookWithDonor();
    const { id } = await propose(testbike.overview, publication.markdown(testbike.overview) ?? '');
    const refusal = refused(await proposals.send(people.writer, id));
    expect([refusal.code, refusal.title]).toEqual(['conflict', 'Nothing changed']);
    expect(accepted(await proposals.proposal(people.writer, id)).state).toBe('draft');
  });

  it('that is sent back goes on from what was sent, which moderators still see until the author sends again', async () => {
    const { proposals, people, proposeAndSend } = await openBookWithDonor();
    const { id } = await proposeAndSend(testbike.pinouts, pageText({ body: 'One.' }));
    accepted(await proposals.sendBack(people.moderator, id, { note: 'Which year?' }));
    const text = {
      markdown: pageText({ title: 'Better', body: 'Two.' }),
      summary: 'With the year',
      baseRevision: null,
    };
    const own = accepted(await proposals.addVersion(people.writer, id, text));
    expect([own.state, own.title, own.versions.length, own.versions[1]?.sentAt]).toEqual([
      'sent-back',
      'Better',
      2,
      null,
    ]);
    const seen = accepted(await proposals.proposal(people.moderator, id));
    expect([seen.title, seen.versions.length]).toEqual(['Pinouts', 1]);
    const again = accepted(await proposals.send(people.writer, id));
    expect([again.state, again.title, again.versions.length]).toEqual(['waiting', 'Better', 2]);
    expect(again.versions[0]?.markdown).toBe(pageText({ body: 'One.' }));
    expect(again.notes).toMatchObject([{ kind: 'sent-back', text: 'Which year?', author: { name: 'Moderator' } }]);
  });

  it('that is sent back may wait again as it is, answered by a note', async () => {
    const { proposals, people, proposeAndSend } = await openBookWithDonor();
    const { id } = await proposeAndSend(testbike.pinouts, pageText());
    accepted(await proposals.sendBack(people.moderator, id, { note: 'Are you sure?' }));
    accepted(
      await proposals.addNote(people.writer, id, { text: 'Measured twice.', address: '#headlight.2', line: 12 }),
    );
    const again = accepted(await proposals.send(people.writer, id));
    expect([again.state, again.versions.length]).toEqual(['waiting', 1]);
    expect(again.notes.map(({ kind, text }) => `${kind}: ${text}`)).toEqual([
      'sent-back: Are you sure?',
      'note: Measured twice.',
    ]);
    expect(again.notes[1]).toMatchObject({ address: '#headlight.2', line: 12 });
  });
});

describe('a proposal that waits', () => {
  it('takes a new version straight away, and keeps its place in the ledger', async () => {
    const { proposals, people, proposeAndSend } = await openBookWithDonor();
    const first = await proposeAndSend(testbike.pinouts, pageText({ body: 'One.' }));
    await proposeAndSend(testbike.quirks, pageText({ title: 'Quirks', kind: 'quirks' }), people.hobbyist);
    const text = { markdown: pageText({ body: 'Two.' }), summary: 'Better', baseRevision: null };
    const again = accepted(await proposals.addVersion(people.writer, first.id, text));
    expect([again.state, again.versions.length, again.sentAt]).toEqual(['waiting', 2, first.sentAt]);
    const same = refused(await proposals.addVersion(people.writer, first.id, text));
    expect(same.title).toBe('Nothing changed');
    const ledger = accepted(await proposals.proposals(people.moderator, 'waiting', false)).proposals;
    expect(ledger.map(({ title, versions }) => `${title} ${String(versions)}`)).toEqual(['Pinouts 2', 'Quirks 1']);
  });

  it('is counted for who may decide on it', async () => {
    const { proposals, people, proposeAndSend } = await openBookWithDonor();
    await proposeAndSend(testbike.pinouts, pageText());
    await proposeAndSend(testbike.quirks, pageText({ title: 'Quirks', kind: 'quirks' }), people.moderator);
    const { writer, moderator, secondModerator, admin } = people;
    expect([null, writer, moderator, secondModerator, admin].map((actor) => proposals.waitingFor(actor))).toEqual([
      0, 0, 1, 2, 2,
    ]);
  });

  it('is listed for its author and for moderators', async () => {
    const { proposals, people, proposeAndSend } = await openBookWithDonor();
    const { id } = await proposeAndSend(testbike.pinouts, pageText());
    const listed = async (actor: Parameters<typeof proposals.proposals>[0], mine: boolean) =>
      accepted(await proposals.proposals(actor, 'waiting', mine)).proposals.some((one) => one.id === id);
    expect(await listed(people.writer, false)).toBe(true);
    expect(await listed(people.hobbyist, false)).toBe(false);
    expect([await listed(people.moderator, false), await listed(people.moderator, true)]).toEqual([true, false]);
    expect(refused(await proposals.proposals(null, 'waiting', false)).code).toBe('sign-in-needed');
  });

  it('refuses a decision without a reason', async () => {
    const { proposals, people, proposeAndSend } = await openBookWithDonor();
    const { id } = await proposeAndSend(testbike.pinouts, pageText());
    expect(refused(await proposals.decline(people.moderator, id, { reason: ' ' })).fields).toHaveProperty('reason');
    expect(refused(await proposals.sendBack(people.moderator, id, {})).fields).toHaveProperty('note');
    const declined = accepted(await proposals.decline(people.moderator, id, { reason: 'It is on the overview.' }));
    expect(declined.notes).toMatchObject([{ kind: 'declined', text: 'It is on the overview.' }]);
    expect(declined.decidedBy?.name).toBe('Moderator');
  });
});

describe('what the editor starts from', () => {
  const nothing = { revision: null } as const;

  it('is the published text, and says which of the member’s proposals of it is still open', async () => {
    const { proposals, people, propose } = await openBookWithDonor();
    const start = accepted(await proposals.start(people.writer, { ...testbike.overview, ...nothing }));
    expect(start).toMatchObject({
      baseRevision: 1,
      markdown: overviewText(),
      summary: '',
      openProposal: null,
      subjectTitle: 'Testbike 500',
    });
    const { id } = await propose(testbike.overview, overviewText('Other'));
    expect(accepted(await proposals.start(people.writer, { ...testbike.overview, ...nothing })).openProposal).toBe(id);
    expect(
      accepted(await proposals.start(people.hobbyist, { ...testbike.overview, ...nothing })).openProposal,
    ).toBeNull();
    accepted(await proposals.withdraw(people.writer, id));
    expect(
      accepted(await proposals.start(people.writer, { ...testbike.overview, ...nothing })).openProposal,
    ).toBeNull();
  });

  it('is an old revision’s text on the newest revision, where one goes back', async () => {
    const { proposals, people, publish, publication } = await openBookWithDonor();
    await publish(testbike.overview, overviewText('Testbike 500', 'Spoilt.'));
    const start = accepted(await proposals.start(people.writer, { ...testbike.overview, revision: 1 }));
    expect(start).toMatchObject({ baseRevision: 2, markdown: overviewText(), summary: 'Go back to revision 1' });
    expect(refused(await proposals.start(people.writer, { ...testbike.overview, revision: 9 })).code).toBe('not-found');
    await publish(testbike.overview, start.markdown);
    expect(publication.standing(testbike.overview).page?.revision).toBe(3);
    expect(publication.markdown(testbike.overview)).toBe(overviewText());
  });

  it('is a skeleton of its kind where there is no page yet, and one that can be read', async () => {
    const { proposals, people, pages } = await openBookWithDonor();
    const asked = [
      { shelf: 'donors', subject: null, page: null, kind: 'overview' },
      { shelf: 'donors', subject: 'testbike-500', page: null, kind: 'pinouts' },
      { shelf: 'donors', subject: 'testbike-500', page: 'quirks', kind: 'quirks' },
      { shelf: 'donors', subject: 'testbike-500', page: 'safe-mods-lights', kind: 'safe-mods' },
      { shelf: 'donors', subject: 'not-there-yet', page: 'checks', kind: 'checks' },
      { shelf: 'reference', subject: 'not-there-yet', page: 'anything', kind: 'notes' },
    ] as const;
    for (const { kind, ...request } of asked) {
      const start = accepted(await proposals.start(people.writer, { ...request, ...nothing }));
      expect([start.baseRevision, start.page]).toEqual([null, request.subject === null ? 'overview' : request.page]);
      expect(start.markdown).toContain(`kind: ${kind}`);
      const { findings } = accepted(await pages.preview(null, { markdown: start.markdown }, '192.0.2.1'));
      expect(findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
    }
    expect(refused(await proposals.start(null, { shelf: 'donors', subject: null, page: null, ...nothing })).code).toBe(
      'sign-in-needed',
    );
  });
});
