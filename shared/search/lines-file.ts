import type { TerminalName } from '../blocks/block.ts';
import {
  cavityAddress,
  checkAddress,
  componentAddress,
  insideAddress,
  positionAddress,
  wireAddress,
} from '../blocks/line-address.ts';
import { shelves } from '../pages/address.ts';
import { pageKinds } from '../pages/page-kind.ts';
import { slugOf } from '../lib/slug.ts';
import { packNumbers, type PackedNumbers } from './packed-numbers.ts';
import { onOneLine, packStrings, placesIn, type PackedStrings } from './packed-strings.ts';
import { formatApplicability, formatColour, formatFace, formatHazard } from './packed-values.ts';
import { bothOf, repeated } from './recent-values.ts';
import { holderKinds, lineStates, type HolderKind, type SearchDocument, type SearchLine } from './search-document.ts';

/** Raised whenever the file's shape changes, so that an old page in a browser asks for a new program, not for nonsense. */
export const linesVersion = 1;

/**
 * Every line of the book with the titles and headings of its pages, column by column, as it goes over the wire. A column
 * is compressed far better than rows are, and is scanned without ever being made into rows.
 */
export interface LinesFile {
  readonly version: typeof linesVersion;
  readonly subjects: {
    readonly count: number;
    readonly shelves: PackedNumbers;
    readonly slugs: string;
    readonly titles: string;
  };
  readonly pages: {
    readonly count: number;
    readonly subjects: PackedNumbers;
    readonly slugs: PackedStrings;
    readonly titles: PackedStrings;
    readonly kinds: PackedNumbers;
    /** How many headings and how many blocks each page has. */
    readonly headings: PackedNumbers;
    readonly holders: PackedNumbers;
  };
  readonly headings: {
    readonly count: number;
    readonly texts: PackedStrings;
    /** Anchors that do not follow from the heading's text: which heading, and its anchor. */
    readonly ids: readonly (readonly [number, string])[];
  };
  /** How many cautions each page has, and each one's signal word and hazard: `warning battery`. Their words come with the prose. */
  readonly hazards: { readonly counts: PackedNumbers; readonly kinds: PackedStrings };
  readonly holders: {
    readonly count: number;
    readonly kinds: PackedNumbers;
    readonly ids: PackedStrings;
    readonly names: PackedStrings;
    readonly zones: PackedStrings;
    readonly faces: PackedStrings;
    readonly lines: PackedNumbers;
  };
  readonly lines: {
    readonly count: number;
    /** 0 the number after the one before, 1 the same again, else 2 and its place among the names. */
    readonly own: PackedNumbers;
    readonly names: PackedStrings;
    readonly texts: PackedStrings;
    readonly details: PackedStrings;
    readonly colours: PackedStrings;
    readonly sizes: PackedStrings;
    readonly ends: PackedNumbers;
    readonly endIds: PackedStrings;
    readonly endTerminals: PackedStrings;
    readonly applies: PackedStrings;
    readonly cited: PackedNumbers;
    readonly states: PackedNumbers;
    /** 0 for none, else the place among the page's cautions and one more. */
    readonly hazards: PackedNumbers;
    /** Addresses that do not follow from the line: which line, and its address. */
    readonly addresses: readonly (readonly [number, string])[];
  };
}

/** The anchor that a heading has unless the file says otherwise. */
export function usualAnchor(heading: string): string {
  return `s-${slugOf(heading)}`;
}

/** The address that a line has unless the file says otherwise. */
export function usualAddress(
  kind: HolderKind,
  holderId: string,
  { own, text, goesTo, applies }: Pick<SearchLine, 'own' | 'text' | 'goesTo' | 'applies'>,
): string {
  switch (kind) {
    case 'connector':
      return cavityAddress(holderId, own, 0, applies);
    case 'components':
      return componentAddress(own, applies);
    case 'switch':
      return positionAddress(holderId, own, applies);
    case 'wires': {
      const [from = nowhere, to = nowhere] = goesTo;
      return wireAddress(from, to, applies);
    }
    case 'inside':
      return insideAddress(holderId, own, null, applies);
    case 'checks':
      return checkAddress(text, applies);
  }
}

const nowhere: TerminalName = { id: '', terminal: null };

/** The number after a cavity's name, where it is a number; null where it is not. */
export function nextCavity(own: string | null): string | null {
  if (own === null) return '1';
  const number = /^(\d{1,3})\+*$/.exec(own)?.[1];
  return number === undefined ? null : String(Number(number) + 1);
}

