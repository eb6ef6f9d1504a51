import type { DifferenceView } from '../../shared/contracts/views.ts';

export type LineChange = DifferenceView['lines'][number];
export type WordChange = LineChange['words'][number];

/** Lines of a comparison that are shown together: running text, rows of one table, or a long run of the same, folded. */
export interface Stretch {
  readonly kind: 'text' | 'table' | 'folded';
  readonly index: number;
  readonly lines: readonly LineChange[];
}

/** Unchanged lines that are not worth folding away. */
const longestUnfolded = 3;

/** Parts a comparison into stretches; unchanged lines further than `around` from any change are folded away. */
export function stretchesOf(lines: readonly LineChange[], around: number): Stretch[] {
  const near = nearChanges(lines, around);
  const stretches: { kind: Stretch['kind']; index: number; lines: LineChange[] }[] = [];
  lines.forEach((line, index) => {
    const kind = near[index] === true ? (line.table ? 'table' : 'text') : 'folded';
    const last = stretches.at(-1);
    if (last?.kind === kind) last.lines.push(line);
    else stretches.push({ kind, index, lines: [line] });
  });
  return stretches;
}

function nearChanges(lines: readonly LineChange[], around: number): boolean[] {
  if (around >= lines.length) return lines.map(() => true);
  const near = lines.map(() => false);
  lines.forEach(({ kind }, index) => {
    if (kind === 'same') return;
    for (let at = Math.max(0, index - around); at <= Math.min(lines.length - 1, index + around); at += 1)
      near[at] = true;
  });
  return unfoldShort(near);
}

/** A run so short that its fold would take as much room as its lines stays open. */
function unfoldShort(near: readonly boolean[]): boolean[] {
  const open = [...near];
  let from = 0;
  while (from < open.length) {
    const to = open.indexOf(true, from);
    const end = to < 0 ? open.length : to;
    const whole = from === 0 && end === open.length;
    if (!whole && end - from <= longestUnfolded) open.fill(true, from, end);
    from = end + 1;
  }
  return open;
}

/** The cells of a table's row, each with its words; a row's words carry ` | ` between the cells. */
export function cellsOf(words: readonly WordChange[]): WordChange[][] {
  const cells: WordChange[][] = [[]];
  for (const word of words) {
    word.text.split('|').forEach((text, part) => {
      if (part > 0) cells.push([]);
      if (text !== '') cells.at(-1)?.push({ kind: word.kind, text });
    });
  }
  const trimmed = cells.map(trimCell);
  // A row as it is written begins and ends with a bar of its own.
  if (trimmed.length > 1 && trimmed[0]?.length === 0) trimmed.shift();
  if (trimmed.length > 1 && trimmed.at(-1)?.length === 0) trimmed.pop();
  return trimmed;
}

function trimCell(words: readonly WordChange[]): WordChange[] {
  return words
    .map((word, index) => ({
      kind: word.kind,
      text: trimEnds(word.text, index === 0, index === words.length - 1),
    }))
    .filter(({ text }) => text !== '');
}

function trimEnds(text: string, start: boolean, end: boolean): string {
  const fromStart = start ? text.trimStart() : text;
  return end ? fromStart.trimEnd() : fromStart;
}

/** True for the rule under a table's heading, which says nothing to a reader, nor does its growing by a column. */
export function isTableRule(line: LineChange): boolean {
  return (
    line.table &&
    (line.kind === 'same' || line.kind === 'changed') &&
    /^[\s|:-]+$/.test(line.words.map(({ text }) => text).join(''))
  );
}
