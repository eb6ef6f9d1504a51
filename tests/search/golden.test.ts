import { beforeAll, describe, expect, test } from 'vitest';
import type { SearchAnswer } from '../../shared/search/search-hit.ts';
import { buildLinesIndex } from '../../shared/search/lines-index.ts';
import { buildProseIndex } from '../../shared/search/prose-index.ts';
import { search, type SearchIndexes } from '../../shared/search/search.ts';
import { demoDocuments } from '../factories/demo-documents.ts';
import { expectGolden } from './expect-golden.ts';
import { goldenQueries, type GoldenQuery } from './golden-list.ts';

const queries = goldenQueries();
let indexes: SearchIndexes;

beforeAll(() => {
  const documents = demoDocuments();
  indexes = { lines: buildLinesIndex(documents), prose: buildProseIndex(documents) };
}, 120_000);

function ask({ query, bench, year, market }: GoldenQuery): SearchAnswer {
  return search(indexes, query, { bench, variant: { year, market, frame: null } });
}

test('the golden list has at least sixty queries, each with its reason', () => {
  expect(queries.length).toBeGreaterThanOrEqual(60);
});

describe('the indexes answer the golden list directly', () => {
  test.each(queries)('$query ($bench $year $market): $why', (entry) => {
    expectGolden(entry, ask(entry));
  });
});
