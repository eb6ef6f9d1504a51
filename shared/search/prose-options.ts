import type { Options } from 'minisearch';
import { findableWords } from './words.ts';

/** Raised whenever the prose file's shape or the options below change. */
export const proseVersion = 1;

/** A section or a page as the prose index knows it. */
export interface ProseEntry {
  /** `donors/qf550/quirks#s-charging` for a section, `donors/qf550/quirks` for a page. */
  readonly id: string;
  readonly heading: string;
  readonly title: string;
  readonly text: string;
}

/** Every word that a text can be found by, as the index takes it. */
export function proseWords(text: string): string[] {
  const { strong, weak } = findableWords(text);
  return [...strong, ...weak];
}

/**
 * The one constant of options: an index that is asked with others than it was built with finds nothing and says nothing.
 * Words are read by `proseWords` once, so nothing is left for `processTerm` to do; a query's terms come ready.
 */
export const proseOptions = {
  fields: ['heading', 'title', 'text'],
  storeFields: [],
  tokenize: proseWords,
  processTerm: (term) => term,
  searchOptions: {
    tokenize: (term) => [term],
    processTerm: (term) => term,
    boost: { heading: 3, title: 1.5, text: 1 },
    weights: { fuzzy: 0.3, prefix: 0.4 },
    maxFuzzy: 2,
  },
  autoVacuum: false,
} as const satisfies Options<ProseEntry>;
