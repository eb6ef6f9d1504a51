import type { PageKind } from '../../shared/pages/page-kind.ts';

/* What the editor starts from where there is no page yet: the skeleton of its kind, with what to write in its place. */

const sources = `sources:
  - id: m1
    kind: factory-manual
    title: Which manual, supplement or diagram
    where: page or figure`;

function frontMatter(title: string, kind: PageKind, summary: string, facts = ''): string {
  return `---
title: ${title}
kind: ${kind}
summary: ${summary}
colours: jis
${facts}${sources}
---`;
}

const bodies: Readonly<Record<PageKind, string>> = {
  overview: `${frontMatter(
    'Maker and model',
    'overview',
    'What it is, in one sentence.',
    `maker:
model:
years: 1978-1981
markets: []
voltage: 12 V
ignition:
charging:
battery: battery
earth: negative
`,
  )}

What it is, and what makes it a good or a bad donor.

## Where everything is

## What must stay
`,
  pinouts: `${frontMatter('Pinouts', 'pinouts', 'Which connectors, in one sentence.')}

Where the connector is, and how to be sure that it is this one.

:::connector{#connector-id name="Name of the connector" zone="headlight" layout="2x2" seen="wire side" first="top left" latch="top" cite="m1"}
| Cavity | Wire | mm² | Circuit | Goes to | Years | Note |
| ------ | ---- | --- | ------- | ------- | ----- | ---- |
| 1      |      |     |         |         |       |      |
:::
`,
  quirks: `${frontMatter('Quirks', 'quirks', 'What it is known to do wrong, in one sentence.')}

## What it does

What one sees, what causes it, and how to be sure.
`,
  'safe-mods': `${frontMatter('Safe modifications', 'safe-mods', 'What may be changed, in one sentence.')}

What is changed, why, and what must stay.

:::wires{cite="m1"}
| From | To | Wire | mm² | Length m |
| ---- | -- | ---- | --- | -------- |
:::
`,
  checks: `${frontMatter('Checks', 'checks', 'What to measure, in one sentence.')}

:::checks{cite="m1"}
| Check | Between | Expect | At | How |
| ----- | ------- | ------ | -- | --- |
:::
`,
  notes: `${frontMatter('Notes', 'notes', 'What this is about, in one sentence.')}

`,
};

/** The skeleton of a page of a kind. */
export function templateOf(kind: PageKind): string {
  return bodies[kind];
}

/** The kind that a page's slug speaks of: `pinouts-front` is pinouts; notes where it names none. */
export function kindOfSlug(slug: string): PageKind {
  const kinds = Object.keys(bodies) as PageKind[];
  return kinds.find((kind) => slug === kind || slug.startsWith(`${kind}-`)) ?? 'notes';
}
