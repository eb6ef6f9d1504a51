import type { ColourName } from '../wire-colours/colour-system.ts';
import { colourOfWords } from '../wire-colours/colour-words.ts';
import { coloursInAnySystem } from '../wire-colours/colours-in-any-system.ts';
import { findConcepts } from './concepts.ts';
import { plainText, singular } from './words.ts';

/** A colour that a line's wire may have to answer a query: a base, a tracer, or both; `any` asks for nothing. */
export interface ColourWanted {
  readonly base: ColourName | 'any';
  readonly tracer: ColourName | 'any' | null;
}

/** A colour in a query: how many tokens it takes, and what it may mean. Empty where it looks like a code and is none. */
export interface ColourFound {
  readonly length: number;
  readonly colours: readonly ColourWanted[];
}

const tracerWords = new Set(['stripe', 'striped', 'stripes', 'tracer', 'trace', 'tracers', 'stripey']);
const glueWords = new Set(['with', 'and', 'a', 'an', 'the', 'on', 'thin', '&', '+', 'wire', 'base', ...tracerWords]);
const mostGlue = 4;

/** German words for colours, as older diagrams are labelled, with `ae`, `oe`, `ue` and `ss` too. */
const germanWords: Readonly<Record<string, ColourName>> = {
  schwarz: 'black',
  weiss: 'white',
  rot: 'red',
  gelb: 'yellow',
  grun: 'green',
  gruen: 'green',
  blau: 'blue',
  braun: 'brown',
  grau: 'grey',
  violett: 'violet',
  lila: 'violet',
  rosa: 'pink',
  hellblau: 'light blue',
  hellgrun: 'light green',
  hellgruen: 'light green',
  dunkelgrun: 'dark green',
  dunkelgruen: 'dark green',
  turkis: 'turquoise',
  tuerkis: 'turquoise',
};

const joinedCode = /^[a-z]{1,4}$/i;
const dividedCode = /^[a-z]{1,3}[/\\_-][a-z]{1,3}$/i;
/** Short English words that are also some system's code; as words they are never meant as colours. */
const neverCodes = new Set([
  'a',
  'or',
  'on',
  'in',
  'at',
  'an',
  'as',
  'is',
  'it',
  'to',
  'no',
  'my',
  'by',
  'be',
  'of',
  'go',
  'do',
  'so',
  'we',
  'me',
  'up',
  'us',
  'uk',
  'eu',
]);

interface Single {
  readonly colours: readonly ColourName[];
  readonly words: boolean;
  readonly length: number;
}

/** The colour that begins at a token, as long as it goes; null where none does. */
export function readColourAt(tokens: readonly string[], at: number): ColourFound | null {
  const first = singleAt(tokens, at);
  if (first === null) return readCode(tokens, at);
  let next = at + first.length;
  let sawTracer = false;
  let sawOn = false;
  const glueStart = next;
  while (next - glueStart < mostGlue && glueWords.has((tokens[next] ?? '').toLowerCase())) {
    const glue = (tokens[next] ?? '').toLowerCase();
    sawTracer ||= tracerWords.has(glue);
    sawOn ||= glue === 'on';
    next += 1;
  }
  const second = singleAt(tokens, next);
  if (second === null || second.words !== first.words) {
    if (sawTracer && first.words)
      return { length: glueStart - at + tracerGlue(tokens, glueStart), colours: tracersOnly(first) };
    return first.words
      ? { length: first.length, colours: first.colours.map((base) => ({ base, tracer: 'any' })) }
      : readCode(tokens, at);
  }
  next += second.length;
  next += tracerGlue(tokens, next);
  const [base, tracer] = sawOn && sawTracer ? [second, first] : [first, second];
  const pairs = base.colours.flatMap((one) =>
    tracer.colours.filter((other) => other !== one).map((other) => ({ base: one, tracer: other })),
  );
  if (pairs.length === 0)
    return { length: first.length, colours: first.colours.map((one) => ({ base: one, tracer: 'any' })) };
  return { length: next - at, colours: pairs };
}

function tracersOnly({ colours }: Single): ColourWanted[] {
  return colours.map((tracer) => ({ base: 'any', tracer }));
}

function tracerGlue(tokens: readonly string[], at: number): number {
  let length = 0;
  while (tracerWords.has((tokens[at + length] ?? '').toLowerCase())) length += 1;
  return length;
}

/** One colour and nothing more: an English or German word, two words (`light green`), or the letters of a code. */
function singleAt(tokens: readonly string[], at: number): Single | null {
  const token = plainText(tokens[at] ?? '');
  if (token === '') return null;
  const following = plainText(tokens[at + 1] ?? '');
  const pair = following === '' || endsName(tokens, at) ? null : colourOfWords(`${token} ${following}`);
  if (pair !== null) return { colours: [pair], words: true, length: 2 };
  const word = colourOfWords(token) ?? germanWords[token] ?? colourOfWords(token.replace('-', ' '));
  if (word !== null) return { colours: [word], words: true, length: 1 };
  if (!/^[a-z]{1,2}$/i.test(token) || neverCodes.has(token)) return null;
  const letters = coloursInAnySystem(tokens[at] ?? '').flatMap(({ base, tracer }) => (tracer === null ? [base] : []));
  return letters.length === 0 ? null : { colours: letters, words: false, length: 1 };
}

/** True where this token ends a name that begins before it: the `light` of `tail light green` belongs to the lamp. */
function endsName(tokens: readonly string[], at: number): boolean {
  if (at === 0 || plainText(tokens[at] ?? '') !== 'light') return false;
  const words = tokens.slice(Math.max(0, at - 2), at + 1).map((token) => singular(plainText(token)));
  return findConcepts(words).some(({ start, length }) => length > 1 && start + length === words.length);
}

/** A code in one token: `Y/R`, `YR`, `y-r`, `gnrt`, `yellow/red`. */
function readCode(tokens: readonly string[], at: number): ColourFound | null {
  const token = tokens[at] ?? '';
  if (token === 'OR' ? false : neverCodes.has(token.toLowerCase())) return null;
  const parts = plainText(token).split(/[/\\_-]/);
  const named = parts.map((part) => colourOfWords(part) ?? germanWords[part] ?? null);
  const [base, tracer] = named;
  if (
    parts.length === 2 &&
    base !== null &&
    base !== undefined &&
    tracer !== null &&
    tracer !== undefined &&
    base !== tracer
  )
    return { length: 1, colours: [{ base, tracer }] };
  if (!joinedCode.test(token) && !dividedCode.test(token)) return null;
  const colours = coloursInAnySystem(token);
  if (colours.length > 0) return { length: 1, colours };
  const isName = findConcepts(parts).some(({ length }) => length === parts.length);
  return /[/\\_]/.test(token) && !isName ? { length: 1, colours: [] } : null;
}
