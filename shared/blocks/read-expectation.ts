import { readDecimal } from '../lib/decimal.ts';
import type { Expectation } from './expectation.ts';

const longestWritten = 80;
const number = String.raw`[-−]?(?:\d+(?:[.,]\d+)?|[.,]\d+)`;
/** Units that a workshop measures in; anything else after a figure is not an expectation. */
const unit = String.raw`(?:[kMm]?(?:Ω|ohms?|Ohms?)|[mk]?V|v|[mµμ]?A|a|[mk]?W|m?Ah|[kM]?Hz|rpm|r/min|min⁻¹|1/min|°C|°F|K|°|deg(?:rees)?|%|[munpµμ]?F|[mµμ]?H|[mµμ]?s|µm|mm|cm|m|in|bar|k?Pa|psi|N·?m|kg|g|ml|[lL]|lx|cd)(?:\s*(?:AC|DC|peak|rms))?`;

const range = new RegExp(`^(${number})\\s*(${unit})?\\s*(?:-|–|—|~|…|\\.{2,3}|to)\\s*(${number})\\s*(${unit})$`);
const tolerance = new RegExp(
  `^(${number})\\s*(${unit})?\\s*(?:±|\\+\\s*/\\s*[-−–])\\s*(${number})\\s*(%)?\\s*(${unit})?$`,
);
const limit = new RegExp(`^(<|≤|<=|=<|>|≥|>=|=>|max\\.?|maximum|min\\.?|minimum)\\s*(${number})\\s*(${unit})$`, 'i');
const limitAfter = new RegExp(`^(${number})\\s*(${unit})\\s*(max\\.?|maximum|min\\.?|minimum)$`, 'i');

/**
 * Reads what a check should give: `a–b` (also with `-`, `~` or `to`), `a ± b`, `a ± b %`, `<`, `≤`, `>`, `≥`, `max`,
 * `min`, each with a unit; `continuity`; `open`. Null for anything else ("about 5 Ω" is no expectation), for a figure
 * without a unit, for a range that runs backwards, and for `1,000 Ω`, which may be one or a thousand.
 */
export function readExpectation(text: string): Expectation | null {
  const plain = text.trim().replace(/\s+/g, ' ').replaceAll('\u2126', 'Ω');
  if (plain.length > longestWritten) return null;
  if (/^continuity$/i.test(plain)) return { kind: 'continuity' };
  if (/^open(?: circuit)?$/i.test(plain)) return { kind: 'open' };
  return readRange(plain) ?? readTolerance(plain) ?? readLimit(plain);
}

function readRange(text: string): Expectation | null {
  const match = range.exec(text);
  const lowest = readDecimal(match?.[1] ?? '');
  const highest = readDecimal(match?.[3] ?? '');
  const written = match?.[4];
  if (lowest === null || highest === null || written === undefined || lowest > highest) return null;
  if (match?.[2] !== undefined && match[2] !== written) return null;
  return { kind: 'range', lowest, highest, lowestIncluded: true, highestIncluded: true, unit: written };
}

function readTolerance(text: string): Expectation | null {
  const match = tolerance.exec(text);
  const middle = readDecimal(match?.[1] ?? '');
  const give = readDecimal(match?.[3] ?? '');
  const before = match?.[2];
  const after = match?.[5];
  const written = before ?? after;
  // `50 % ± 5 %` may mean points or parts of fifty.
  if (middle === null || give === null || give < 0 || written === undefined || written === '%') return null;
  if (before !== undefined && after !== undefined && before !== after) return null;
  const spread = match?.[4] === undefined ? give : (Math.abs(middle) * give) / 100;
  return {
    kind: 'range',
    lowest: round(middle - spread),
    highest: round(middle + spread),
    lowestIncluded: true,
    highestIncluded: true,
    unit: written,
  };
}

function readLimit(text: string): Expectation | null {
  const before = limit.exec(text);
  const after = before === null ? limitAfter.exec(text) : null;
  const sign = (before?.[1] ?? after?.[3] ?? '').toLowerCase();
  const figure = readDecimal(before?.[2] ?? after?.[1] ?? '');
  const written = before?.[3] ?? after?.[2];
  if (figure === null || written === undefined) return null;
  const isUpper = /^(?:<|≤|=<|max)/.test(sign);
  const included = sign !== '<' && sign !== '>';
  return isUpper
    ? { kind: 'range', lowest: null, highest: figure, lowestIncluded: true, highestIncluded: included, unit: written }
    : { kind: 'range', lowest: figure, highest: null, lowestIncluded: included, highestIncluded: true, unit: written };
}

/** Binary fractions leave `4.2299999999999995` behind; no meter shows twelve figures. */
function round(value: number): number {
  return Number(value.toPrecision(12));
}
