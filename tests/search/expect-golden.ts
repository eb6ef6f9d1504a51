import { expect } from 'vitest';
import type { SearchAnswer } from '../../shared/search/search-hit.ts';
import type { GoldenQuery } from './golden-list.ts';

/** Holds an answer against its entry of the list. */
export function expectGolden(entry: GoldenQuery, { hits, remarks }: SearchAnswer): void {
  const addresses = hits.map(({ address }) => address);
  const reason = `${entry.query}: ${entry.why}`;
  if (entry.first !== null) expect(addresses[0], reason).toBe(entry.first);
  for (const address of entry.among) expect(addresses.slice(0, 5), reason).toContain(address);
  if (entry.noLines)
    expect(
      hits.filter(({ kind }) => kind === 'line').map(({ address }) => address),
      reason,
    ).toEqual([]);
  if (entry.offers !== null) expect(hits.find(({ kind }) => kind === 'page')?.address, reason).toBe(entry.offers);
  if (entry.says !== null) expect(remarks.join(' '), reason).toContain(entry.says);
  if (entry.last === null) return;
  const lines = hits.filter(({ line }) => line !== null);
  const ruledOut = lines.findIndex(({ address }) => address === entry.last);
  expect(ruledOut, reason).toBeGreaterThanOrEqual(0);
  expect(lines[ruledOut]?.line?.appliesHere, reason).toBe(false);
  expect(lines[ruledOut]?.line?.applies, reason).toContain('not ');
  expect(
    lines.slice(ruledOut).every(({ line }) => line?.appliesHere === false),
    reason,
  ).toBe(true);
}
