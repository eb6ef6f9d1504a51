import type { IndexedHolder, LinesIndex } from './lines-index.ts';

/** A terminal that a query writes as an address: `headlight.3`. */
export interface Addressed {
  /** The bit of its term. */
  readonly bit: number;
  readonly id: string;
  /** In lower case. */
  readonly terminal: string;
  /** True where some line of the book names it. */
  readonly isTerminal: boolean;
  /** The subjects that have a block of this id. */
  readonly subjects: ReadonlySet<number>;
}

/** Looks once for what an address in a query can mean in an index. */
export function addressedTerm(
  { endIds, endTerminals, holders, pages }: LinesIndex,
  id: string,
  terminal: string,
  bit: number,
): Addressed {
  const isTerminal = endIds.places.some(
    (place, end) =>
      endIds.values[place] === id &&
      (endTerminals.values[endTerminals.places[end] ?? 0] ?? '').toLowerCase() === terminal,
  );
  const subjects = new Set(holders.filter((holder) => holder.id === id).map(({ page }) => pages[page]?.subject ?? 0));
  return { bit, id, terminal, isTerminal, subjects };
}

/** The bits of the addresses that a line leads to, or that are terminals of the component or switch that it is about. */
export function leadsTo(
  { endStart, endIds, endTerminals, names }: LinesIndex,
  addressed: readonly Addressed[],
  line: number,
  holder: IndexedHolder,
  ownPlace: number,
): number {
  let bits = 0;
  for (const { bit, id, terminal, isTerminal } of addressed) {
    for (let end = endStart[line] ?? 0; end < (endStart[line + 1] ?? 0); end += 1) {
      const endTerminal = endTerminals.values[endTerminals.places[end] ?? 0] ?? '';
      if (endIds.values[endIds.places[end] ?? 0] === id && endTerminal.toLowerCase() === terminal) bits |= bit;
    }
    const isUnit = holder.kind === 'components' ? names[ownPlace] === id : holder.kind === 'switch' && holder.id === id;
    if (isUnit && isTerminal) bits |= bit;
  }
  return bits;
}
