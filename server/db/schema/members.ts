import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { roles } from '../../../shared/members/member.ts';

/** The club's members. `email` is kept in lower case, so that one address is one member. */
export const members = sqliteTable('members', {
  id: text('id').primaryKey(),
  email: text('email').notNull().unique(),
  name: text('name').notNull(),
  role: text('role', { enum: roles }).notNull(),
  passwordHash: text('password_hash').notNull(),
  suspendedAt: text('suspended_at'),
  createdAt: text('created_at').notNull(),
});

/** Signed-in browsers. `expiresAt` is in milliseconds since 1970, so that the expired are found by number. */
export const sessions = sqliteTable(
  'sessions',
  {
    id: text('id').primaryKey(),
    data: text('data').notNull(),
    memberId: text('member_id').references(() => members.id),
    expiresAt: integer('expires_at').notNull(),
  },
  (table) => [index('sessions_by_expiry').on(table.expiresAt), index('sessions_by_member').on(table.memberId)],
);
