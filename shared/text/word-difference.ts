import { diffArrays } from 'diff';

/** A stretch of a line: the same in both texts, or only in one. */
export interface WordChange {
  readonly kind: 'same' | 'removed' | 'added';
  readonly text: string;
}

/** Edits after which two lines are shown as one removed and one added: a measure of cost, not of likeness. */
const mostEdits = 200;

/**
 * Divides a line into words, the spaces between them and the punctuation after them. A wire's code, a rating or an
 * address (`Y/R`, `13.8–14.6`, `headlight.2~1980-`) stays one word, so that a change shows the whole of it.
 */
export function wordsOf(line: string): string[] {
  return line
    .split(/(\s+)/)
    .flatMap((piece) => {
      let end = piece.length;
      while (end > 1 && '.,;:!?)'.includes(piece.charAt(end - 1))) end -= 1;
      return end === piece.length ? [piece] : [piece.slice(0, end), piece.slice(end)];
    })
    .filter((piece) => piece !== '');
}

/** Joins neighbours of one kind, and drops what is empty. */
export function joinWordChanges(changes: readonly WordChange[]): WordChange[] {
  const joined: WordChange[] = [];
  for (const change of changes) {
    const last = joined.at(-1);
    if (change.text === '') continue;
    if (last?.kind === change.kind) joined[joined.length - 1] = { kind: change.kind, text: last.text + change.text };
    else joined.push(change);
  }
  return joined;
}

/** What changed between two lines, word by word; the whole of both where they are too far apart to say. */
export function wordDifference(from: string, to: string): WordChange[] {
  const parts = diffArrays(wordsOf(from), wordsOf(to), { maxEditLength: mostEdits });
  if (parts === undefined)
    return joinWordChanges([
      { kind: 'removed', text: from },
      { kind: 'added', text: to },
    ]);
  return joinWordChanges(
    parts.map((part) => ({
      kind: part.added ? 'added' : part.removed ? 'removed' : 'same',
      text: part.value.join(''),
    })),
  );
}

/** What changed between two rows of a table: cell by cell where they have as many cells. */
export function rowDifference(from: readonly string[], to: readonly string[]): WordChange[] {
  if (from.length !== to.length) return wordDifference(from.join(' | '), to.join(' | '));
  return joinWordChanges(
    from.flatMap((cell, index) => {
      const between: WordChange[] = index === 0 ? [] : [{ kind: 'same', text: ' | ' }];
      return [...between, ...wordDifference(cell, to[index] ?? '')];
    }),
  );
}
