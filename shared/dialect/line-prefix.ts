/** What a line begins with: the signs of quotes, lists and notes, and what is left after them. */
export interface LinePrefix {
  readonly quotes: number;
  /** Those of the quotes that stand inside a list item or note that the same line begins. */
  readonly innerQuotes: number;
  /** The columns at which the text of each list item begun here stands, from the outermost. */
  readonly listColumns: readonly number[];
  /** The first list item's own number; null where it is a bullet, or none begins. */
  readonly firstNumber: number | null;
  readonly notes: number;
  /** The column, from 0, of what follows the signs. */
  readonly column: number;
  readonly rest: string;
}

const tabWidth = 4;

/** Reads the signs that a line begins with, without knowing what is open before it. Linear in the line's length. */
export function readLinePrefix(line: string): LinePrefix {
  const listColumns: number[] = [];
  let quotes = 0;
  let innerQuotes = 0;
  let notes = 0;
  let firstNumber: number | null = null;
  let at = 0;
  let column = 0;
  const ruleFrom = startOfRule(line);
  for (;;) {
    for (; line.charAt(at) === ' ' || line.charAt(at) === '\t'; at += 1) {
      column += line.charAt(at) === '\t' ? tabWidth - (column % tabWidth) : 1;
    }
    const sign = signLength(line, at);
    if (sign === 0 || (at >= ruleFrom && line.charAt(at) !== '>')) break;
    if (line.charAt(at) === '>') {
      quotes += 1;
      if (listColumns.length > 0 || notes > 0) innerQuotes += 1;
    } else if (line.charAt(at) === '[') notes += 1;
    else {
      if (listColumns.length === 0 && sign > 1) firstNumber = Number(line.slice(at, at + sign - 1));
      listColumns.push(column + sign + 1);
    }
    at += sign;
    column += sign;
  }
  return { quotes, innerQuotes, listColumns, firstNumber, notes, column, rest: line.slice(at) };
}

/** How long the sign of a quote, list item or note is that stands at a place; 0 where none does. */
function signLength(line: string, at: number): number {
  const character = line.charAt(at);
  if (character === '>') return 1;
  if (character === '-' || character === '+' || character === '*') return isSpaceOrEnd(line, at + 1) ? 1 : 0;
  if (character === '[' && line.charAt(at + 1) === '^') {
    const close = line.indexOf(']:', at);
    return close < 0 ? 0 : close + 2 - at;
  }
  let digits = 0;
  while (digits < 10 && isDigit(line.charAt(at + digits))) digits += 1;
  if (digits === 0 || digits > 9) return 0;
  const after = line.charAt(at + digits);
  return (after === '.' || after === ')') && isSpaceOrEnd(line, at + digits + 1) ? digits + 1 : 0;
}

function isDigit(character: string): boolean {
  return character >= '0' && character <= '9';
}

function isSpaceOrEnd(line: string, at: number): boolean {
  const character = line.charAt(at);
  return character === '' || character === ' ' || character === '\t';
}

/** Where a rule such as `- - -` begins that ends the line: it looks like lists and is none. Infinite where there is none. */
function startOfRule(line: string): number {
  let sign = '';
  let signs = 0;
  let at = line.length;
  for (; at > 0; at -= 1) {
    const character = line.charAt(at - 1);
    if (character === ' ' || character === '\t') continue;
    if (sign === '' && (character === '-' || character === '*')) sign = character;
    if (character !== sign) break;
    signs += 1;
  }
  return signs >= 3 ? at : Infinity;
}
