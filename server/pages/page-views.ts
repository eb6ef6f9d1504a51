import type {
  DifferenceView,
  PageSummary,
  PreviewView,
  RevisionSummary,
  SubjectSummary,
  SubjectView,
  VariantChoices,
} from '../../shared/contracts/views.ts';
import type { Applicability } from '../../shared/pages/applicability.ts';
import type { Finding } from '../../shared/pages/finding.ts';
import type { SubjectFacts } from '../../shared/pages/front-matter.ts';
import { pageKinds, type PageKind } from '../../shared/pages/page-kind.ts';
import { choicesOf } from '../../shared/pages/variant.ts';
import type { Difference } from '../../shared/text/difference.ts';
import type { ListedPageRow, RevisionRow } from './page-store.ts';

/** What is shown of connectors whose page does not say where on the bike they are. */
const unplacedZone = 'elsewhere';

/** A subject whose overview is missing or retired has no facts of its own. */
const noFacts: SubjectFacts = {
  maker: null,
  model: null,
  years: null,
  markets: [],
  voltage: null,
  ignition: null,
  charging: null,
  battery: null,
  earth: null,
};

/** A revision as a row of a page's history. */
export function revisionSummary({
  number,
  title,
  summary,
  author,
  publishedBy,
  publishedAt,
  proposal,
}: RevisionRow): RevisionSummary {
  return { number, title, summary, author, publishedBy, publishedAt, proposal };
}

/** A finding as it crosses the wire. */
export function findingView({ path, ...finding }: Finding): PreviewView['findings'][number] {
  return path === undefined ? finding : { ...finding, path: [...path] };
}

/** A difference as it crosses the wire. */
export function differenceView({ lines, coarse }: Difference): DifferenceView {
  return { lines: lines.map((line) => ({ ...line, words: [...line.words] })), coarse };
}

/** A page as a row of a list. */
export function pageSummary(row: ListedPageRow): PageSummary {
  const { shelf, subject, subjectTitle, page, title, kind, summary, revision, publishedAt, publishedBy, author } = row;
  return {
    ...{ shelf, subject, subjectTitle, page, title, kind, summary, revision, publishedAt, publishedBy, author },
    lines: row.lines,
    connectors: row.digest.connectors.length,
  };
}

/** Compares pages as a subject lists them: in the order of their kinds, then by title. */
export function byKind(one: { kind: PageKind; title: string }, other: { kind: PageKind; title: string }): number {
  return pageKinds.indexOf(one.kind) - pageKinds.indexOf(other.kind) || one.title.localeCompare(other.title, 'en');
}

/** The facts as they cross the wire. */
export function factsView(facts: SubjectFacts): SubjectView['facts'] {
  return { ...facts, markets: [...facts.markets] };
}

/** What a reader may choose between, of everything that a subject's pages say that they hold for. */
export function choicesView(applicabilities: readonly Applicability[]): VariantChoices {
  const { years, markets, frames } = choicesOf(applicabilities);
  return { years, markets: [...markets], frames: [...frames] };
}

/** The facts of a subject's overview. */
export function subjectFacts(rows: readonly ListedPageRow[]): SubjectFacts {
  return rows.find(({ page }) => page === 'overview')?.digest.facts ?? noFacts;
}

/** A subject as a row of its shelf, from the rows of its pages, of which there is at least one. */
export function subjectSummary(first: ListedPageRow, rows: readonly ListedPageRow[]): SubjectSummary {
  const facts = subjectFacts(rows);
  const connectors = rows.flatMap(({ digest }) => digest.connectors);
  const zones = new Map<string, number>();
  for (const { zone } of connectors) zones.set(zone ?? unplacedZone, (zones.get(zone ?? unplacedZone) ?? 0) + 1);
  return {
    shelf: first.shelf,
    slug: first.subject,
    title: first.subjectTitle,
    summary: rows.find(({ page }) => page === 'overview')?.summary ?? '',
    maker: facts.maker,
    model: facts.model,
    years: facts.years,
    markets: [...facts.markets],
    pages: rows.length,
    connectors: connectors.length,
    lines: rows.reduce((sum, { lines }) => sum + lines, 0),
    cited: rows.reduce((sum, { cited }) => sum + cited, 0),
    zones: [...zones].map(([zone, count]) => ({ zone, connectors: count })),
  };
}

/** The subjects of a shelf, from the rows of all its pages, in the order in which they come. */
export function subjectSummaries(rows: readonly ListedPageRow[]): SubjectSummary[] {
  const bySubject = new Map<string, ListedPageRow[]>();
  for (const row of rows) {
    const own = bySubject.get(row.subject);
    if (own === undefined) bySubject.set(row.subject, [row]);
    else own.push(row);
  }
  return [...bySubject.values()].flatMap((own) => (own[0] === undefined ? [] : [subjectSummary(own[0], own)]));
}

/** One donor, part or topic, from the rows of its pages, of which there is at least one. */
export function subjectView(first: ListedPageRow, rows: readonly ListedPageRow[]): SubjectView {
  return {
    summary: subjectSummary(first, rows),
    facts: factsView(subjectFacts(rows)),
    pages: rows.toSorted(byKind).map(pageSummary),
    connectors: rows.flatMap(({ page, digest }) => digest.connectors.map((connector) => ({ page, ...connector }))),
  };
}
