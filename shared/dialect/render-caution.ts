import { bookCautions, measuringCaution, routingCaution, type BookCaution } from '../blocks/book-cautions.ts';
import { hazardKinds, type Block, type HazardBlock, type HazardKind, type SignalWord } from '../blocks/block.ts';
import { hazardsNamed, hazardsOf, hazardsTouched } from '../blocks/hazards.ts';
import { escapeHtml } from './html-text.ts';
import type { PageText } from './page-text.ts';

/** What each hazard is called where the book speaks for itself. */
const hazardNames: Readonly<Record<HazardKind, string>> = {
  battery: 'Battery',
  starter: 'Starter',
  ignition: 'Ignition',
  charging: 'Charging',
  fuel: 'Fuel',
  brakes: 'Brakes and lamps',
};

/** A page's own caution: signal word, the writer's words, and behind "more" what the book says of the same hazards. */
export function renderHazard(block: HazardBlock, body: string): string {
  const kinds = hazardsOf(block);
  const said = kinds.map((kind) => `<p><b>${hazardNames[kind]}.</b> ${escapeHtml(bookCautions[kind].text)}</p>`);
  const more = said.length === 0 ? '' : `<details class="caution-more"><summary>More</summary>${said.join('')}</details>`;
  return caution(block.signal, body === '' ? `<p>${escapeHtml(block.text)}</p>` : body, more, '');
}

/** The book's own caution for each hazard that a page touches and says nothing of, for the top of the page. */
export function renderMissingCautions(text: PageText): string {
  return missingHazards(text)
    .map((kind) => bookCaution(hazardNames[kind], bookCautions[kind]))
    .join('');
}

/** What is said before the first check of a page. */
export function renderMeasuringCaution(): string {
  return bookCaution('Before you measure', measuringCaution);
}

/** What is said before the first wire of a modification. */
export function renderRoutingCaution(): string {
  return bookCaution('Before you lay a wire', routingCaution);
}

function missingHazards({ blocks, outline, frontMatter }: PageText): readonly HazardKind[] {
  const touched = new Set<HazardKind>([
    ...blocks.flatMap((block) => [...hazardsTouched(block)]),
    ...[frontMatter.title, ...outline.map((entry) => entry.text)].flatMap((words) => [...hazardsNamed(words)]),
  ]);
  const said = new Set(blocks.flatMap((block: Block) => (block.kind === 'hazard' ? [...hazardsOf(block)] : [])));
  return hazardKinds.filter((kind) => touched.has(kind) && !said.has(kind));
}

function bookCaution(about: string, { signal, text }: BookCaution): string {
  return caution(signal, `<p><b>${escapeHtml(about)}.</b> ${escapeHtml(text)}</p>`, '', ' caution-of-the-book');
}

function caution(signal: SignalWord, body: string, more: string, className: string): string {
  const sign = signal === 'notice' ? '' : alertSign;
  return `<aside class="caution caution-${signal}${className}" role="note" aria-label="${signal}"><p class="caution-word">${sign}${signal}</p><div class="caution-text">${body}${more}</div></aside>`;
}

/** The safety alert symbol of ANSI Z535.6, a triangle with an exclamation mark; a notice has none. */
const alertSign =
  '<svg class="alert-sign" viewBox="0 0 22 20" width="22" height="20" aria-hidden="true" focusable="false"><path d="M11 1.5 20.8 18.5H1.200z" fill="none" stroke="currentColor" stroke-width="2" stroke-linejoin="round"/><path d="M11 7v5.5M11 14.5v2" stroke="currentColor" stroke-width="2.2"/></svg>';
