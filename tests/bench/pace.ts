/** How long the bench measures: short for a first look, longer for figures to keep. */
export interface Pace {
  /** Rounds, each of which measures ours and the yardstick once, one right after the other. */
  readonly rounds: number;
  /** Time that one side is repeated for in a round. */
  readonly roundMilliseconds: number;
  /** The same for load over HTTP, in whole seconds. */
  readonly loadSeconds: number;
  /** Visits of a browser a side. */
  readonly visits: number;
}

export const usualPace: Pace = { rounds: 21, roundMilliseconds: 150, loadSeconds: 3, visits: 9 };
export const quickPace: Pace = { rounds: 5, roundMilliseconds: 80, loadSeconds: 1, visits: 3 };
