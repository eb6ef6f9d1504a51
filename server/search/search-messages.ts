import type { SearchView } from '../../shared/contracts/views.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import type { PublishedText } from '../../shared/search/search-document-of.ts';

/** What the server asks of the thread that searches. Messages are worked through in their order. */
export type ToSearchWorker =
  /** Pages as they are published now. */
  | { readonly kind: 'put'; readonly pages: readonly PublishedText[] }
  | { readonly kind: 'remove'; readonly address: PageAddress }
  /** All changes are in: make the files that browsers fetch. */
  | { readonly kind: 'make files' }
  | {
      readonly kind: 'ask';
      readonly id: number;
      readonly query: string;
      readonly bench: string | null;
      readonly variant: Variant;
    };

/** What the thread that searches says. */
export type FromSearchWorker =
  | { readonly kind: 'answer'; readonly id: number; readonly view: SearchView }
  | { readonly kind: 'failed'; readonly id: number; readonly stack: string }
  | { readonly kind: 'files'; readonly lines: SearchFile; readonly prose: SearchFile };

/** A file of the index, in each form that a browser may take. */
export interface SearchFile {
  /** Made of its content, so that another content is another address: `a1b2….json`. */
  readonly name: string;
  readonly identity: Uint8Array;
  readonly br: Uint8Array;
  readonly gzip: Uint8Array;
}
