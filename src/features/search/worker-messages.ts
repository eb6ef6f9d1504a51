import type { SearchView } from '../../../shared/contracts/views.ts';
import type { Bench } from '../../lib/bench.ts';

/** The files that make up the index, as the server's manifest names them. */
export interface IndexFiles {
  readonly lines: string;
  readonly prose: string;
}

/** A question with what it depends on. */
export interface Question {
  readonly query: string;
  readonly bench: Bench;
}

/** What the page asks of the thread that searches. */
export type ToSearchThread =
  | { readonly kind: 'load'; readonly files: IndexFiles }
  | { readonly kind: 'ask'; readonly id: number; readonly question: Question };

/** What the thread that searches says. */
export type FromSearchThread =
  /** Which files it has read; null for none yet. */
  | { readonly kind: 'holds'; readonly lines: string | null; readonly prose: string | null }
  /** A file could not be fetched or read: it will be tried again when the manifest is next read. */
  | { readonly kind: 'trouble'; readonly message: string }
  | { readonly kind: 'answer'; readonly id: number; readonly view: SearchView };
