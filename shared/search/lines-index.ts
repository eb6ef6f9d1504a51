import { shelves, type PageAddress, type Shelf } from '../pages/address.ts';
import type { Applicability } from '../pages/applicability.ts';
import { pageKinds, type PageKind } from '../pages/page-kind.ts';
import { buildLinesFile, linesVersion, nextCavity, placeContexts, usualAnchor, type LinesFile } from './lines-file.ts';
import { unpackNumbers } from './packed-numbers.ts';
import { unpackStrings, type StringColumn } from './packed-strings.ts';
import { parseApplicability, parseColour, parseFace, parseHazard } from './packed-values.ts';
import {
  holderKinds,
  type HolderKind,
  type IndexedColour,
  type SearchDocument,
  type SearchFace,
  type SearchHazard,
} from './search-document.ts';
import { bothOf, repeated } from './recent-values.ts';
import { createVocabulary, type Vocabulary } from './vocabulary.ts';

/** A subject of the book. */
export interface IndexedSubject {
  readonly shelf: Shelf;
  readonly slug: string;
  readonly title: string;
}

/** A page of the book; `subject` is its place among the subjects. */
export interface IndexedPage {
  readonly subject: number;
  readonly address: PageAddress;
  readonly title: string;
  readonly kind: PageKind;
  readonly headings: readonly { readonly id: string; readonly text: string }[];
  readonly hazards: readonly Pick<SearchHazard, 'signal' | 'kind'>[];
  /** Its first block that holds lines, and the one after its last. */
  readonly holders: readonly [number, number];
}

/** A block that holds lines; `page` is its place among the pages. */
export interface IndexedHolder {
  readonly page: number;
  readonly kind: HolderKind;
  readonly id: string;
  readonly name: string;
  readonly zone: string;
  readonly face: SearchFace | null;
  /** Its first line, and the one after its last. */
  readonly start: number;
  readonly end: number;
}

/** Every line of the book, unpacked for scanning: one array a column, and the dictionaries that the columns point into. */
export interface LinesIndex {
  readonly subjects: readonly IndexedSubject[];
  readonly pages: readonly IndexedPage[];
  readonly holders: readonly IndexedHolder[];
  readonly count: number;
  /** Places in `names`. */
  readonly own: Uint32Array;
  readonly names: readonly string[];
  /** Names that cavities have, in lower case, to their places among the names; `2` leads to `2+` as well. */
  readonly cavities: ReadonlyMap<string, readonly number[]>;
  readonly texts: StringColumn;
  readonly details: StringColumn;
  readonly colour: Uint32Array;
  /** Place 0 is no colour. */
  readonly colours: readonly (IndexedColour | null)[];
  readonly sizes: StringColumn;
  /** Where each line's ends begin among all of them; one longer than there are lines. */
  readonly endStart: Uint32Array;
  readonly endIds: StringColumn;
  readonly endTerminals: StringColumn;
  readonly applies: Uint32Array;
  readonly applicabilities: readonly Applicability[];
  readonly cited: Uint32Array;
  readonly states: Uint32Array;
  /** 0 for none, else the place among the page's cautions and one more. */
  readonly hazard: Uint32Array;
  readonly addresses: ReadonlyMap<number, string>;
  readonly vocabulary: Vocabulary;
}

/** True where a value that came over the wire is a lines file of this version. */
export function isLinesFile(value: unknown): value is LinesFile {
  return (
    typeof value === 'object' &&
    value !== null &&
    'version' in value &&
    value.version === linesVersion &&
    'lines' in value
  );
}

/** Makes the index of documents directly. */
export function buildLinesIndex(documents: readonly SearchDocument[]): LinesIndex {
  return openLinesIndex(buildLinesFile(documents));
}