/** Puts documents into the form that goes over the wire, in the order given. */
export function buildLinesFile(documents: readonly SearchDocument[]): LinesFile {
  const subjects = new Map<string, { place: number; shelf: number; slug: string; title: string }>();
  for (const { address, subjectTitle } of documents) {
    const key = `${address.shelf}/${address.subject}`;
    if (subjects.has(key)) continue;
    subjects.set(key, {
      place: subjects.size,
      shelf: shelves.indexOf(address.shelf),
      slug: address.subject,
      title: onOneLine(subjectTitle),
    });
  }
  const subjectList = [...subjects.values()];
  const headings = documents.flatMap(({ sections }) => sections.filter(({ id }) => id !== ''));
  const holders = documents.flatMap((document) => document.holders);
  const hazards = documents.flatMap((document) => document.hazards);
  return {
    version: linesVersion,
    subjects: {
      count: subjectList.length,
      shelves: packNumbers(subjectList.map(({ shelf }) => shelf)),
      slugs: subjectList.map(({ slug }) => slug).join('\n'),
      titles: subjectList.map(({ title }) => title).join('\n'),
    },
    pages: {
      count: documents.length,
      subjects: packNumbers(
        documents.map(({ address }) => subjects.get(`${address.shelf}/${address.subject}`)?.place ?? 0),
      ),
      slugs: packStrings(documents.map(({ address }) => address.page)),
      titles: packStrings(documents.map(({ title }) => title)),
      kinds: packNumbers(documents.map(({ kind }) => pageKinds.indexOf(kind))),
      headings: packNumbers(documents.map(({ sections }) => sections.filter(({ id }) => id !== '').length)),
      holders: packNumbers(documents.map((document) => document.holders.length)),
    },
    headings: {
      count: headings.length,
      texts: packStrings(headings.map(({ heading }) => heading)),
      ids: headings.flatMap(({ id, heading }, at) => (id === usualAnchor(heading) ? [] : [[at, id] as const])),
    },
    hazards: {
      counts: packNumbers(documents.map((document) => document.hazards.length)),
      kinds: packStrings(hazards.map(formatHazard)),
    },
    holders: {
      count: holders.length,
      kinds: packNumbers(holders.map(({ kind }) => holderKinds.indexOf(kind))),
      ids: packStrings(
        holders.map(({ id }) => id),
        [''],
      ),
      names: packStrings(
        holders.map(({ name }) => name),
        [''],
      ),
      zones: packStrings(
        holders.map(({ zone }) => zone),
        [''],
      ),
      faces: packStrings(
        holders.map(({ face }) => formatFace(face)),
        [''],
      ),
      lines: packNumbers(holders.map(({ lines }) => lines.length)),
    },
    lines: packLines(documents),
  };
}

function packLines(documents: readonly SearchDocument[]): LinesFile['lines'] {
  const lines: SearchLine[] = [];
  const own: number[] = [];
  const names: string[] = [];
  const addresses: [number, string][] = [];
  for (const { holders } of documents) {
    for (const holder of holders) {
      let before: string | null = null;
      for (const line of holder.lines) {
        const name = onOneLine(line.own);
        if (name === nextCavity(before)) own.push(0);
        else if (name === before) own.push(1);
        else {
          own.push(2);
          names.push(name);
        }
        before = name;
        if (line.address !== usualAddress(holder.kind, holder.id, line)) addresses.push([lines.length, line.address]);
        lines.push(line);
      }
    }
  }
  const ends = lines.flatMap(({ goesTo }) => goesTo);
  const texts = lines.map(({ text }) => text);
  const endIds = ends.map(({ id }) => id);
  const text = placesIn(texts, ['']);
  const holderIds = placesIn(
    documents.flatMap(({ holders }) => holders.map(({ id }) => id)),
    [''],
  );
  const place = placeContexts(
    text,
    repeated(
      holderIds,
      documents.flatMap(({ holders }) => holders.map((holder) => holder.lines.length)),
    ),
  );
  const end = repeated(
    place,
    lines.map(({ goesTo }) => goesTo.length),
  );
  return {
    count: lines.length,
    own: packNumbers(own),
    names: packStrings(names),
    texts: packStrings(texts, ['']),
    details: packStrings(
      lines.map(({ detail }) => detail),
      [''],
    ),
    colours: packStrings(
      lines.map(({ colour }) => formatColour(colour)),
      [''],
      text,
    ),
    sizes: packStrings(
      lines.map(({ size }) => size ?? ''),
      [''],
      text,
    ),
    ends: packNumbers(lines.map(({ goesTo }) => goesTo.length)),
    endIds: packStrings(endIds, [], end),
    endTerminals: packStrings(
      ends.map(({ terminal }) => terminal ?? ''),
      [''],
      bothOf(end, placesIn(endIds)),
    ),
    applies: packStrings(
      lines.map(({ applies }) => formatApplicability(applies)),
      [''],
    ),
    cited: packNumbers(lines.map(({ cited }) => (cited ? 1 : 0))),
    states: packNumbers(lines.map(({ state }) => lineStates.indexOf(state))),
    hazards: packNumbers(lines.map(({ hazard }) => (hazard === null ? 0 : hazard + 1))),
    addresses,
  };
}

/** What a line's ends depend on: its text together with the block that it stands in. */
export function placeContexts(texts: ArrayLike<number>, holderIds: ArrayLike<number>): Float64Array {
  return bothOf(texts, holderIds);
}
