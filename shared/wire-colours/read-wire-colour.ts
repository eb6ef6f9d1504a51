import { caseCounts, codesOf } from './colour-codes.ts';
import type { ColourName, ColourReading, ColourSystem, WireColour } from './colour-system.ts';
import { colourOfWords } from './colour-words.ts';

/** A code that a system's writers use, with the colour that it means. */
interface Spelling {
  readonly code: string;
  readonly colour: ColourName;
}

const longestWritten = 80;
const capitalThenSmall = /\p{Lu}\p{Ll}/u;
const fillerWords = new Set([
  'with',
  'and',
  'a',
  'an',
  'the',
  'stripe',
  'striped',
  'stripes',
  'tracer',
  'trace',
  'line',
  'wire',
  'base',
]);

/**
 * Reads a wire's colour as written in a cell: codes of the system apart (`Y/R`, `Y-R`, `Y\R`, `Y R`) or joined (`YR`,
 * `BLGN`), or English words (`yellow`, `yellow/red`, `yellow with a red stripe`, `red stripe on yellow`). Base comes
 * first; IEC 60757 gives joined codes no base and tracer, and reading the first as base is wiring practice.
 * Letters that spell one colour and also two are ambiguous, the single colour first.
 */
export function readWireColour(written: string, system: ColourSystem): ColourReading {
  const text = written.trim();
  if (text === '' || text.length > longestWritten) return { kind: 'unknown' };
  const spellings = spellingsOf(system);
  const joined = readJoined(text, spellings, caseCounts(system));
  if (joined.length > 0) return readingOf(joined);
  const apart = readApart(text, spellings);
  return apart === null ? { kind: 'unknown' } : { kind: 'read', colour: apart };
}

function readingOf(colours: readonly WireColour[]): ColourReading {
  const [colour, ...others] = colours;
  if (colour === undefined) return { kind: 'unknown' };
  return others.length === 0 ? { kind: 'read', colour } : { kind: 'ambiguous', colour, others };
}

function spellingsOf(system: ColourSystem): readonly Spelling[] {
  return codesOf(system).flatMap(({ code, colour, otherSpellings }) =>
    [code, ...otherSpellings].map((spelling) => ({ code: spelling, colour })),
  );
}

/** Every wire that letters without anything between them can mean. */
function readJoined(text: string, spellings: readonly Spelling[], exactCase: boolean): readonly WireColour[] {
  const mayIgnoreCase = !exactCase || !capitalThenSmall.test(text);
  // A capital and a small letter after it are one code: `Br` is brown and nothing else, and `Lb` is not blue with black.
  return wiresSpelled(text, spellings, mayIgnoreCase ? sameButForCase : (a, b) => a === b);
}

function sameButForCase(a: string, b: string): boolean {
  return a.toLowerCase() === b.toLowerCase();
}

function wiresSpelled(
  text: string,
  spellings: readonly Spelling[],
  same: (a: string, b: string) => boolean,
): readonly WireColour[] {
  const found: WireColour[] = [];
  for (const { code, colour } of spellings) {
    if (same(code, text)) add(found, { base: colour, tracer: null });
  }
  for (const { code, colour: base } of spellings) {
    if (!same(code, text.slice(0, code.length))) continue;
    for (const { code: second, colour: tracer } of spellings) {
      if (base !== tracer && same(second, text.slice(code.length))) add(found, { base, tracer });
    }
  }
  return found;
}

function add(found: WireColour[], wire: WireColour): void {
  if (!found.some(({ base, tracer }) => base === wire.base && tracer === wire.tracer)) found.push(wire);
}

/** Codes or words with something between them; null where they are not one colour or two. */
function readApart(text: string, spellings: readonly Spelling[]): WireColour | null {
  const tokens = text.split(/[\s/\\,+_–—-]+/).filter((token) => token !== '');
  const tracerFirst = tokens.findIndex((token) => token.toLowerCase() === 'on');
  if (tracerFirst > 0) {
    const tracer = readColours(tokens.slice(0, tracerFirst), spellings);
    const base = readColours(tokens.slice(tracerFirst + 1), spellings);
    return tracer?.length === 1 && base?.length === 1 ? wireOf([...base, ...tracer]) : null;
  }
  const colours = readColours(tokens, spellings);
  return colours === null ? null : wireOf(colours);
}

function wireOf(colours: readonly ColourName[]): WireColour | null {
  const [base, tracer, third] = colours;
  if (base === undefined || third !== undefined || base === tracer) return null;
  return { base, tracer: tracer ?? null };
}

function readColours(tokens: readonly string[], spellings: readonly Spelling[]): readonly ColourName[] | null {
  const colours: ColourName[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const token = tokens[at] ?? '';
    const next = tokens[at + 1];
    const ofTwoWords = next === undefined ? null : colourOfWords(`${token} ${next}`);
    const colour = ofTwoWords ?? readSingle(token, spellings);
    if (colour !== null) colours.push(colour);
    else if (!fillerWords.has(token.toLowerCase())) return null;
    if (ofTwoWords !== null) at += 1;
  }
  return colours;
}

function readSingle(token: string, spellings: readonly Spelling[]): ColourName | null {
  const exact = spellings.find(({ code }) => code === token);
  if (exact !== undefined) return exact.colour;
  const likely = new Set(spellings.filter(({ code }) => sameButForCase(code, token)).map(({ colour }) => colour));
  const [only] = likely;
  return likely.size === 1 && only !== undefined ? only : colourOfWords(token);
}
