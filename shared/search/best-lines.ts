import type { Applies } from '../pages/variant.ts';

/** A line that answers: its place in the index, and whether it holds for the bike that is meant. */
export interface LineFound {
  readonly line: number;
  readonly holder: number;
  readonly applies: Applies;
  readonly onBench: boolean;
  readonly score: number;
}

/** The best lines so far, never more than asked for. */
export interface BestLines {
  readonly lines: readonly LineFound[];
  /** The score that a further line must exceed; minus infinity while there is room. */
  least(): number;
  offer(found: LineFound): void;
}

/** Keeps the so many best of the lines that it is offered; of equals the first offered comes first. */
export function createBestLines(limit: number): BestLines {
  const lines: LineFound[] = [];
  let least = limit > 0 ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;
  return {
    lines,
    least: () => least,
    offer(found) {
      if (found.score <= least) return;
      let at = lines.length;
      while (at > 0 && (lines[at - 1]?.score ?? 0) < found.score) at -= 1;
      lines.splice(at, 0, found);
      if (lines.length > limit) lines.pop();
      if (lines.length === limit) least = lines.at(-1)?.score ?? least;
    },
  };
}
