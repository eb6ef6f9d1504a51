import { readDecimal } from '../lib/decimal.ts';
import { slugOf } from '../lib/slug.ts';
import type { Rating } from './rating.ts';

const number = String.raw`\d+(?:[.,]\d+)?`;
const unit = String.raw`mAh|Ah|kΩ|mΩ|Ω|[km]?ohms?|mA|A|amps?|V|volts?|kW|mW|W|watts?`;
const quantityPattern = new RegExp(`(?:(\\d+)\\s*[x×]\\s*)?(${number})\\s*(${unit})(?![\\p{L}\\p{N}])`, 'giu');
const pairPattern = new RegExp(
  `(?:([\\p{L}][\\p{L}\\p{N} -]*)/([\\p{L}][\\p{L}\\p{N} -]*?)\\s+)?(${number})\\s*W?\\s*/\\s*(${number})\\s*W(?![\\p{L}\\p{N}])`,
  'iu',
);
const feedPattern = new RegExp(
  `(?:^|[,;]\\s*|\\s)([\\p{L}][\\p{L}\\p{N} -]*?)\\s+(${number})\\s*(W|watts?|A|amps?)(?![\\p{L}\\p{N}])`,
  'giu',
);

/** Words before a figure that do not name a feed. */
const notFeeds = new Set([
  'blow',
  'blows',
  'blowing',
  'continuous',
  'max',
  'min',
  'fuse',
  'rated',
  'about',
  'approx',
  'bulb',
  'bulbs',
  'v',
  'a',
  'w',
  'ah',
  'x',
]);

/** A rating is a few figures; a longer text is a note in the wrong column. */
const longestWritten = 200;
const volts = new RegExp(`${number}\\s*V(?![\\p{L}\\p{N}])`, 'giu');
const nothingRead = { volts: null, amps: null, watts: null, ohms: null, ampHours: null } as const;

type Feed = Rating['feeds'][number];

/**
 * Reads a component's rating: `35 A blow`, `12 V 8 Ah LiFePO4`, `12 V 4 Ω`, `2 x 21 W`, with decimal comma or point.
 * Feeds are named (`dip 55 W, main 60 W`, `main/dip 60/55 W`); two that are not (`35/35 W`) are called `1` and `2`.
 * What a rating does not say is null; an empty text has none. Where a fuse has a blowing and a continuous current, the
 * continuous one counts.
 */
export function readRating(text: string): Rating | null {
  const written = text.trim().replace(/\s+/g, ' ').replaceAll('\u2126', 'Ω');
  if (written === '') return null;
  if (written.length > longestWritten) return { written, ...nothingRead, blow: false, feeds: [] };
  const figures = readFigures(written);
  const feeds = readFeeds(written.replace(volts, ''));
  const continuous = new RegExp(`continuous\\s+(${number})\\s*A|(${number})\\s*A\\s+continuous`, 'i').exec(written);
  const continuousAmps = continuous === null ? null : readDecimal(continuous[1] ?? continuous[2] ?? '');
  return {
    written,
    volts: figures.volts,
    amps: feeds.length > 0 ? null : (continuousAmps ?? figures.amps),
    blow: continuousAmps === null && /\bblow(?:s|ing|n)?\b/i.test(written),
    watts: feeds.length > 0 ? null : figures.watts,
    ohms: figures.ohms,
    ampHours: figures.ampHours,
    feeds,
  };
}

interface Figures {
  volts: number | null;
  amps: number | null;
  watts: number | null;
  ohms: number | null;
  ampHours: number | null;
}

function readFigures(text: string): Figures {
  const figures: Figures = { ...nothingRead };
  for (const [, times, written, unitWritten] of text.matchAll(quantityPattern)) {
    const { what, factor } = readUnit(unitWritten ?? '');
    const value = readDecimal(written ?? '');
    if (value === null) continue;
    figures[what] ??= round(value * factor * Number(times ?? 1));
  }
  return figures;
}

function readUnit(text: string): { readonly what: keyof Figures; readonly factor: number } {
  const factor = /^k/.test(text) ? 1000 : /^m(?!illi)/.test(text) ? 0.001 : 1;
  if (/Ah$/i.test(text)) return { what: 'ampHours', factor };
  if (/Ω$|ohms?$/i.test(text)) return { what: 'ohms', factor };
  if (/(?:W|watts?)$/i.test(text)) return { what: 'watts', factor };
  if (/(?:V|volts?)$/i.test(text)) return { what: 'volts', factor };
  return { what: 'amps', factor };
}

function readFeeds(text: string): readonly Feed[] {
  const pair = pairPattern.exec(text);
  if (pair !== null) {
    const [, firstName, secondName, first, second] = pair;
    return [
      feed(firstName ?? '1', readDecimal(first ?? ''), null),
      feed(secondName ?? '2', readDecimal(second ?? ''), null),
    ];
  }
  const feeds: Feed[] = [];
  for (const [, name, figure, unitWritten] of text.matchAll(feedPattern)) {
    if (name === undefined || notFeeds.has(name.toLowerCase())) continue;
    const value = readDecimal(figure ?? '');
    const isPower = /^w/i.test(unitWritten ?? '');
    feeds.push(feed(name, isPower ? value : null, isPower ? null : value));
  }
  return feeds.length > 1 ? feeds : [];
}

function feed(written: string, watts: number | null, amps: number | null): Feed {
  const trimmed = written.trim();
  // A feed's name is a terminal's name, which holds no white space.
  return { name: /\s/.test(trimmed) ? slugOf(trimmed) : trimmed, watts, amps };
}

function round(value: number): number {
  return Number(value.toPrecision(12));
}
