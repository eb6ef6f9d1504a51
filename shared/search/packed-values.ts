import { hazardKinds, signalWords, type Corner, type FaceSide, type LatchSide } from '../blocks/block.ts';
import { appliesToAll, type Applicability } from '../pages/applicability.ts';
import { colourNames } from '../wire-colours/colour-system.ts';
import type { IndexedColour, SearchFace, SearchHazard } from './search-document.ts';

/*
 * Values of several fields as one short text each, for the columns of the lines file: a column of texts holds each of
 * them once, and reads it once.
 */

/** `3+4|wire side|top left|top|sockets`: what a face is drawn from, as one text; empty for none. */
export function formatFace(face: SearchFace | null): string {
  return face === null
    ? ''
    : [face.layout, face.seen, face.first ?? '', face.latch ?? '', face.contacts ?? ''].join('|');
}

/** `Y/R` and the places of what it may mean: `Y/R 3.2`; a dot and nothing after it is a wire without a tracer. */
export function formatColour(colour: IndexedColour | null): string {
  if (colour === null) return '';
  const readings = colour.readings.map(
    ({ base, tracer }) => `${colourNames.indexOf(base)}.${tracer === null ? '' : colourNames.indexOf(tracer)}`,
  );
  return `${colour.code.replace(/\s+/g, '_')} ${readings.join(',')}`;
}

/** Years, markets and frames as JSON; empty where it holds for all. */
export function formatApplicability({ years, markets, frames }: Applicability): string {
  if (years.length + markets.length + frames.length === 0) return '';
  return JSON.stringify([years.map(({ from, to }) => [from, to]), markets, frames]);
}

/** `warning battery`: a caution without its words. */
export function formatHazard({ signal, kind }: Pick<SearchHazard, 'signal' | 'kind'>): string {
  return `${signal} ${kind}`;
}

/** Reads what `formatHazard` wrote. */
export function parseHazard(packed: string): Pick<SearchHazard, 'signal' | 'kind'> {
  const [signal, kind] = packed.split(' ');
  return {
    signal: signalWords.find((word) => word === signal) ?? 'warning',
    kind: hazardKinds.find((one) => one === kind) ?? 'battery',
  };
}

/** Reads what `formatColour` wrote. */
export function parseColour(packed: string): IndexedColour | null {
  const [code, readings] = packed.split(' ');
  if (code === undefined || code === '' || readings === undefined) return null;
  return {
    code: code.replace(/_/g, ' '),
    readings: readings.split(',').flatMap((reading) => {
      const [base, tracer] = reading.split('.');
      const baseName = colourNames[Number(base)];
      if (baseName === undefined || base === '') return [];
      return [
        {
          base: baseName,
          tracer: tracer === undefined || tracer === '' ? null : (colourNames[Number(tracer)] ?? null),
        },
      ];
    }),
  };
}

/** Reads what `formatFace` wrote. */
export function parseFace(packed: string): SearchFace | null {
  if (packed === '') return null;
  const [layout = '', seen = '', first = '', latch = '', contacts = ''] = packed.split('|');
  return {
    layout,
    seen: oneOf<FaceSide>(['wire side', 'mating side'], seen) ?? 'wire side',
    first: oneOf<Corner>(['top left', 'top right', 'bottom left', 'bottom right'], first),
    latch: oneOf<LatchSide>(['top', 'bottom', 'left', 'right'], latch),
    contacts: oneOf<'pins' | 'sockets'>(['pins', 'sockets'], contacts),
  };
}

function oneOf<Value extends string>(values: readonly Value[], text: string): Value | null {
  return values.find((value) => value === text) ?? null;
}

/** Reads what `formatApplicability` wrote. */
export function parseApplicability(packed: string): Applicability {
  if (packed === '') return appliesToAll;
  const parsed: unknown = JSON.parse(packed);
  if (!Array.isArray(parsed)) return appliesToAll;
  const [years, markets, frames] = parsed as readonly unknown[];
  return { years: listOf(years, spanOf), markets: listOf(markets, nameOf), frames: listOf(frames, nameOf) };
}

function listOf<Value>(value: unknown, read: (one: unknown) => Value | null): readonly Value[] {
  return Array.isArray(value) ? value.map(read).filter((one): one is Value & NonNullable<Value> => one !== null) : [];
}

function spanOf(value: unknown): { from: number | null; to: number | null } | null {
  if (!Array.isArray(value)) return null;
  const [from, to] = value as readonly unknown[];
  return { from: typeof from === 'number' ? from : null, to: typeof to === 'number' ? to : null };
}

function nameOf(value: unknown): string | null {
  return typeof value === 'string' ? value : null;
}
