import type { TerminalName } from './block.ts';
import { plainCell, namesIn, saysNothing } from './cell-text.ts';

/**
 * Reads a terminal's name: what stands before the first dot is the id, the rest the terminal, which may hold `+`, `-`,
 * `.` and `?`. A text without a dot is an id alone. Words that name nothing stay what they are, as an id that nobody has.
 * Null where nothing is written.
 */
export function readTerminalName(text: string): TerminalName | null {
  const plain = plainCell(text).replace(/\s+/g, ' ');
  if (plain === '') return null;
  const dot = plain.indexOf('.');
  if (dot < 1 || dot === plain.length - 1) return { id: plain, terminal: null };
  return { id: plain.slice(0, dot).trim(), terminal: plain.slice(dot + 1).trim() };
}

/** Reads the terminals of a cell, with commas or semicolons between them; dashes name none. */
export function readTerminalNames(cell: string): readonly TerminalName[] {
  return namesIn(plainCell(cell))
    .filter((name) => !saysNothing(name))
    .map(readTerminalName)
    .filter((name) => name !== null);
}

/** Writes a terminal's name: `headlight.3`, and `frame` where the id alone was written. */
export function formatTerminalName({ id, terminal }: TerminalName): string {
  return terminal === null ? id : `${id}.${terminal}`;
}
