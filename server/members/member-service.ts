import { z } from 'zod';
import type { Answer } from '../../shared/contracts/api.ts';
import { passwordBodySchema, type signInBodySchema } from '../../shared/contracts/bodies.ts';
import { readBody } from '../../shared/contracts/read-body.ts';
import { problem, type Problem } from '../../shared/lib/problem.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import { roles, type Actor, type Member } from '../../shared/members/member.ts';
import type { Database } from '../db/client.ts';
import type { NewId } from '../db/new-id.ts';
import { transact } from '../db/transact.ts';
import { createAttempts, type AttemptLimits } from './attempts.ts';
import { createMemberStore } from './member-store.ts';
import { hashPassword, verifyPassword } from './passwords.ts';
import { createSessionStore } from './session-store.ts';

/** What somebody says to prove who they are. */
export type Credentials = z.output<typeof signInBodySchema>;

/** The members of the club: who they are, and their proof of it. */
export interface MemberService {
  /** Null for who is not (or no longer) a member, and for who is suspended: neither is signed in. */
  getSignedIn(id: string): Member | null;
  /**
   * Whether somebody is who they say. The answer and the time it takes are the same for an unknown e-mail address and
   * a wrong password; guessing is slowed by e-mail address and network address together.
   */
  signIn(credentials: Credentials, networkAddress: string): Answer<Member>;
  /** Changes one's own password, and ends every session of the member, the asking one too. */
  changePassword(actor: Actor, body: unknown, networkAddress: string): Answer<Member>;
  hasMember(email: string): boolean;
  /** Takes somebody into the club. Not guarded: for the seed and the administrator's command. */
  addMember(body: unknown): Answer<Member>;
}

export interface MemberServiceParts {
  readonly database: Database;
  /** Milliseconds since 1970. */
  readonly now: () => number;
  readonly newId: NewId;
}

const newMemberSchema = z.object({
  email: z.email('Write an e-mail address.').max(254),
  name: z.string().trim().min(1, 'Write a name.').max(80),
  role: z.enum(roles),
  password: passwordBodySchema.shape.next,
});

/** One person's mistakes cost nothing; ten wrong guesses cost about half an hour. */
const guesses: AttemptLimits = { free: 5, firstPauseSeconds: 2, longestPauseSeconds: 900, forgetSeconds: 24 * 3600 };

/** One address that tries many members: a club's house with one address for all stays well below. */
const sweeps: AttemptLimits = { free: 40, firstPauseSeconds: 2, longestPauseSeconds: 300, forgetSeconds: 3600 };

/** Makes the service of a store's members. */
export function createMemberService({ database, now, newId }: MemberServiceParts): MemberService {
  const store = createMemberStore(database);
  const sessions = createSessionStore(database);
  const guessesOfOne = createAttempts(guesses, now);
  const guessesOfAll = createAttempts(sweeps, now);
  let nobodysHash: Promise<string> | null = null;

  /** Compared with where there is no member, so that an unknown e-mail address takes as long as a wrong password. */
  function hashOfNobody(): Promise<string> {
    nobodysHash ??= hashPassword(newId());
    return nobodysHash;
  }

  /** Asks for a password, slowly for who guesses: null where it may not be tried now or is wrong. */
  async function prove(
    passwordHash: string | null,
    password: string,
    keys: { one: string; all: string },
  ): Promise<Problem | null> {
    const pause = Math.max(guessesOfOne.pauseOf(keys.one), guessesOfAll.pauseOf(keys.all));
    if (pause > 0) return tooManyAttempts(pause);
    guessesOfOne.count(keys.one);
    guessesOfAll.count(keys.all);
    const right = await verifyPassword(passwordHash ?? (await hashOfNobody()), password);
    if (!right || passwordHash === null) return wrongPassword;
    guessesOfOne.clear(keys.one);
    guessesOfAll.clear(keys.all);
    return null;
  }

  return {
    getSignedIn(id) {
      const member = store.getById(id);
      return member === null || member.suspended ? null : member;
    },

    hasMember: (email) => store.getByEmail(foldEmail(email)) !== null,

    async signIn(credentials, networkAddress) {
      const email = foldEmail(credentials.email);
      const known = store.getByEmail(email);
      const refusal = await prove(known?.passwordHash ?? null, credentials.password, {
        one: `${email} ${networkAddress}`,
        all: networkAddress,
      });
      if (refusal !== null || known === null) return refuse(refusal ?? wrongPassword);
      return known.member.suspended ? refuse(suspended) : accept(known.member);
    },

    async changePassword(actor, body, networkAddress) {
      const known = actor === null ? null : store.getWithPassword(actor.id);
      if (known === null || known.member.suspended) return refuse(signInNeeded);
      const read = readBody(passwordBodySchema, body);
      if (!read.ok) return read;
      const { member } = known;
      const refusal = await prove(known.passwordHash, read.value.current, {
        one: `${member.email} ${networkAddress}`,
        all: networkAddress,
      });
      if (refusal !== null) return refuse(refusal === wrongPassword ? wrongCurrentPassword : refusal);
      const passwordHash = await hashPassword(read.value.next);
      transact(database, (writing) => {
        store.setPasswordHash(writing, member.id, passwordHash);
        sessions.removeAllOf(writing, member.id);
      });
      return accept(member);
    },

    async addMember(body) {
      const read = readBody(newMemberSchema, body);
      if (!read.ok) return read;
      const { name, role, password } = read.value;
      const email = foldEmail(read.value.email);
      if (store.getByEmail(email) !== null) return refuse(alreadyMember);
      const member: Member = { id: newId(), email, name, role, suspended: false };
      const passwordHash = await hashPassword(password);
      const createdAt = new Date(now()).toISOString();
      transact(database, (writing) =>
        store.insert(writing, { id: member.id, email, name, role, passwordHash, createdAt }),
      );
      return accept(member);
    },
  };
}

/** E-mail addresses are compared without regard to case: nobody's provider tells two members apart by it. */
function foldEmail(email: string): string {
  return email.trim().toLowerCase();
}

const wrongPassword = problem(
  'sign-in-failed',
  'That did not sign you in',
  'The e-mail address or the password is not right. Try again; after several wrong ones there is a short pause.',
);

const wrongCurrentPassword = problem(
  'fields-invalid',
  'Your password was not changed',
  'The password that you have now is not the one you wrote.',
  { fields: { current: 'This is not the password that you have now.' } },
);

const suspended = problem(
  'not-allowed',
  'Your membership is suspended',
  'You can read on as a visitor. Ask an administrator of the club what it takes to come back.',
);

const signInNeeded = problem('sign-in-needed', 'Sign in first', 'Only members have a password to change.');

const alreadyMember = problem('already-there', 'There is a member with this e-mail address', 'Nothing was changed.');

function tooManyAttempts(seconds: number): Problem {
  return problem(
    'too-many-requests',
    'Too many wrong passwords',
    `Nobody is locked out: wait ${seconds === 1 ? 'a second' : waitInWords(seconds)} and try again.`,
    { retryAfterSeconds: seconds },
  );
}

function waitInWords(seconds: number): string {
  return seconds < 90 ? `${seconds} seconds` : `${Math.ceil(seconds / 60)} minutes`;
}
