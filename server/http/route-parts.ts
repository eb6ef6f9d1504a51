import { z } from 'zod';
import { shelfSchema } from '../../shared/contracts/views.ts';
import { isSlug } from '../../shared/lib/slug.ts';
import type { Variant } from '../../shared/pages/applicability.ts';

/* The parts of paths and queries that several calls share. */

const slug = z.string().refine(isSlug, 'Lower-case letters, numbers and hyphens, at most 64.');

export const shelfParameters = z.object({ shelf: shelfSchema });
export const subjectParameters = shelfParameters.extend({ subject: slug });
export const pageParameters = subjectParameters.extend({ page: slug });
export const revisionNumber = z.coerce.number<string>().int().min(1);
export const idParameters = z.object({ id: z.string().min(1).max(64) });

const name = z.string().max(40);

/** `?year=&market=&frame=`: empty is not chosen. */
export const variantQuery = z.object({
  year: z
    .union([z.literal(''), z.coerce.number<string>().int().min(1885).max(2100)])
    .optional()
    .describe('Model year of the one bike that is asked about.'),
  market: name.optional().describe('Market of the one bike that is asked about.'),
  frame: name.optional().describe('Frame number range of the one bike that is asked about.'),
});

/** The variant that a query chose. */
export function variantOf(query: z.output<typeof variantQuery>): Variant {
  return {
    year: typeof query.year === 'number' ? query.year : null,
    market: query.market || null,
    frame: query.frame || null,
  };
}
