import { z } from 'zod';
import { searchViewSchema } from '../../shared/contracts/views.ts';
import { variantOf, variantQuery } from '../http/route-parts.ts';
import { defineRoute } from '../http/route.ts';

const searchQuery = variantQuery.extend({
  q: z.string().max(300).default('').describe('The question, as a person would type it.'),
  bench: z.string().max(64).optional().describe('The donor on the bench, whose lines come first.'),
});

/** Asking the book. */
export const searchRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/search',
    name: 'search',
    summary: 'Lines, sections and pages that answer a question, best first',
    query: searchQuery,
    view: searchViewSchema,
    problems: ['bad-request'],
    answer: (api, { query }) => api.search(query.q, query.bench || null, variantOf(query)),
  }),
];
