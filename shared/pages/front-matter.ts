import type { ColourSystem } from '../wire-colours/colour-system.ts';
import type { Applicability } from './applicability.ts';
import type { PageKind } from './page-kind.ts';

/** What a source may be. `factory-manual` and `standard` make the lines that cite them `cited`. */
export const sourceKinds = [
  'factory-manual',
  'parts-list',
  'standard',
  'club-measurement',
  'other-diagram',
  'word-of-mouth',
] as const;

/** The kind of a source. */
export type SourceKind = (typeof sourceKinds)[number];

/** One source of a page, named by its id in `cite`. */
export interface Source {
  readonly id: string;
  readonly kind: SourceKind;
  readonly title: string;
  readonly where: string | null;
}

/** The facts of a donor or part that its overview carries. */
export interface SubjectFacts {
  readonly maker: string | null;
  readonly model: string | null;
  /** As written: `1978-1981`. */
  readonly years: string | null;
  readonly markets: readonly string[];
  readonly voltage: string | null;
  readonly ignition: string | null;
  readonly charging: string | null;
  /** The id of the component that is the source. */
  readonly battery: string | null;
  readonly earth: 'negative' | 'positive' | null;
}

/** The wire standards whose current table a page goes by. */
export const wireStandards = ['jis', 'thin-wall'] as const;

/** A wire standard's name. */
export type WireStandard = (typeof wireStandards)[number];

/** A page's front matter, read; fields that could not be read have their default and a finding. */
export interface FrontMatter {
  readonly title: string;
  readonly kind: PageKind;
  readonly summary: string;
  readonly applies: Applicability;
  readonly colours: ColourSystem;
  readonly wireStandard: WireStandard;
  readonly sources: readonly Source[];
  readonly facts: SubjectFacts;
}
