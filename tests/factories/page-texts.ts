import type { PageKind } from '../../shared/pages/page-kind.ts';

/** What a page says, as far as the test cares. */
export interface PageWords {
  readonly title?: string;
  readonly kind?: PageKind;
  readonly body?: string;
  /** More lines of the front matter. */
  readonly front?: string;
}

/** A page's Markdown that nothing stops. */
export function pageText({ title = 'Pinouts', kind = 'pinouts', body = 'Words.', front = '' }: PageWords = {}): string {
  return `---
title: ${title}
kind: ${kind}
summary: What ${title} says.
colours: jis
${front === '' ? '' : `${front}\n`}sources:
  - id: m1
    kind: factory-manual
    title: Workshop manual, invented for a test
    where: page 4
---

${body}
`;
}

/** A donor's overview. */
export function overviewText(title = 'Testbike 500', body = 'A donor invented for a test.'): string {
  const front =
    'maker: Invented\nmodel: Testbike 500\nyears: 1978-1981\nmarkets: [UK, EU]\nvoltage: 12 V\nearth: negative';
  return pageText({ title, kind: 'overview', front, body });
}

/** A connector of three cavities; the second one's wire is the test's choice. */
export function connectorBlock(id = 'headlight', secondWire = 'Y/R'): string {
  return `:::connector{#${id} name="Headlight" zone="headlight" layout="3" seen="wire side" first="top left" latch="top" cite="m1"}
| Cavity | Wire | mm² | Circuit |
| ------ | ---- | --- | ------- |
| 1 | Y | 0.85 | Dip beam |
| 2 | ${secondWire} | 0.85 | Main beam |
| 3 | – | | blank |
:::`;
}

/** A connector with a row outside its face: a finding that stops, at `#<id>.9`. */
export function stoppingBlock(id = 'headlight'): string {
  return `:::connector{#${id} name="Headlight" zone="headlight" layout="2" seen="wire side" first="top left" latch="top" cite="m1"}
| Cavity | Wire | Circuit |
| ------ | ---- | ------- |
| 1 | Y | Signal |
| 2 | L | Signal |
| 9 | R | Signal |
:::`;
}
