import { describe, expect, test } from 'vitest';
import type { z } from 'zod';
import * as views from '../../shared/contracts/views.ts';
import type { Problem } from '../../shared/lib/problem.ts';
import type { Result } from '../../shared/lib/result.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { accepted, refused, testbike } from '../factories/book.ts';
import { testPassword } from '../factories/http-club.ts';
import { connectorBlock, pageText, stoppingBlock } from '../factories/page-texts.ts';
import { doors, type Asker, type DoorOfClub } from './doors.ts';

/** Holds an answer to its contract: nothing of it is missing, and nothing is in it that the contract does not name. */
function holdTo<Schema extends z.ZodType>(schema: Schema, answer: Result<unknown, Problem>): z.output<Schema> {
  const value = accepted(answer);
  const held = schema.parse(value);
  expect(held).toEqual(value);
  expect(JSON.parse(JSON.stringify(value))).toEqual(value);
  return held;
}

const { pinouts, overview } = testbike;
const changed = pageText({ body: connectorBlock('headlight', 'L/W') });
const change = { ...pinouts, baseRevision: 1, markdown: changed, summary: 'Main beam is blue.' };
const uk1980 = { year: 1980, market: 'UK', frame: null };

async function proposed(asker: Asker): Promise<string> {
  return holdTo(views.proposalViewSchema, await asker().propose(change)).id;
}

async function sent(asker: Asker): Promise<string> {
  const id = await proposed(asker);
  holdTo(views.proposalViewSchema, await asker().send(id));
  return id;
}

