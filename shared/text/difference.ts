import { diffArrays } from 'diff';
import { pairLines } from './line-pairs.ts';
import type { TextLine } from './text-line.ts';
import { readTextLines } from './text-line.ts';
import type { WordChange } from './word-difference.ts';
import { rowDifference, wordDifference } from './word-difference.ts';

/** A line of text or a row of a table in a comparison. Lines count from 1 in their own text. */
export interface LineChange {
  readonly kind: 'same' | 'removed' | 'added' | 'changed';
  readonly table: boolean;
  readonly fromLine: number | null;
  readonly toLine: number | null;
  readonly words: readonly WordChange[];
}

/** The difference of two texts, every line of both in its order. */
export interface Difference {
  readonly lines: readonly LineChange[];
  /** True where the texts were too far apart, and what lies between their common ends is shown as replaced. */
  readonly coarse: boolean;
}

/**
 * Line edits after which the comparison is coarse. The work grows with their square and texts of a few lines repeated
 * cost most: with this number the worst pair of 64 kB was seen to take a quarter of a second, an honest one some ms.
 * A limit of time would need a clock, and would show the same texts differently on a busy day.
 */
const mostLineEdits = 600;

interface Stretch {
  readonly kind: 'same' | 'changed';
  readonly from: readonly [number, number];
  readonly to: readonly [number, number];
}

/** Numbers for lines, equal where the lines are: comparing numbers is cheap however long the lines. */
function numberLines(lines: readonly TextLine[], numbers: Map<string, number>): number[] {
  return lines.map((line) => {
    const key = `${line.table ? '|' : ' '}${line.text}`;
    const number = numbers.get(key) ?? numbers.size;
    numbers.set(key, number);
    return number;
  });
}

/** Stretches of same and changed lines, alternating; null where there are too many edits to say. */
function stretchesOf(from: readonly number[], to: readonly number[]): Stretch[] | null {
  const parts = diffArrays([...from], [...to], { maxEditLength: mostLineEdits });
  if (parts === undefined) return null;
  const stretches: Stretch[] = [];
  let i = 0;
  let j = 0;
  for (const part of parts) {
    const size = part.value.length;
    const [nextI, nextJ] = [part.added ? i : i + size, part.removed ? j : j + size];
    const kind = part.added || part.removed ? 'changed' : 'same';
    const last = stretches.at(-1);
    if (kind === 'changed' && last?.kind === 'changed') {
      stretches[stretches.length - 1] = { kind, from: [last.from[0], nextI], to: [last.to[0], nextJ] };
    } else {
      stretches.push({ kind, from: [i, nextI], to: [j, nextJ] });
    }
    [i, j] = [nextI, nextJ];
  }
  return stretches;
}

function wholeLine(
  kind: 'same' | 'removed' | 'added',
  line: TextLine,
  from: number | null,
  to: number | null,
): LineChange {
  const words = line.text === '' ? [] : [{ kind, text: line.text }];
  return { kind, table: line.table, fromLine: from, toLine: to, words };
}

/** A stretch of changed lines: what was removed and added, and lines that became others, in the order of both texts. */
function changesOf(
  from: readonly TextLine[],
  to: readonly TextLine[],
  fromStart: number,
  toStart: number,
): LineChange[] {
  const changes: LineChange[] = [];
  let i = 0;
  let j = 0;
  const upTo = (endI: number, endJ: number): void => {
    for (const line of from.slice(i, endI)) {
      i += 1;
      changes.push(wholeLine('removed', line, fromStart + i, null));
    }
    for (const line of to.slice(j, endJ)) {
      j += 1;
      changes.push(wholeLine('added', line, null, toStart + j));
    }
  };
  for (const [pairI, pairJ] of pairLines(from, to)) {
    upTo(pairI, pairJ);
    const [one, other] = [from[pairI], to[pairJ]];
    if (!one || !other) break;
    const words = one.table ? rowDifference(one.cells, other.cells) : wordDifference(one.text, other.text);
    i += 1;
    j += 1;
    changes.push({ kind: 'changed', table: one.table, fromLine: fromStart + i, toLine: toStart + j, words });
  }
  upTo(from.length, to.length);
  return changes;
}

/**
 * Compares two Markdown texts for a reader: lines, words inside lines, tables by row. It merges nothing.
 * Both texts stand in it whole: lines with a `fromLine` and their same and removed words are the first text, lines with
 * a `toLine` and their same and added words the second (a table's rows without the padding of their cells).
 */
export function differenceOf(fromText: string, toText: string): Difference {
  const [from, to] = [readTextLines(fromText), readTextLines(toText)];
  const numbers = new Map<string, number>();
  const [fromNumbers, toNumbers] = [numberLines(from, numbers), numberLines(to, numbers)];
  const shorter = Math.min(from.length, to.length);
  let head = 0;
  while (head < shorter && fromNumbers[head] === toNumbers[head]) head += 1;
  let tail = 0;
  while (tail < shorter - head && fromNumbers.at(-1 - tail) === toNumbers.at(-1 - tail)) tail += 1;
  const [fromEnd, toEnd] = [from.length - tail, to.length - tail];

  const found = stretchesOf(fromNumbers.slice(head, fromEnd), toNumbers.slice(head, toEnd));
  const same = (start: number, end: number, toStart: number): LineChange[] =>
    from.slice(start, end).map((line, index) => wholeLine('same', line, start + index + 1, toStart + index + 1));
  const middle =
    found === null
      ? [
          ...from.slice(head, fromEnd).map((line, index) => wholeLine('removed', line, head + index + 1, null)),
          ...to.slice(head, toEnd).map((line, index) => wholeLine('added', line, null, head + index + 1)),
        ]
      : found.flatMap((stretch) => {
          const [fromStart, fromStop] = [head + stretch.from[0], head + stretch.from[1]];
          const [toStart, toStop] = [head + stretch.to[0], head + stretch.to[1]];
          return stretch.kind === 'same'
            ? same(fromStart, fromStop, toStart)
            : changesOf(from.slice(fromStart, fromStop), to.slice(toStart, toStop), fromStart, toStart);
        });
  return { lines: [...same(0, head, 0), ...middle, ...same(fromEnd, from.length, toEnd)], coarse: found === null };
}
