import { anyVariant, type Variant } from '../pages/applicability.ts';
import { excerptOf } from './excerpt.ts';
import { lineHit } from './line-hit.ts';
import type { LinesIndex } from './lines-index.ts';
import type { ProseAnswer, ProseFound, ProseIndex } from './prose-index.ts';
import { isCode, queryLines, type LinesAnswer } from './query-lines.ts';
import { readQuery } from './read-query.ts';
import { remarksOn } from './remarks.ts';
import { offeredPage } from './offered-page.ts';
import type { SearchAnswer, SearchHit } from './search-hit.ts';

/** The two indexes that one box asks. `prose` is null while it is on its way. */
export interface SearchIndexes {
  readonly lines: LinesIndex;
  readonly prose: ProseIndex | null;
}

/** What a search is asked for besides the query. */
export interface SearchOptions {
  /** The slug of the donor on the bench, which is preferred. */
  readonly bench: string | null;
  /** The one bike that is meant. */
  readonly variant: Variant;
  /** The most hits of all kinds. */
  readonly limit: number;
}

const usualLimit = 24;

/**
 * Asks both indexes. Lines come first where the query names a colour, a cavity or a circuit; then sections; then pages.
 * @param query as typed
 */
export function search(indexes: SearchIndexes, query: string, options: Partial<SearchOptions> = {}): SearchAnswer {
  const { bench = null, variant = anyVariant, limit = usualLimit } = options;
  const read = readQuery(query);
  if (read.terms.length === 0) return { query, hits: [], remarks: [], bench: null };
  const most = { lines: Math.ceil(limit / 2), sections: Math.ceil(limit / 3), pages: Math.ceil(limit / 6) };
  const lines = queryLines(indexes.lines, read, { bench, variant, limit: most.lines });
  const prose = indexes.prose?.search(read, bench, most.sections) ?? nothing;
  const lineHits = lines.lines
    .map((found) =>
      lineHit(indexes.lines, indexes.prose, found, found.onBench ? lines.variant : lines.variantElsewhere),
    )
    .filter((hit) => hit !== null);
  const offered = lines.elsewhere.map((holder) => offeredPage(indexes.lines, holder)).filter((hit) => hit !== null);
  const sectionHits = prose.sections.map(sectionHit);
  const pageHits = prose.pages
    .slice(0, most.pages)
    .map(pageHit)
    .filter(({ address }) => !offered.some((hit) => hit.address === address));
  // Lines that lack a word which some prose has with all the others come after it, unless a code asks for lines.
  const proseHasAll = prose.sections.length + prose.pages.length > 0 && !prose.someWordsOnly;
  const saysLess = lines.unanswered.length > 0 && proseHasAll && !read.terms.some(isCode);
  const linesFirst = lines.namesLine && !lines.someWordsOnly && !saysLess;
  return {
    query,
    hits: order(linesFirst, lineHits, [...offered, ...sectionHits], pageHits, lines, prose).slice(0, limit),
    remarks: remarksOn(indexes.lines, read, lines, {
      bench,
      proseFound: prose.sections.length + prose.pages.length > 0,
    }),
    bench: benchTitle(indexes.lines, bench) === null ? null : bench,
  };
}

const nothing: ProseAnswer = { sections: [], pages: [], someWordsOnly: false };

/** Which kind comes first. A query that names only a donor or a page is answered by pages before their sections. */
function order(
  linesFirst: boolean,
  lineHits: readonly SearchHit[],
  sectionHits: readonly SearchHit[],
  pageHits: readonly SearchHit[],
  lines: LinesAnswer,
  prose: ProseAnswer,
): SearchHit[] {
  if (lines.namesSubject === 'only') return [...pageHits, ...sectionHits];
  // Where no line has what was asked for, the page that might is the next best thing, not a stretch of its text.
  if (linesFirst && lineHits.length === 0 && lines.elsewhere.length === 0) return [...pageHits, ...sectionHits];
  if (linesFirst) return [...lineHits, ...sectionHits, ...pageHits];
  // Lines that have only some of the words stand behind prose that has all of them.
  if (lines.someWordsOnly && prose.someWordsOnly) return [...sectionHits, ...lineHits, ...pageHits];
  return [...sectionHits, ...pageHits, ...lineHits];
}

/** The title of the donor on the bench; null where the book has no such donor. */
export function benchTitle({ subjects }: LinesIndex, bench: string | null): string | null {
  return subjects.find(({ shelf, slug }) => shelf === 'donors' && slug === bench)?.title ?? null;
}

function sectionHit({ page, section, words }: ProseFound): SearchHit {
  const anchor = section?.id ?? '';
  return {
    kind: 'section',
    address: `${page.key}#${anchor}`,
    path: `${pathOf(page.key)}#${anchor}`,
    title: section?.heading ?? page.title,
    subjectTitle: page.subjectTitle,
    excerpt: excerptOf(section?.text ?? '', words) ?? `In ${page.title}`,
    mark: null,
    line: null,
  };
}

function pageHit({ page, words }: ProseFound): SearchHit {
  const headings = page.sections.map(({ heading }) => heading).join(' · ');
  return {
    kind: 'page',
    address: page.key,
    path: pathOf(page.key),
    title: page.title,
    subjectTitle: page.subjectTitle,
    excerpt: excerptOf(page.summary ?? '', words) ?? excerptOf(headings, words),
    mark: null,
    line: null,
  };
}

function pathOf(key: string): string {
  return key.endsWith('/overview') ? `/${key.slice(0, -'/overview'.length)}` : `/${key}`;
}
