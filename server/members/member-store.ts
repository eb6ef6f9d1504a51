import { eq, sql } from 'drizzle-orm';
import type { Member, Role } from '../../shared/members/member.ts';
import type { Database } from '../db/client.ts';
import { members } from '../db/schema/members.ts';
import type { Writing } from '../db/transact.ts';

/** A member with what proves that it is them. */
export interface MemberWithPassword {
  readonly member: Member;
  readonly passwordHash: string;
}

/** A member who is new to the club. */
export interface NewMember {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly role: Role;
  readonly passwordHash: string;
  /** ISO 8601 in UTC. */
  readonly createdAt: string;
}

/** The club's members in the store. */
export interface MemberStore {
  getById(id: string): Member | null;
  /** With the password's hash, for whoever is to be asked for it. */
  getWithPassword(id: string): MemberWithPassword | null;
  /** The e-mail address in lower case. */
  getByEmail(email: string): MemberWithPassword | null;
  insert(writing: Writing, member: NewMember): void;
  setPasswordHash(writing: Writing, id: string, passwordHash: string): void;
}

/** Opens the members of a store. */
export function createMemberStore({ query }: Database): MemberStore {
  const byId = query
    .select()
    .from(members)
    .where(eq(members.id, sql.placeholder('id')))
    .prepare();
  const byEmail = query
    .select()
    .from(members)
    .where(eq(members.email, sql.placeholder('email')))
    .prepare();
  return {
    getById(id) {
      const row = byId.get({ id });
      return row === undefined ? null : memberOf(row);
    },
    getWithPassword(id) {
      const row = byId.get({ id });
      return row === undefined ? null : { member: memberOf(row), passwordHash: row.passwordHash };
    },
    getByEmail(email) {
      const row = byEmail.get({ email });
      return row === undefined ? null : { member: memberOf(row), passwordHash: row.passwordHash };
    },
    insert({ database }, member) {
      database.query.insert(members).values(member).run();
    },
    setPasswordHash({ database }, id, passwordHash) {
      database.query.update(members).set({ passwordHash }).where(eq(members.id, id)).run();
    },
  };
}

function memberOf({ id, name, email, role, suspendedAt }: typeof members.$inferSelect): Member {
  return { id, name, email, role, suspended: suspendedAt !== null };
}
