/** One line of the bench's table: a figure beside its yardstick, and the budget that the design gives it. */
export interface BenchRow {
  readonly what: string;
  readonly beside: string;
  /** The figure and the yardstick as people read them. */
  readonly measured: string;
  readonly yardstick: string;
  readonly ratio: number;
  /** Null where the design sets none and the figure is there to be known. */
  readonly budget: { readonly kind: 'at least' | 'at most'; readonly ratio: number } | null;
}

/** True where the row keeps its budget, or has none. */
export function isMet({ ratio, budget }: BenchRow): boolean {
  if (budget === null) return true;
  return budget.kind === 'at least' ? ratio >= budget.ratio : ratio <= budget.ratio;
}

/** The middle value of some measurements. */
export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN;
}

/** The value under which the given share of the measurements lies. */
export function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? Number.NaN;
}