for (const [name, open] of Object.entries(doors)) {
  describe(`through ${name}`, () => {
    async function openWithPeople(): Promise<DoorOfClub & { visiting: Asker; writer: Asker; moderator: Asker }> {
      const door = await open();
      const { writer, moderator } = door.club.people;
      return {
        ...door,
        visiting: door.visitor(),
        writer: await door.signedIn(writer),
        moderator: await door.signedIn(moderator),
      };
    }

    test('a visitor is nobody, and a member is who signed in until they sign out', async () => {
      const { club, visitor } = await open();
      const asker = visitor();
      expect(holdTo(views.viewerSchema, await asker().viewer())).toEqual({ member: null, waiting: 0 });
      const { email } = club.people.writer;
      const viewer = holdTo(views.viewerSchema, await asker().signIn({ email, password: testPassword }));
      expect(viewer).toEqual({ member: club.people.writer, waiting: 0 });
      expect(accepted(await asker().viewer())).toEqual(viewer);
      expect(accepted(await asker().signOut())).toBeNull();
      expect(accepted(await asker().viewer()).member).toBeNull();
    });

    test('who signs in acts as themselves from then on, in the same breath', async () => {
      const { club, visitor } = await open();
      const api = visitor()();
      expect(refused(await api.propose(change)).code).toBe('sign-in-needed');
      accepted(await api.signIn({ email: club.people.writer.email, password: testPassword }));
      expect(accepted(await api.viewer()).member?.id).toBe(club.people.writer.id);
      expect(accepted(await api.propose(change)).author.id).toBe(club.people.writer.id);
      accepted(await api.signOut());
      expect(refused(await api.propose(change)).code).toBe('sign-in-needed');
    });

    test('a wrong password and a missing one are refused in different words', async () => {
      const { club, visitor } = await open();
      const asker = visitor();
      const { email } = club.people.writer;
      expect(refused(await asker().signIn({ email, password: 'a wrong one' }))).toMatchObject({
        code: 'sign-in-failed',
        status: 401,
      });
      const missing = refused(await asker().signIn({ email, password: '' }));
      expect(missing).toMatchObject({ code: 'fields-invalid', fields: { password: 'Write your password.' } });
    });

    test('guessing is slowed', async () => {
      const { club, visitor } = await open();
      const asker = visitor();
      const { email } = club.people.writer;
      for (let time = 0; time < 5; time += 1) refused(await asker().signIn({ email, password: 'a wrong one' }));
      const paused = refused(await asker().signIn({ email, password: testPassword }));
      expect(paused).toMatchObject({ code: 'too-many-requests', retryAfterSeconds: 2 });
    });

    test('a member changes their password and stays signed in', async () => {
      const { club, writer } = await openWithPeople();
      expect(accepted(await writer().changePassword({ current: testPassword, next: 'another password' }))).toBeNull();
      expect(accepted(await writer().viewer()).member?.id).toBe(club.people.writer.id);
      const wrong = refused(await writer().changePassword({ current: testPassword, next: 'another password' }));
      expect(wrong).toMatchObject({
        code: 'fields-invalid',
        fields: { current: expect.stringContaining('not the password') },
      });
    });

    test('the book is read', async () => {
      const { visiting } = await openWithPeople();
      const home = holdTo(views.homeViewSchema, await visiting().home());
      expect(home.donors.map(({ slug }) => slug)).toEqual(['testbike-500']);
      expect(holdTo(views.shelfViewSchema, await visiting().shelf('donors')).subjects).toHaveLength(1);
      expect(holdTo(views.shelfViewSchema, await visiting().shelf('parts')).subjects).toEqual([]);
      const subject = holdTo(views.subjectViewSchema, await visiting().subject(overview));
      expect(subject.pages.map(({ page }) => page)).toEqual(['overview', 'pinouts']);
      const page = holdTo(views.pageViewSchema, await visiting().page(pinouts, uk1980));
      expect([page.address, page.variant]).toEqual(['donors/testbike-500/pinouts', uk1980]);
      const data = holdTo(views.pageDataSchema, await visiting().pageData(pinouts, anyVariant));
      expect(data.lines.map(({ address }) => address)).toContain('donors/testbike-500/pinouts#headlight.2');
      expect(data.markdown).toContain(':::connector');
    });

    test('what is not in the book is not found', async () => {
      const { visiting } = await openWithPeople();
      const nothing = { ...pinouts, page: 'nothing' };
      const answers = [
        await visiting().subject({ shelf: 'donors', subject: 'nothing' }),
        await visiting().page(nothing, anyVariant),
        await visiting().pageData(nothing, anyVariant),
        await visiting().revisions(nothing),
        await visiting().revision(pinouts, 9, anyVariant),
        await visiting().compare(pinouts, 1, 9),
      ];
      for (const answer of answers) expect(refused(answer)).toMatchObject({ code: 'not-found', status: 404 });
    });

    test('revisions are listed, read and compared', async () => {
      const { visiting, writer, moderator } = await openWithPeople();
      const id = await sent(writer);
      holdTo(views.proposalViewSchema, await moderator().publish(id, {}));
      const { revisions } = holdTo(views.revisionsViewSchema, await visiting().revisions(pinouts));
      expect(revisions.map(({ number }) => number)).toEqual([2, 1]);
      const first = holdTo(views.pageViewSchema, await visiting().revision(pinouts, 1, anyVariant));
      expect([first.revision, first.newestRevision]).toEqual([1, 2]);
      const compared = holdTo(views.compareViewSchema, await visiting().compare(pinouts, 1, 2));
      expect(compared.difference.lines.some(({ kind }) => kind !== 'same')).toBe(true);
    });

    test('the book is searched', async () => {
      const { visiting } = await openWithPeople();
      const found = holdTo(views.searchViewSchema, await visiting().search('headlight Y/R', 'testbike-500', uk1980));
      expect(found.query).toBe('headlight Y/R');
      holdTo(views.searchViewSchema, await visiting().search('', null, anyVariant));
    });

    test('a text is looked at before it is proposed, by anybody', async () => {
      const { visiting } = await openWithPeople();
      const preview = holdTo(
        views.previewViewSchema,
        await visiting().preview({ markdown: pageText({ body: stoppingBlock() }) }),
      );
      expect(preview.findings.some(({ severity }) => severity === 'stop')).toBe(true);
      expect(refused(await visiting().preview({ markdown: 'x'.repeat(70_000) })).status).toBe(422);
    });

    test('a change goes from its draft to its publication', async () => {
      const { club, writer, moderator } = await openWithPeople();
      const start = holdTo(views.startViewSchema, await writer().start({ ...pinouts, revision: null }));
      expect(start.baseRevision).toBe(1);
      const id = await proposed(writer);
      expect(refused(await moderator().proposal(id)).code).toBe('not-found');
      holdTo(
        views.proposalViewSchema,
        await writer().addVersion(id, { markdown: changed, summary: 'Said better.', baseRevision: 1 }),
      );
      expect(holdTo(views.proposalViewSchema, await writer().send(id)).state).toBe('waiting');
      expect(accepted(await moderator().viewer()).waiting).toBe(1);
      const noted = holdTo(
        views.proposalViewSchema,
        await moderator().addNote(id, { text: 'Which manual?', line: 12 }),
      );
      expect(noted.notes.map(({ text, line }) => [text, line])).toEqual([['Which manual?', 12]]);
      expect(holdTo(views.proposalViewSchema, await moderator().sendBack(id, { note: 'Name it.' })).state).toBe(
        'sent-back',
      );
      expect(holdTo(views.proposalViewSchema, await writer().send(id)).state).toBe('waiting');
      const published = holdTo(views.proposalViewSchema, await moderator().publish(id, {}));
      expect([published.state, published.publishedAs, published.decidedBy?.id]).toEqual([
        'published',
        2,
        club.people.moderator.id,
      ]);
    });

    test('a change is declined, or taken back', async () => {
      const { writer, moderator } = await openWithPeople();
      const declined = holdTo(
        views.proposalViewSchema,
        await moderator().decline(await sent(writer), { reason: 'No.' }),
      );
      expect(declined.state).toBe('declined');
      expect(holdTo(views.proposalViewSchema, await writer().withdraw(await sent(writer))).state).toBe('withdrawn');
    });

    test('proposals are listed by state, and one’s own', async () => {
      const { writer, moderator } = await openWithPeople();
      const id = await sent(writer);
      const ids = (list: { proposals: { id: string }[] }) => list.proposals.map((one) => one.id);
      expect(ids(holdTo(views.proposalsViewSchema, await moderator().proposals('waiting', false)))).toEqual([id]);
      expect(ids(holdTo(views.proposalsViewSchema, await moderator().proposals('waiting', true)))).toEqual([]);
      expect(ids(holdTo(views.proposalsViewSchema, await writer().proposals(null, true)))).toContain(id);
    });

    test('what may not be done is refused, and why', async () => {
      const { visiting, writer, moderator } = await openWithPeople();
      const id = await sent(writer);
      expect(refused(await visiting().propose(change)).code).toBe('sign-in-needed');
      expect(refused(await visiting().proposals(null, false)).code).toBe('sign-in-needed');
      expect(refused(await visiting().start({ ...pinouts, revision: null })).code).toBe('sign-in-needed');
      expect(refused(await writer().publish(id, {})).code).toBe('not-allowed');
      expect(refused(await moderator().withdraw(id)).code).toBe('not-allowed');
      expect(refused(await moderator().decline(id, { reason: '' })).fields).toEqual({
        reason: 'Write a sentence first.',
      });
      expect(refused(await writer().propose({ ...change, baseRevision: null })).status).toBe(409);
      expect(refused(await moderator().publish(id, { version: 7 })).status).toBe(409);
    });
  });
}

describe('both doors', () => {
  test('give the same for the same question', async () => {
    const opened = await Promise.all(Object.values(doors).map((open) => open()));
    const answers = await Promise.all(
      opened.map(async ({ visitor }) => {
        const ask = visitor();
        return [
          await ask().home(),
          await ask().shelf('donors'),
          await ask().subject(overview),
          await ask().page(pinouts, uk1980),
          await ask().pageData(pinouts, uk1980),
          await ask().revisions(pinouts),
          await ask().compare(pinouts, 1, 1),
          await ask().search('Y/R', null, anyVariant),
          await ask().preview({ markdown: changed }),
        ];
      }),
    );
    expect(answers[1]).toEqual(answers[0]);
  });
});