/** Unpacks a lines file for scanning. */
export function openLinesIndex(file: LinesFile): LinesIndex {
  const { lines } = file;
  const subjects = openSubjects(file);
  const pages = openPages(file, subjects);
  const holders = openHolders(file, pages);
  const { own, names } = openNames(file, holders);
  const texts = unpackStrings(lines.texts, lines.count);
  const details = unpackStrings(lines.details, lines.count);
  const endCounts = unpackNumbers(lines.ends, lines.count);
  const endStart = startsOf(endCounts);
  const endCount = endStart[lines.count] ?? 0;
  const holderIds = unpackStrings(file.holders.ids, file.holders.count).places;
  const place = placeContexts(
    texts.places,
    repeated(
      holderIds,
      holders.map(({ start, end }) => end - start),
    ),
  );
  const endContexts = repeated(place, endCounts);
  const endIds = unpackStrings(lines.endIds, endCount, endContexts);
  const colours = unpackStrings(lines.colours, lines.count, texts.places);
  const applies = unpackStrings(lines.applies, lines.count);
  return {
    subjects,
    pages,
    holders,
    count: lines.count,
    own,
    names,
    cavities: cavitiesOf(holders, own, names),
    texts,
    details,
    colour: colours.places,
    colours: colours.values.map(parseColour),
    sizes: unpackStrings(lines.sizes, lines.count, texts.places),
    endStart,
    endIds,
    endTerminals: unpackStrings(lines.endTerminals, endCount, bothOf(endContexts, endIds.places)),
    applies: applies.places,
    applicabilities: applies.values.map(parseApplicability),
    cited: unpackNumbers(lines.cited, lines.count),
    states: unpackNumbers(lines.states, lines.count),
    hazard: unpackNumbers(lines.hazards, lines.count),
    addresses: new Map(lines.addresses),
    vocabulary: createVocabulary({
      subjects: subjects.map(({ slug, title }) => `${title} ${slug}`),
      pages: pages.map(({ title, address }) => `${title} ${address.page}`),
      holders: holders.map(({ name, id }) => (name === '' ? id : `${name} ${id}`)),
      zones: holders.map(({ zone }) => zone),
      names,
      texts: texts.values,
      details: details.values,
      ends: endIds.values,
    }),
  };
}

function startsOf(counts: Uint32Array): Uint32Array {
  const starts = new Uint32Array(counts.length + 1);
  for (let index = 0; index < counts.length; index += 1)
    starts[index + 1] = (starts[index] ?? 0) + (counts[index] ?? 0);
  return starts;
}

function openSubjects({ subjects }: LinesFile): IndexedSubject[] {
  const shelfPlaces = unpackNumbers(subjects.shelves, subjects.count);
  const titles = subjects.titles.split('\n');
  const slugs = subjects.count === 0 ? [] : subjects.slugs.split('\n');
  return slugs.map((slug, index) => ({
    shelf: shelves[shelfPlaces[index] ?? 0] ?? 'reference',
    slug,
    title: titles[index] ?? slug,
  }));
}

function openPages({ pages, headings, hazards }: LinesFile, subjects: readonly IndexedSubject[]): IndexedPage[] {
  const subjectPlaces = unpackNumbers(pages.subjects, pages.count);
  const slugs = unpackStrings(pages.slugs, pages.count);
  const titles = unpackStrings(pages.titles, pages.count);
  const kinds = unpackNumbers(pages.kinds, pages.count);
  const headingStarts = startsOf(unpackNumbers(pages.headings, pages.count));
  const holderStarts = startsOf(unpackNumbers(pages.holders, pages.count));
  const headingTexts = unpackStrings(headings.texts, headings.count);
  const ids = new Map(headings.ids);
  const hazardStarts = startsOf(unpackNumbers(hazards.counts, pages.count));
  const hazardTexts = unpackStrings(hazards.kinds, hazardStarts[pages.count] ?? 0);
  return Array.from({ length: pages.count }, (_, index): IndexedPage => {
    const subject = subjectPlaces[index] ?? 0;
    const ofPage = [];
    for (let at = headingStarts[index] ?? 0; at < (headingStarts[index + 1] ?? 0); at += 1) {
      const text = textAt(headingTexts, at);
      ofPage.push({ id: ids.get(at) ?? usualAnchor(text), text });
    }
    return {
      subject,
      address: {
        shelf: subjects[subject]?.shelf ?? 'reference',
        subject: subjects[subject]?.slug ?? '',
        page: textAt(slugs, index),
      },
      title: textAt(titles, index),
      kind: pageKinds[kinds[index] ?? 0] ?? 'notes',
      headings: ofPage,
      hazards: Array.from({ length: (hazardStarts[index + 1] ?? 0) - (hazardStarts[index] ?? 0) }, (_, at) =>
        parseHazard(textAt(hazardTexts, (hazardStarts[index] ?? 0) + at)),
      ),
      holders: [holderStarts[index] ?? 0, holderStarts[index + 1] ?? 0],
    };
  });
}

