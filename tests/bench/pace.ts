/** How long the bench measures: short for a first look, longer for figures to keep. */
export interface Pace {
  /** Rounds, each of which measures ours and the yardstick once, one right after the other. */
  readonly rounds: number;
  /** Time that one side is repeated for in a round. */
  readonly roundMilliseconds: number;
  /** Rounds of load over HTTP, and the whole seconds of one side in each. */
  readonly loadRounds: number;
  readonly loadSeconds: number;
  /** Visits of a browser a side. */
  readonly visits: number;
  /** Pages of the larger of two books that show how cost grows; the smaller has half. */
  readonly growthPages: number;
}

export const usualPace: Pace = {
  rounds: 21,
  roundMilliseconds: 150,
  loadRounds: 5,
  loadSeconds: 3,
  visits: 9,
  growthPages: 10_000,
};
export const quickPace: Pace = {
  rounds: 5,
  roundMilliseconds: 80,
  loadRounds: 3,
  loadSeconds: 1,
  visits: 3,
  growthPages: 2000,
};
