import type { SearchView } from '../../shared/contracts/views.ts';
import { formatPageAddress, shelves, type PageAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import { pageKinds } from '../../shared/pages/page-kind.ts';
import { buildLinesFile, type LinesFile } from '../../shared/search/lines-file.ts';
import { openLinesIndex, type LinesIndex } from '../../shared/search/lines-index.ts';
import { buildProseFile, type ProseFile } from '../../shared/search/prose-file.ts';
import { prosePageOf } from '../../shared/search/prose-page.ts';
import { createProseIndex } from '../../shared/search/prose-index.ts';
import { searchDocumentOf, type PublishedText } from '../../shared/search/search-document-of.ts';
import type { SearchDocument } from '../../shared/search/search-document.ts';
import { search } from '../../shared/search/search.ts';

/** The published pages as the search knows them, kept up to date a page at a time. */
export interface SearchBook {
  put(page: PublishedText): void;
  remove(address: PageAddress): void;
  search(query: string, bench: string | null, variant: Variant): SearchView;
  /** What browsers fetch; the same pages make the same files. */
  files(): { readonly lines: LinesFile; readonly prose: ProseFile };
}

/** Makes an empty one. */
export function createSearchBook(): SearchBook {
  const documents = new Map<string, SearchDocument>();
  const prose = createProseIndex();
  let made: { readonly lines: LinesFile; readonly prose: ProseFile } | null = null;
  let lines: LinesIndex | null = null;

  function changed(): void {
    made = null;
    lines = null;
  }

  function files(): { readonly lines: LinesFile; readonly prose: ProseFile } {
    if (made === null) {
      const ordered = [...documents.values()].sort(inBookOrder);
      made = { lines: buildLinesFile(ordered), prose: buildProseFile(ordered) };
    }
    return made;
  }

  return {
    put(page) {
      const document = searchDocumentOf(page);
      documents.set(formatPageAddress(document.address), document);
      prose.setPage(prosePageOf(document));
      changed();
    },
    remove(address) {
      const key = formatPageAddress(address);
      documents.delete(key);
      prose.removePage(key);
      changed();
    },
    search(query, bench, variant) {
      lines ??= openLinesIndex(files().lines);
      return search({ lines, prose }, query, { bench, variant });
    },
    files,
  };
}

/** Shelf, subject, kind, page: whatever order they came in, so that the files' names depend on what they say alone. */
function inBookOrder(a: SearchDocument, b: SearchDocument): number {
  return (
    shelves.indexOf(a.address.shelf) - shelves.indexOf(b.address.shelf) ||
    byCodePoint(a.address.subject, b.address.subject) ||
    pageKinds.indexOf(a.kind) - pageKinds.indexOf(b.kind) ||
    byCodePoint(a.address.page, b.address.page)
  );
}

function byCodePoint(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
