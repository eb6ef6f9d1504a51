import { caseCounts, codesOf } from './colour-codes.ts';
import type { ColourName, ColourReading, ColourSystem, WireColour } from './colour-system.ts';
import { colourOfWords } from './colour-words.ts';

/** What the codes of a system mean: by their exact letters, and whatever their case. */
interface Codes {
  readonly exact: ReadonlyMap<string, readonly ColourName[]>;
  readonly folded: ReadonlyMap<string, readonly ColourName[]>;
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
  const codes = system.name === 'own' ? codesIn(system) : publishedCodes[system.name];
  const joined = readJoined(text, codes, caseCounts(system));
  if (joined.length > 0) return readingOf(joined);
  const apart = readApart(text, codes);
  return apart === null ? { kind: 'unknown' } : { kind: 'read', colour: apart };
}

function readingOf(colours: readonly WireColour[]): ColourReading {
  const [colour, ...others] = colours;
  if (colour === undefined) return { kind: 'unknown' };
  return others.length === 0 ? { kind: 'read', colour } : { kind: 'ambiguous', colour, others };
}

function codesIn(system: ColourSystem): Codes {
  const exact = new Map<string, ColourName[]>();
  const folded = new Map<string, ColourName[]>();
  for (const { code, colour, otherSpellings } of codesOf(system)) {
    for (const spelling of [code, ...otherSpellings]) {
      note(exact, spelling, colour);
      note(folded, spelling.toLowerCase(), colour);
    }
  }
  return { exact, folded };
}

function note(codes: Map<string, ColourName[]>, spelling: string, colour: ColourName): void {
  const colours = codes.get(spelling) ?? [];
  if (!colours.includes(colour)) codes.set(spelling, [...colours, colour]);
}

/** The published tables, put in order once: a page asks for them a thousand times. */
const publishedCodes = {
  jis: codesIn({ name: 'jis' }),
  din: codesIn({ name: 'din' }),
  'bs-au7': codesIn({ name: 'bs-au7' }),
  iec: codesIn({ name: 'iec' }),
} as const;

/** Every wire that letters without anything between them can mean, one colour before two. */
function readJoined(text: string, codes: Codes, exactCase: boolean): readonly WireColour[] {
  // A capital and a small letter after it are one code: `Br` is brown and nothing else, and `Lb` is not blue with black.
  const mayIgnoreCase = !exactCase || !capitalThenSmall.test(text);
  const letters = mayIgnoreCase ? text.toLowerCase() : text;
  const meanings = mayIgnoreCase ? codes.folded : codes.exact;
  const found: WireColour[] = [];
  for (const base of meanings.get(letters) ?? []) add(found, { base, tracer: null });
  for (let at = 1; at < letters.length; at += 1) {
    const bases = meanings.get(letters.slice(0, at));
    if (bases === undefined) continue;
    const tracers = meanings.get(letters.slice(at)) ?? [];
    for (const base of bases) for (const tracer of tracers) if (base !== tracer) add(found, { base, tracer });
  }
  return found;
}

function add(found: WireColour[], wire: WireColour): void {
  if (!found.some(({ base, tracer }) => base === wire.base && tracer === wire.tracer)) found.push(wire);
}

/** Codes or words with something between them; null where they are not one colour or two. */
function readApart(text: string, codes: Codes): WireColour | null {
  const tokens = text.split(/[\s/\\,+_–—-]+/).filter((token) => token !== '');
  const tracerFirst = tokens.findIndex((token) => token.toLowerCase() === 'on');
  if (tracerFirst > 0) {
    const tracer = readColours(tokens.slice(0, tracerFirst), codes);
    const base = readColours(tokens.slice(tracerFirst + 1), codes);
    return tracer?.length === 1 && base?.length === 1 ? wireOf([...base, ...tracer]) : null;
  }
  const colours = readColours(tokens, codes);
  return colours === null ? null : wireOf(colours);
}

function wireOf(colours: readonly ColourName[]): WireColour | null {
  const [base, tracer, third] = colours;
  if (base === undefined || third !== undefined || base === tracer) return null;
  return { base, tracer: tracer ?? null };
}

function readColours(tokens: readonly string[], codes: Codes): readonly ColourName[] | null {
  const colours: ColourName[] = [];
  for (let at = 0; at < tokens.length; at += 1) {
    const token = tokens[at] ?? '';
    const next = tokens[at + 1];
    const ofTwoWords = next === undefined ? null : colourOfWords(`${token} ${next}`);
    const colour = ofTwoWords ?? readSingle(token, codes);
    if (colour !== null) colours.push(colour);
    else if (!fillerWords.has(token.toLowerCase())) return null;
    if (ofTwoWords !== null) at += 1;
  }
  return colours;
}

function readSingle(token: string, codes: Codes): ColourName | null {
  const [exact] = codes.exact.get(token) ?? [];
  if (exact !== undefined) return exact;
  const [likely, other] = codes.folded.get(token.toLowerCase()) ?? [];
  return likely !== undefined && other === undefined ? likely : colourOfWords(token);
}
