import { readDecimal } from '../lib/decimal.ts';
import type { InsideJoin } from './block.ts';
import type { Condition } from './condition.ts';

const resistor = /^resistor\s+(\S+?)\s*(k)?(?:Ω|ohms?)$/i;
const output = /^output\s+(\S+?)\s*(m)?(?:A|amps?)$/i;

/**
 * Reads what is known to be inside a unit: `joins`, `diode`, `resistor 20 Ω`, `output 10 A`, `input to earth`,
 * `input to live`. Null for anything else.
 */
export function readInsideJoin(text: string): InsideJoin | null {
  const plain = text.trim().replace(/\s+/g, ' ').replaceAll('\u2126', 'Ω');
  const words = plain.toLowerCase();
  if (words === 'joins' || words === 'diode') return { kind: words };
  if (words === 'input to earth' || words === 'input to live') return { kind: words };
  const ohms = figure(resistor.exec(plain), 1000);
  if (ohms !== null) return { kind: 'resistor', ohms };
  const amps = figure(output.exec(plain), 0.001);
  return amps === null ? null : { kind: 'output', amps };
}

function figure(match: RegExpExecArray | null, prefix: number): number | null {
  const value = readDecimal(match?.[1] ?? '');
  if (value === null || value < 0) return null;
  return match?.[2] === undefined ? value : Number((value * prefix).toPrecision(12));
}

/**
 * Reads when something inside a unit joins: `KILL at earth`, `at live`, `at open`. Any other words are kept and mean
 * that it may be either way; null where nothing is written.
 */
export function readCondition(text: string): Condition | null {
  const words = text.trim().replace(/\s+/g, ' ');
  if (words === '') return null;
  const match = /^(\S+) at (earth|live|open)$/i.exec(words);
  const terminal = match?.[1];
  if (terminal === undefined) return { kind: 'words', words };
  const state = match?.[2]?.toLowerCase();
  return { kind: 'terminal', terminal, at: state === 'live' ? 'live' : state === 'open' ? 'open' : 'earth' };
}
