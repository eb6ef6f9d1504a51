import { z } from 'zod';
import { isSlug } from '../lib/slug.ts';
import { shelfSchema } from './views.ts';

/*
 * What crosses the wire to the server. One schema serves the form, the action and the service: browser actions pass
 * the fields on as they are, and the service parses them here.
 */

/** The longest page that is read: honest pinouts cost a second at 100 kB. */
export const maximumPageBytes = 64 * 1024;

const slug = z.string().refine(isSlug, 'Use lower-case letters, numbers and hyphens, at most 64.');
const markdown = z.string().max(maximumPageBytes, 'A page may be 64 kB at most: divide it into two pages.');
const summary = z.string().trim().min(1, 'Say in a few words what changed.').max(300, 'At most 300 characters.');
const text = z.string().trim().min(1, 'Write a sentence first.').max(4000, 'At most 4,000 characters.');
const revisionNumber = z.coerce.number().int().min(1);
const year = z.coerce.number().int().min(1885).max(2100);

export const signInBodySchema = z.object({
  email: z.string().trim().min(1, 'Write your e-mail address.').max(254),
  password: z.string().min(1, 'Write your password.').max(1000),
});

export const passwordBodySchema = z.object({
  current: z.string().min(1, 'Write the password that you have now.').max(1000),
  next: z.string().min(10, 'Choose at least 10 characters.').max(1000),
});

export const previewBodySchema = z.object({
  markdown,
  shelf: shelfSchema.optional(),
  subject: slug.optional(),
  page: slug.optional(),
  from: z.string().max(200).optional(),
  year: year.optional(),
  market: z.string().max(40).optional(),
  frame: z.string().max(40).optional(),
});

export const proposeBodySchema = z.object({
  shelf: shelfSchema,
  subject: slug,
  page: slug,
  baseRevision: revisionNumber.nullable(),
  markdown,
  summary,
});

export const versionBodySchema = z.object({
  markdown,
  summary,
  baseRevision: revisionNumber.nullable(),
  /** Another address for a page that does not exist yet; only until it is first sent. */
  subject: slug.optional(),
  page: slug.optional(),
});
export const noteBodySchema = z.object({
  text,
  address: z.string().max(300).optional(),
  line: z.coerce.number().int().min(1).optional(),
});
export const sendBackBodySchema = z.object({ note: text });
export const declineBodySchema = z.object({ reason: text });
export const publishBodySchema = z.object({
  /** The version that was read; another newest one is answered 409. */
  version: z.coerce.number().int().min(1).optional(),
  resultHash: z.string().optional(),
  signOff: z.array(z.string()).optional(),
  overrides: z.array(z.object({ code: z.string(), address: z.string().nullable(), reason: text })).optional(),
});

export type SignInBody = z.input<typeof signInBodySchema>;
export type PasswordBody = z.input<typeof passwordBodySchema>;
export type PreviewBody = z.input<typeof previewBodySchema>;
export type ProposeBody = z.input<typeof proposeBodySchema>;
export type VersionBody = z.input<typeof versionBodySchema>;
export type NoteBody = z.input<typeof noteBodySchema>;
export type SendBackBody = z.input<typeof sendBackBodySchema>;
export type DeclineBody = z.input<typeof declineBodySchema>;
export type PublishBody = z.input<typeof publishBodySchema>;
