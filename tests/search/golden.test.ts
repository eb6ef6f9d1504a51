import { beforeAll, describe, expect, test } from 'vitest';
import type { SearchAnswer } from '../../shared/search/search-hit.ts';
import { buildLinesIndex } from '../../shared/search/lines-index.ts';
import { buildProseIndex } from '../../shared/search/prose-index.ts';
import { search, type SearchIndexes } from '../../shared/search/search.ts';
import { demoDocuments } from '../factories/demo-documents.ts';
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

/** Holds an answer against its entry of the list. */
function expectGolden(entry: GoldenQuery, { hits, remarks }: SearchAnswer): void {
  const addresses = hits.map(({ address }) => address);
  const reason = `${entry.query}: ${entry.why}`;
  if (entry.first !== null) expect(addresses[0], reason).toBe(entry.first);
  for (const address of entry.among) expect(addresses.slice(0, 5), reason).toContain(address);
  if (entry.noLines) expect(hits.filter(({ kind }) => kind === 'line').map(({ address }) => address), reason).toEqual([]);
  if (entry.offers !== null) expect(hits.find(({ kind }) => kind === 'page')?.address, reason).toBe(entry.offers);
  if (entry.says !== null) expect(remarks.join(' '), reason).toContain(entry.says);
  if (entry.last === null) return;
  const lines = hits.filter(({ line }) => line !== null);
  const ruledOut = lines.findIndex(({ address }) => address === entry.last);
  expect(ruledOut, reason).toBeGreaterThanOrEqual(0);
  expect(lines[ruledOut]?.line?.appliesHere, reason).toBe(false);
  expect(lines[ruledOut]?.line?.applies, reason).toContain('not ');
  expect(lines.slice(ruledOut).every(({ line }) => line?.appliesHere === false), reason).toBe(true);
}

test('the golden list has at least sixty queries, each with its reason', () => {
  expect(queries.length).toBeGreaterThanOrEqual(60);
});

describe('the indexes answer the golden list directly', () => {
  test.each(queries)('$query ($bench $year $market): $why', (entry) => {
    expectGolden(entry, ask(entry));
  });
});
