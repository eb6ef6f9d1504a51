import type { Source } from '../pages/front-matter.ts';
import { citedIds } from './check-sources.ts';

/**
 * True where what is cited backs a line: a factory manual or a standard (section 7 of the design). Other sources are
 * shown, and leave the line unchecked.
 * @param cite what the line, or its block, cites
 * @param sources those that the page lists
 */
export function isCited(cite: string | null, sources: readonly Source[]): boolean {
  const ids = citedIds(cite);
  return sources.some(({ id, kind }) => ids.includes(id) && (kind === 'factory-manual' || kind === 'standard'));
}
