import type { Block } from '../../../shared/blocks/block.ts';
import type { OutlineEntry, Section } from '../../../shared/dialect/page-text.ts';
import type { Applicability } from '../../../shared/pages/applicability.ts';
import type { FrontMatter, SubjectFacts } from '../../../shared/pages/front-matter.ts';

/** A connector as the lists of a subject name it. */
export interface ConnectorEntry {
  readonly id: string;
  readonly name: string;
  readonly zone: string | null;
  readonly cavities: number;
  /** The face's shape as a block writes it: `xx.xx+xxxxx`, `round 6`. */
  readonly layout: string;
}

/** What lists and neighbours need to know of a page, without its text. */
export interface PageDigest {
  readonly facts: SubjectFacts;
  readonly connectors: readonly ConnectorEntry[];
  /** Ids that the page gives to connectors, components, switches and other blocks. */
  readonly ids: readonly string[];
  /** Every different applicability of the page and its lines, for what a reader may choose between. */
  readonly applicabilities: readonly Applicability[];
}

/** What the search keeps of a page. */
export interface StoredDocument {
  readonly frontMatter: FrontMatter;
  readonly outline: readonly OutlineEntry[];
  readonly sections: readonly Section[];
  readonly blocks: readonly Block[];
}
