import MiniSearch, { type SearchResult } from 'minisearch';
import { proseOptions, proseWords, type ProseEntry } from './prose-options.ts';
import { prosePageOf, type ProsePage } from './prose-page.ts';
import { proseQuery } from './prose-query.ts';
import type { ReadQuery } from './read-query.ts';
import type { SearchDocument } from './search-document.ts';

/** A section or page that answers; `section` is null for a page. */
export interface ProseFound {
  readonly page: ProsePage;
  readonly section: ProsePage['sections'][number] | null;
  /** The words of it that answered. */
  readonly words: readonly string[];
  readonly score: number;
}

/** What a query found in the prose. */
export interface ProseAnswer {
  readonly sections: readonly ProseFound[];
  readonly pages: readonly ProseFound[];
  /** True where nothing has all of the words, and these have some. */
  readonly someWordsOnly: boolean;
}

/** The prose of the book, to be asked and to be kept up to date a page at a time. */
export interface ProseIndex {
  readonly size: number;
  page(key: string): ProsePage | null;
  keys(): readonly string[];
  /** Puts a page in, in place of what it was; one that has not changed costs nothing. */
  setPage(page: ProsePage): void;
  removePage(key: string): void;
  /**
   * Asks for sections and pages, best first: those with all of the words, else those with any.
   * @param bench the slug of the donor on the bench, whose pages count for more
   */
  search(query: ReadQuery, bench: string | null, limit: number): ProseAnswer;
}

const benchBoost = 2;

/** Makes an index of documents at once. */
export function buildProseIndex(documents: readonly SearchDocument[]): ProseIndex {
  const index = createProseIndex();
  for (const document of documents) index.setPage(prosePageOf(document));
  return index;
}

/** Makes an empty index. */
export function createProseIndex(): ProseIndex {
  const known = new Set<string>();
  const engine = new MiniSearch<ProseEntry>({
    ...proseOptions,
    tokenize: (text) => {
      const words = proseWords(text);
      for (const word of words) known.add(word);
      return words;
    },
  });
  const pages = new Map<string, { page: ProsePage; entries: readonly ProseEntry[] }>();

  function removePage(key: string): void {
    const current = pages.get(key);
    if (current === undefined) return;
    for (const entry of current.entries) engine.remove(entry);
    pages.delete(key);
  }

  return {
    get size() {
      return pages.size;
    },
    page: (key) => pages.get(key)?.page ?? null,
    keys: () => [...pages.keys()],
    setPage(page) {
      if (JSON.stringify(pages.get(page.key)?.page) === JSON.stringify(page)) return;
      removePage(page.key);
      const entries = entriesOf(page);
      engine.addAll(entries);
      pages.set(page.key, { page, entries });
    },
    removePage,
    search(query, bench, limit) {
      const asked = proseQuery(query, known);
      if (asked === null) return { sections: [], pages: [], someWordsOnly: false };
      const ofBench = bench === null ? null : `donors/${bench}/`;
      const options =
        ofBench === null ? {} : { boostDocument: (id: unknown) => (String(id).startsWith(ofBench) ? benchBoost : 1) };
      let results = engine.search({ combineWith: 'AND', queries: asked }, options);
      const someWordsOnly = results.length === 0 && asked.length > 1;
      if (someWordsOnly) results = engine.search({ combineWith: 'OR', queries: asked }, options);
      const sections: ProseFound[] = [];
      const wholePages: ProseFound[] = [];
      for (const { id, score, terms } of bestOf(results, limit)) {
        if (sections.length >= limit && wholePages.length >= limit) break;
        const found = foundAt(String(id), terms, score);
        if (found === null) continue;
        const list = found.section === null ? wholePages : sections;
        if (list.length < limit) list.push(found);
      }
      return { sections, pages: wholePages, someWordsOnly: someWordsOnly && results.length > 0 };
    },
  };

  function foundAt(id: string, words: readonly string[], score: number): ProseFound | null {
    const [key = '', anchor] = id.split('#');
    const page = pages.get(key)?.page;
    if (page === undefined) return null;
    if (anchor === undefined) return { page, section: null, words, score };
    const section = page.sections[Number(anchor)];
    return section === undefined ? null : { page, section, words, score };
  }
}

/** The first results of both kinds; equals are ordered by their address, so that every index of the same book answers alike. */
function bestOf(results: readonly SearchResult[], limit: number): SearchResult[] {
  let end = Math.min(results.length, limit * 8);
  while (end < results.length && results[end]?.score === results[end - 1]?.score) end += 1;
  return results.slice(0, end).sort((a, b) => b.score - a.score || (String(a.id) < String(b.id) ? -1 : 1));
}

/** A page's entries. A section's number stands for its anchor, since a page may have two headings of one name. */
function entriesOf({ key, title, subjectTitle, summary, opening, sections }: ProsePage): ProseEntry[] {
  const whole: ProseEntry = {
    id: key,
    heading: title,
    title: subjectTitle,
    text: [summary ?? '', opening, ...sections.map(({ heading }) => heading)].join('\n'),
  };
  return [
    whole,
    ...sections.map(({ heading, text }, at) => ({
      id: `${key}#${at}`,
      heading,
      title: `${subjectTitle}\n${title}`,
      text,
    })),
  ];
}
