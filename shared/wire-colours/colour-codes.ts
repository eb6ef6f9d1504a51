import type { ColourName, ColourSystem, ColourSystemName } from './colour-system.ts';

/** A row of a colour system's table. */
export interface ColourCode {
  readonly code: string;
  readonly colour: ColourName;
  /** What else the same system's writers put for it. */
  readonly otherSpellings: readonly string[];
}

function row(code: string, colour: ColourName, ...otherSpellings: readonly string[]): ColourCode {
  return { code, colour, otherSpellings };
}

/* Japanese letters: common practice, recalled from lists in the manner of JASO D 607; no single published source. */
const jis: readonly ColourCode[] = [
  row('B', 'black'),
  row('Br', 'brown'),
  row('Ch', 'chocolate'),
  row('Dg', 'dark green'),
  row('G', 'green'),
  row('Gr', 'grey'),
  row('L', 'blue'),
  row('Lg', 'light green'),
  row('O', 'orange'),
  row('P', 'pink'),
  row('R', 'red'),
  row('Sb', 'light blue'),
  row('V', 'violet'),
  row('W', 'white'),
  row('Y', 'yellow'),
];

/*
 * DIN 72551-7 (DIN's own article names BL, GN, RD, BN and OR; the rest as in IEC 60757), with the abbreviations of
 * older German diagrams beside it; of those bl, or, rs, vi and tr are recalled, not read.
 */
const din: readonly ColourCode[] = [
  row('BK', 'black', 'sw'),
  row('BN', 'brown', 'br'),
  row('RD', 'red', 'rt', 'ro'),
  row('OR', 'orange', 'or'),
  row('YE', 'yellow', 'ge'),
  row('GN', 'green', 'gn'),
  row('BL', 'blue', 'bl'),
  row('VT', 'violet', 'li', 'vi'),
  row('GY', 'grey', 'gr'),
  row('WH', 'white', 'ws'),
  row('PK', 'pink', 'rs'),
  row('TQ', 'turquoise'),
  row('HB', 'light blue', 'hb'),
  row('TR', 'clear', 'tr'),
];

/* BS-AU7: B, U, N, R, P, G, S and W read in a copy of the standard's table; K, LG, O and Y recalled. */
const bsAu7: readonly ColourCode[] = [
  row('B', 'black'),
  row('U', 'blue'),
  row('N', 'brown'),
  row('R', 'red'),
  row('P', 'violet'),
  row('G', 'green'),
  row('S', 'grey'),
  row('W', 'white'),
  row('Y', 'yellow'),
  row('O', 'orange'),
  row('K', 'pink'),
  row('LG', 'light green'),
];

/* IEC 60757:1983, whose lower case has the same meaning. GNYE is two of its codes joined. */
const iec: readonly ColourCode[] = [
  row('BK', 'black'),
  row('BN', 'brown'),
  row('RD', 'red'),
  row('OG', 'orange'),
  row('YE', 'yellow'),
  row('GN', 'green'),
  row('BU', 'blue'),
  row('VT', 'violet'),
  row('GY', 'grey'),
  row('WH', 'white'),
  row('PK', 'pink'),
  row('GD', 'gold'),
  row('TQ', 'turquoise'),
  row('SR', 'silver'),
];

const tables: Readonly<Record<ColourSystemName, readonly ColourCode[]>> = { jis, din, 'bs-au7': bsAu7, iec, own: [] };

/** The colour-code systems as people know them. */
export const colourSystemLabels: Readonly<Record<ColourSystemName, string>> = {
  jis: 'Japanese letters',
  din: 'DIN 72551',
  'bs-au7': 'BS-AU7',
  iec: 'IEC 60757',
  own: "the page's own key",
};

/** A system's table, in its own order. `own` has none of its own: its key stands on the page. */
export function colourCodes(system: ColourSystemName): readonly ColourCode[] {
  return tables[system];
}

/** A system's table with a page's own key read as one. */
export function codesOf(system: ColourSystem): readonly ColourCode[] {
  if (system.name !== 'own') return tables[system.name];
  return Object.entries(system.key).map(([code, colour]) => row(code, colour));
}

/** True where a code's letters count in their exact case: `Br` is brown, and `BR` may be black with a red tracer. */
export function caseCounts(system: ColourSystem): boolean {
  return system.name === 'jis' || system.name === 'own';
}
