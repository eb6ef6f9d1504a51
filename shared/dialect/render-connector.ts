import type { ConnectorBlock } from '../blocks/block.ts';
import { readTerminalName } from '../blocks/terminal-name.ts';
import { drawFace } from '../drawing/draw-face.ts';
import { drawingMarkup } from '../drawing/drawing.ts';
import { faceOf, type Face } from '../drawing/face.ts';
import { turned } from '../drawing/face-plan.ts';
import { appliesTo } from '../pages/variant.ts';
import { escapeHtml, fragment, openTag } from './html-text.ts';
import { heading } from './render-heading.ts';
import type { RenderContext } from './render-context.ts';
import { renderTable } from './render-table.ts';

/** A connector: its name and facts, its face from both sides, and its table beside it. */
export function renderConnector(block: ConnectorBlock, level: number, context: RenderContext): string {
  const id = context.takeId(block.id);
  const face = faceOf(block, context.variant);
  const seats = new Map(face.seats.flatMap(({ cavity, number }) => (cavity === null ? [] : [[cavity, number] as const])));
  const name = block.name ?? block.id;
  return [
    openTag('section', { class: 'block connector', id, 'data-connector': block.id, 'aria-label': name }),
    heading(level, name, block.name === null ? null : block.id),
    renderFacts(block, context),
    `<div class="face-and-lines${isWide(face) ? ' wide' : ''}">`,
    renderFace(block, face, name, id === null ? null : `turn-${id}`, context),
    `<div class="table-plate">${renderTable(block, context, seats)}</div></div></section>`,
  ].join('');
}

/** Past seven cavities in a row a face leaves no room for the table beside it. */
function isWide({ layout }: Face): boolean {
  return layout.kind === 'rows' && layout.rows.some((row) => row.length > 7);
}

function renderFace(block: ConnectorBlock, face: Face, title: string, turnId: string | null, context: RenderContext): string {
  const lines = firstLines(block, context);
  const links = (cavity: string): string | null => {
    const address = lines.get(cavity);
    return address === undefined ? null : fragment(address);
  };
  const seen = drawFace(face, { side: face.seen, links, title, className: 'face-side face-seen' });
  const other = drawFace(face, { side: turned(face.seen), links, title, className: 'face-side face-turned' });
  const turn =
    turnId === null
      ? ''
      : `${openTag('input', { type: 'checkbox', class: 'face-turn', id: turnId })}${openTag('label', { for: turnId, class: 'face-turn-label' })}${turnSign}Turn over</label>`;
  return `<figure class="face">${turn}<div class="face-plate">${drawingMarkup(seen)}${turnId === null ? '' : drawingMarkup(other)}</div>${renderLegend(face)}</figure>`;
}

/** The sign for turning over, in one stroke: an arrow that goes round an axis. */
const turnSign =
  '<svg class="sign" viewBox="0 0 20 20" width="20" height="20" aria-hidden="true" focusable="false"><path d="M10 2v16M6 5C3 6.5 3 13.5 6 15M6 5l-3 .5M6 5l.8 3M14 15c3-1.5 3-8.5 0-10M14 15l3-.5M14 15l-.8-3" fill="none" stroke="currentColor" stroke-width="1.5"/></svg>';

/** What a sign on this very face means; nothing where it has none that needs words. */
function renderLegend({ seats }: Face): string {
  const says = [
    seats.some(({ either }) => either) ? 'A dashed line parts wires of different years or markets.' : '',
    seats.some(({ more }) => more) ? 'A + beside a number: more wires are in that cavity.' : '',
    seats.some(({ wires }) => wires.some(({ colours }) => colours.length > 1)) ? 'Letters with a ? read as two colours.' : '',
  ].filter((sentence) => sentence !== '');
  return says.length === 0 ? '' : `<figcaption>${says.join(' ')}</figcaption>`;
}

function firstLines(block: ConnectorBlock, { variant }: RenderContext): ReadonlyMap<string, string> {
  const addresses = new Map<string, string>();
  const here = block.lines.filter(({ applies }) => appliesTo(applies, variant).applies);
  for (const { cavity, address } of [...here, ...block.lines]) if (!addresses.has(cavity)) addresses.set(cavity, address);
  return addresses;
}

function renderFacts(block: ConnectorBlock, context: RenderContext): string {
  const { zone, contacts, housing, terminals, mates } = block;
  const facts: (readonly [string, string])[] = [];
  if (zone !== null) facts.push(['Where', escapeHtml(zone)]);
  if (contacts !== null) facts.push(['Contacts', contacts]);
  if (housing !== null) facts.push(['Housing', escapeHtml(housing)]);
  if (terminals !== null) facts.push(['Terminals', escapeHtml(terminals)]);
  if (mates !== null) facts.push(['Mates with', renderMate(mates, context)]);
  for (const [name, value] of Object.entries(block.otherAttributes)) facts.push([escapeHtml(name), escapeHtml(value)]);
  if (facts.length === 0) return '';
  return `<dl class="block-facts">${facts.map(([name, value]) => `<div><dt>${name}</dt><dd>${value}</dd></div>`).join('')}</dl>`;
}

function renderMate(mates: string, context: RenderContext): string {
  const name = readTerminalName(mates);
  const place = name === null ? null : context.placeOf(name);
  if (place === null) return `<code>${escapeHtml(mates)}</code>`;
  return `${openTag('a', { href: fragment(place) })}${escapeHtml(mates)}</a>`;
}