/** The text at a place of a column. */
export function textAt({ values, places }: StringColumn, index: number): string {
  return values[places[index] ?? 0] ?? '';
}

function openHolders({ holders }: LinesFile, pages: readonly IndexedPage[]): IndexedHolder[] {
  const kinds = unpackNumbers(holders.kinds, holders.count);
  const ids = unpackStrings(holders.ids, holders.count);
  const names = unpackStrings(holders.names, holders.count);
  const zones = unpackStrings(holders.zones, holders.count);
  const faces = unpackStrings(holders.faces, holders.count);
  const starts = startsOf(unpackNumbers(holders.lines, holders.count));
  const pageOf = new Uint32Array(holders.count);
  pages.forEach(({ holders: [start, end] }, page) => pageOf.fill(page, start, end));
  return Array.from({ length: holders.count }, (_, index) => ({
    page: pageOf[index] ?? 0,
    kind: holderKinds[kinds[index] ?? 0] ?? 'components',
    id: textAt(ids, index),
    name: textAt(names, index),
    zone: textAt(zones, index),
    face: parseFace(textAt(faces, index)),
    start: starts[index] ?? 0,
    end: starts[index + 1] ?? 0,
  }));
}

function openNames(
  { lines }: LinesFile,
  holders: readonly IndexedHolder[],
): { own: Uint32Array; names: readonly string[] } {
  const written = unpackNumbers(lines.own, lines.count);
  let exceptions = 0;
  for (const code of written) if (code === 2) exceptions += 1;
  const listed = unpackStrings(lines.names, exceptions);
  const names: string[] = [];
  const places = new Map<string, number>();
  const own = new Uint32Array(lines.count);
  let taken = 0;
  for (const { start, end } of holders) {
    let before: string | null = null;
    for (let line = start; line < end; line += 1) {
      const code = written[line];
      let name: string = before ?? '';
      if (code === 0) name = nextCavity(before) ?? '';
      else if (code === 2) {
        name = textAt(listed, taken);
        taken += 1;
      }
      let place = places.get(name);
      if (place === undefined) {
        place = names.push(name) - 1;
        places.set(name, place);
      }
      own[line] = place;
      before = name;
    }
  }
  return { own, names };
}

function cavitiesOf(
  holders: readonly IndexedHolder[],
  own: Uint32Array,
  names: readonly string[],
): ReadonlyMap<string, readonly number[]> {
  const places = new Set<number>();
  for (const { kind, start, end } of holders) {
    if (kind === 'connector') for (let line = start; line < end; line += 1) places.add(own[line] ?? 0);
  }
  const cavities = new Map<string, number[]>();
  for (const place of places) {
    const name = (names[place] ?? '').toLowerCase();
    // A plus after a digit counts a further wire in the same cavity; after a letter it is part of a name, such as `B+`.
    for (const key of new Set([name, name.replace(/(\d)\++$/, '$1')]))
      cavities.set(key, [...(cavities.get(key) ?? []), place]);
  }
  return cavities;
}
