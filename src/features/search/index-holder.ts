import { isLinesFile, openLinesIndex, type LinesIndex } from '../../../shared/search/lines-index.ts';
import { isProseFile, prosePages } from '../../../shared/search/prose-file.ts';
import { createProseIndex, type ProseIndex } from '../../../shared/search/prose-index.ts';
import type { ProsePage } from '../../../shared/search/prose-page.ts';
import { search } from '../../../shared/search/search.ts';
import type { SearchView } from '../../../shared/contracts/views.ts';
import type { IndexFiles, Question } from './worker-messages.ts';

/** What the holder needs of the thread it lives in. */
export interface HolderSurroundings {
  /** Fetches a file of the index and reads its JSON; throws where it cannot. */
  fetchFile(name: string): Promise<unknown>;
  /** Lets waiting messages in, so that a key press is answered while the prose is still being read. */
  breathe(): Promise<void>;
  /** Told whenever other files answer than before. */
  onHeld(lines: string | null, prose: string | null): void;
}

/** The indexes in this thread: lines first, then titles and headings, then the prose. */
export interface IndexHolder {
  /** Brings the indexes to these files; a later call goes before an earlier one that is still at work. */
  load(files: IndexFiles): Promise<void>;
  /** Null until the lines are there. */
  ask(question: Question): SearchView | null;
}

/** Pages read between two breaths. */
const pagesABreath = 8;

/** Makes a holder that has nothing yet. */
export function createIndexHolder({ fetchFile, breathe, onHeld }: HolderSurroundings): IndexHolder {
  let lines: { readonly name: string; readonly index: LinesIndex } | null = null;
  let prose: { readonly name: string | null; readonly index: ProseIndex } | null = null;
  let turn = 0;

  function tell(): void {
    onHeld(lines?.name ?? null, prose?.name ?? null);
  }

  /** Puts pages into an index, drawing breath; false where another load has begun meanwhile. */
  async function fill(index: ProseIndex, pages: readonly ProsePage[], mine: number): Promise<boolean> {
    for (const [at, page] of pages.entries()) {
      if (at % pagesABreath === 0) await breathe();
      if (mine !== turn) return false;
      index.setPage(page);
    }
    const wanted = new Set(pages.map(({ key }) => key));
    for (const key of index.keys()) if (!wanted.has(key)) index.removePage(key);
    return true;
  }

  async function loadLines(name: string): Promise<LinesIndex> {
    if (lines?.name === name) return lines.index;
    const file = await fetchFile(name);
    if (!isLinesFile(file)) throw new Error('The lines are of another version than this page');
    return openLinesIndex(file);
  }

  return {
    async load(files) {
      turn += 1;
      const mine = turn;
      const index = await loadLines(files.lines);
      if (mine !== turn) return;
      lines = { name: files.lines, index };
      tell();
      if (prose === null) {
        const titles = createProseIndex();
        if (!(await fill(titles, prosePages(index, null), mine))) return;
        prose = { name: null, index: titles };
        tell();
      }
      const file = await fetchFile(files.prose);
      if (!isProseFile(file)) throw new Error('The prose is of another version than this page');
      if (mine !== turn) return;
      // The first time the whole prose takes the titles' place at once; later only pages that changed are put in anew.
      const next = prose.name === null ? createProseIndex() : prose.index;
      if (!(await fill(next, prosePages(index, file), mine))) return;
      prose = { name: files.prose, index: next };
      tell();
    },
    ask({ query, bench: { donor, variant } }) {
      if (lines === null) return null;
      return search({ lines: lines.index, prose: prose?.index ?? null }, query, { bench: donor, variant });
    },
  };
}
