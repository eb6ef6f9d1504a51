/** A component's rating, read: what was written and the figures in it. */
export interface Rating {
  readonly written: string;
  readonly volts: number | null;
  readonly amps: number | null;
  /** True where a fuse's current is its blowing current: then half of it counts as continuous. */
  readonly blow: boolean;
  readonly watts: number | null;
  readonly ohms: number | null;
  /** Battery capacity. */
  readonly ampHours: number | null;
  /** Several feeds named by the rating: `dip 55 W, main 60 W`. */
  readonly feeds: readonly { readonly name: string; readonly watts: number | null; readonly amps: number | null }[];
}
