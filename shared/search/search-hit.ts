/*
 * What a search gives. The contracts' `SearchView` is made of the same fields; it stands below this folder and is
 * imported by nothing here.
 */

/** What a line says, as a hit shows it before any click. */
export interface SearchHitLine {
  where: string;
  colour: string | null;
  colourWords: string | null;
  size: string | null;
  circuit: string | null;
  goesTo: string | null;
  /** What it holds for, in words; where the bike that is meant rules it out, what that bike is, too. */
  applies: string | null;
  appliesHere: boolean;
  hazard: { signal: string; text: string } | null;
  wireSvg: string | null;
  faceSvg: string | null;
}

/** Something that answers a query. */
export interface SearchHit {
  kind: 'line' | 'section' | 'page' | 'sum';
  address: string;
  path: string;
  title: string;
  subjectTitle: string;
  excerpt: string | null;
  mark: 'unchecked' | 'cited' | null;
  line: SearchHitLine | null;
}

/** Everything that answers a query, best first, and what the search made of it. */
export interface SearchAnswer {
  query: string;
  hits: SearchHit[];
  remarks: string[];
  bench: string | null;
}
