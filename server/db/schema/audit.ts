import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { members } from './members.ts';

/** Who did what. Never changed, never deleted; each row carries the hash of the one before, so a gap shows. */
export const audit = sqliteTable('audit', {
  number: integer('number').primaryKey(),
  at: text('at').notNull(),
  actorId: text('actor_id').references(() => members.id),
  /** The design's words: `publish`, `send back`, … */
  action: text('action').notNull(),
  /** What it was done to: a proposal's id, a page's address, a member's id. */
  subject: text('subject').notNull(),
  details: text('details', { mode: 'json' }).$type<Readonly<Record<string, unknown>>>().notNull(),
  previousHash: text('previous_hash').notNull(),
  hash: text('hash').notNull(),
});
