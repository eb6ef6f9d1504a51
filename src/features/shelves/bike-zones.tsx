import type { ReactElement } from 'react';
import { slugOf } from '../../../shared/lib/slug.ts';

interface Zone {
  readonly zone: string;
  readonly connectors: number;
}

interface Place {
  /** Where it is on the bike. */
  readonly at: readonly [number, number];
  /** Where its balloon stands round the bike. */
  readonly balloon: readonly [number, number];
}

/** The zones that have a place of their own on every bike; front of the bike to the left, on a field of 400 by 304. */
const places: Readonly<Record<string, Place>> = {
  headlight: { at: [98, 98], balloon: [38, 34] },
  bars: { at: [140, 64], balloon: [122, 34] },
  tank: { at: [186, 92], balloon: [196, 34] },
  'under the seat': { at: [262, 106], balloon: [282, 34] },
  'engine right': { at: [178, 160], balloon: [44, 266] },
  'engine left': { at: [206, 194], balloon: [146, 266] },
  'left side cover': { at: [244, 146], balloon: [248, 266] },
  'right side cover': { at: [266, 142], balloon: [352, 266] },
  tail: { at: [348, 118], balloon: [370, 34] },
};

const alongTheBike = Object.keys(places);

/** How far along the bike a zone stands, counted from the front; past all others where the drawing does not know it. */
export function placeAlong(zone: string): number {
  const at = alongTheBike.indexOf(zone.toLowerCase());
  return at < 0 ? alongTheBike.length : at;
}

/** Where each zone's list begins on the sheet. */
export function zoneAnchor(zone: string): string {
  return `zone-${slugOf(zone)}`;
}

/** The bike from the side, with a balloon for each zone that says how many connectors hide there. */
export function BikeZones({ zones }: { readonly zones: readonly Zone[] }): ReactElement {
  const anyBelow = zones.some(({ zone }) => (places[zone.toLowerCase()]?.balloon[1] ?? 0) > 240);
  return (
    <svg
      className="bike-zones"
      viewBox={anyBelow ? '0 0 400 304' : '0 0 400 240'}
      role="group"
      aria-label="The bike from its left side, with its zones"
    >
      <g
        transform="translate(0 14)"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.75"
        strokeLinejoin="round"
        strokeLinecap="round"
        aria-hidden="true"
      >
        <path className="bike-ground" d="M14 220H386" />
        <Wheel x={80} />
        <Wheel x={320} />
        {/* Fork, headlight, bars. */}
        <path d="M80 174L120 70M88 174L128 72M108 100l12 4M126 66l-4-14M112 50c8-4 20-4 34-2" />
        <path d="M106 74a13 13 0 1 0-2 24c6-2 8-18 2-24z" />
        {/* Tank, seat, tail. */}
        <path d="M134 88C146 60 196 56 218 88l-4 10-74 2z" />
        <path d="M216 92c22 4 48-8 84-6 10 1 12 8 6 12-26 4-60 4-90 2" />
        <path d="M304 98c18 0 38 12 50 32M340 100h14v9h-14z" />
        {/* Frame and swinging arm. */}
        <path d="M130 92l26 104h86l20-26-34-68M228 102l68-2M246 182l74-8M282 102l30 66M292 100l28 66" />
        {/* Engine: barrel with its fins, case, outer cover. */}
        <path d="M162 120l30-8 12 40-30 8zM158 126l38-10M160 134l38-10M163 142l38-10M165 150l38-10" />
        <path d="M162 164c4-10 70-18 84 2 6 14-2 28-14 30h-58c-10-4-14-20-12-32z" />
        <circle cx="206" cy="180" r="12" />
        {/* Side cover and exhaust. */}
        <path d="M226 108l50-4-14 40-30 2z" />
        <path d="M170 156c-22 8-16 44 0 48l160-6v10l-150 2" />
      </g>
      {zones.map((zone) => {
        const place = places[zone.zone.toLowerCase()];
        return place === undefined ? null : <Balloon key={zone.zone} zone={zone} place={place} />;
      })}
    </svg>
  );
}

function Wheel({ x }: { readonly x: number }): ReactElement {
  return (
    <>
      <circle cx={x} cy="174" r="46" />
      <circle cx={x} cy="174" r="35" />
      <circle cx={x} cy="174" r="8" />
    </>
  );
}

function Balloon({ zone: { zone, connectors }, place }: { readonly zone: Zone; readonly place: Place }): ReactElement {
  const [x, y] = place.balloon;
  const [toX, toY] = place.at;
  const above = y < toY;
  const distance = Math.hypot(toX - x, toY - y);
  const radius = 14;
  return (
    <a className="bike-zone" href={`#${zoneAnchor(zone)}`} aria-label={`${zone}: ${String(connectors)}`}>
      <path
        className="bike-leader"
        d={`M${round(x + ((toX - x) * radius) / distance)} ${round(y + ((toY - y) * radius) / distance)}L${String(toX)} ${String(toY)}`}
      />
      <circle className="bike-point" cx={toX} cy={toY} r="2.5" />
      <circle className="bike-balloon" cx={x} cy={y} r={radius} />
      <text className="bike-count" x={x} y={y + 5} textAnchor="middle">
        {connectors}
      </text>
      <text className="bike-zone-name" x={x} y={above ? y - 20 : y + 30} textAnchor="middle">
        {zone}
      </text>
    </a>
  );
}

function round(value: number): string {
  return String(Math.round(value * 10) / 10);
}
