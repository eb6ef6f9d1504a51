import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { roles } from '../../../shared/members/member.ts';

/** The club's members. Times are milliseconds since 1970, UTC. */
export const members = sqliteTable(
  'members',
  {
    id: text('id').primaryKey(),
    /** As it is compared at sign-in: trimmed and in lower case. */
    email: text('email').notNull(),
    name: text('name').notNull(),
    role: text('role', { enum: roles }).notNull().default('member'),
    suspended: integer('suspended', { mode: 'boolean' }).notNull().default(false),
    /** An argon2id hash with its own salt and costs. */
    passwordHash: text('password_hash').notNull(),
    createdAt: integer('created_at').notNull(),
  },
  (table) => [
    uniqueIndex('members_email').on(table.email),
    check('members_role', sql`${table.role} in ('member', 'moderator', 'admin')`),
    check('members_email_folded', sql`${table.email} = lower(trim(${table.email}))`),
  ],
);

/** Who is signed in: one row a browser, pruned when it has expired. */
export const sessions = sqliteTable(
  'sessions',
  {
    /** A hash of the cookie's value, so that a copy of the store signs nobody in. */
    id: text('id').primaryKey(),
    /** The whole session as JSON, as express-session hands it over. */
    data: text('data').notNull(),
    memberId: text('member_id').references(() => members.id, { onDelete: 'cascade' }),
    expiresAt: integer('expires_at').notNull(),
  },
  (table) => [index('sessions_member').on(table.memberId), index('sessions_expires').on(table.expiresAt)],
);
