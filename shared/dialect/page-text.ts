import type { Root } from 'hast';
import type { Block } from '../blocks/block.ts';
import type { Finding } from '../pages/finding.ts';
import type { FrontMatter } from '../pages/front-matter.ts';

/** A heading of a page. */
export interface OutlineEntry {
  readonly level: number;
  readonly text: string;
  /** Its anchor; always begins with `s-`. */
  readonly id: string;
  readonly line: number;
}

/** A stretch of prose under a heading, as plain text with tables and blocks left out: for the prose index. */
export interface Section {
  /** The anchor of its heading; empty for what stands before the first. */
  readonly id: string;
  readonly heading: string;
  readonly text: string;
}

/**
 * A page's text, read. Plain data that survives JSON and a thread's border; `tree` is the sanitized tree in which each
 * block is an empty `<div data-block="n">` (n: its index in `blocks`), for `renderPage` to fill.
 */
export interface PageText {
  readonly frontMatter: FrontMatter;
  readonly outline: readonly OutlineEntry[];
  readonly sections: readonly Section[];
  readonly blocks: readonly Block[];
  readonly findings: readonly Finding[];
  readonly tree: Root;
}

/** Why a text is not read at all (the text itself is kept by whoever asked): which limit, and on which line. */
export interface TextRefusal {
  readonly limit: 'length' | 'depth' | 'directives' | 'columns' | 'run' | 'deadline';
  readonly message: string;
  readonly line: number | null;
}

/** What the reader of a page's text may know of the rest of its subject. */
export interface SubjectContext {
  /** Ids that other published pages of the subject have, and the page that has each: for `id-repeated`. */
  readonly idsElsewhere: readonly { readonly id: string; readonly page: string }[];
}
