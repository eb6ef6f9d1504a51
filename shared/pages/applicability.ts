/** A span of model years, both ends included; null is open. */
export interface YearSpan {
  readonly from: number | null;
  readonly to: number | null;
}

/** What years, markets and frames something holds for; an empty list means all of them. */
export interface Applicability {
  readonly years: readonly YearSpan[];
  readonly markets: readonly string[];
  readonly frames: readonly string[];
}

/** The one bike a reader has on the bench; null is not chosen. */
export interface Variant {
  readonly year: number | null;
  readonly market: string | null;
  readonly frame: string | null;
}

/** Holds for everything. */
export const appliesToAll: Applicability = { years: [], markets: [], frames: [] };

/** Nothing chosen. */
export const anyVariant: Variant = { year: null, market: null, frame: null };
