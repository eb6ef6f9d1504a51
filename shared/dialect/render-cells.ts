import type { Line, WrittenColour } from '../blocks/block.ts';
import { saysNothing } from '../blocks/cell-text.ts';
import { citedIds } from '../blocks/check-sources.ts';
import { isCited } from '../blocks/cited.ts';
import { readTerminalName } from '../blocks/terminal-name.ts';
import { drawingMarkup } from '../drawing/drawing.ts';
import { drawWire } from '../drawing/draw-wire.ts';
import { appliesTo } from '../pages/variant.ts';
import type { WireColour } from '../wire-colours/colour-system.ts';
import { wireColourWords } from '../wire-colours/colour-words.ts';
import { escapeHtml, fragment, openTag } from './html-text.ts';
import type { RenderContext } from './render-context.ts';

/** A wire as the book always shows it: drawn, with its letters, with its words; both readings where they are in doubt. */
export function renderWire(written: string, wire: WrittenColour | null): string {
  const letters = `<b class="wire-letters">${escapeHtml(written)}</b>`;
  if (wire === null) return written.trim() === '' ? '' : letters;
  const { reading } = wire;
  if (reading.kind === 'unknown') return `${letters} <span class="wire-words">not a colour of this system</span>`;
  const colours = reading.kind === 'read' ? [reading.colour] : [reading.colour, ...reading.others];
  const drawn = colours.map((colour) => wireMarkup(colour)).join(' ');
  const words = colours.map(wireColourWords).join(', or ');
  const doubt = reading.kind === 'ambiguous' ? ' in-doubt' : '';
  return `<span class="wire${doubt}">${drawn} ${letters} <span class="wire-words">${escapeHtml(words)}</span></span>`;
}

const drawn = new Map<string, string>();

/** The same few dozen wires stand on every page, so each is drawn once. */
function wireMarkup(colour: WireColour): string {
  const key = `${colour.base}/${colour.tracer ?? ''}`;
  const known = drawn.get(key);
  if (known !== undefined) return known;
  const markup = drawingMarkup(drawWire(colour));
  drawn.set(key, markup);
  return markup;
}

/** A cell that names terminals: those that stand on this page are links to where they stand, everything else is text. */
export function renderTerminals(cell: string, context: RenderContext): string {
  return cell
    .split(/([,;]|\s[–—-]\s)/)
    .map((part, at) => (at % 2 === 1 ? escapeHtml(part) : renderTerminal(part, context)))
    .join('');
}

function renderTerminal(part: string, context: RenderContext): string {
  const name = saysNothing(part) ? null : readTerminalName(part);
  const place = name === null ? null : context.placeOf(name);
  if (place === null) return name === null || name.terminal === null ? escapeHtml(part) : code(part);
  const [, before = '', words = '', after = ''] = /^(\s*)(.*?)(\s*)$/s.exec(part) ?? [];
  return `${before}${openTag('a', { href: fragment(place) })}${escapeHtml(words)}</a>${after}`;
}

function code(part: string): string {
  const [, before = '', words = '', after = ''] = /^(\s*)(.*?)(\s*)$/s.exec(part) ?? [];
  return `${before}<code>${escapeHtml(words)}</code>${after}`;
}

/** `85: frame`: which terminal, as text, and the earth, as a link. */
export function renderEarthedBy(cell: string, context: RenderContext): string {
  const colon = cell.lastIndexOf(':');
  if (colon < 0) return renderTerminals(cell, context);
  return `${escapeHtml(cell.slice(0, colon + 1))}${renderTerminals(cell.slice(colon + 1), context)}`;
}

/** How far a line may be trusted, as a stamp in words: cited where a factory manual or a standard says so. */
export function renderMark({ cite }: Line, { sources }: RenderContext): string {
  const word = isCited(cite, sources) ? 'cited' : 'unchecked';
  const ids = citedIds(cite);
  const titles = sources.flatMap(({ id, title, where }) => {
    return ids.includes(id) ? [where === null ? title : `${title}, ${where}`] : [];
  });
  return `${openTag('span', { class: `mark mark-${word}`, title: titles.length === 0 ? null : titles.join('; ') })}${word}</span>`;
}

/** Why a line is set back for the bike that was chosen; null where it is not. */
export function whySetBack({ applies }: Line, { variant }: RenderContext): string | null {
  const reading = appliesTo(applies, variant);
  return reading.applies ? null : reading.why;
}
