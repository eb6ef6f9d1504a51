import type { Shelf } from '../../shared/pages/address.ts';
import type { PageKind } from '../../shared/pages/page-kind.ts';

/*
 * What the editor starts from where there is no page yet: the skeleton of its kind, with what to write in its place.
 * Nothing in it is a claim that would stand if somebody left it in: no years, no source that makes a line cited.
 */

const sources = `sources:
  - id: c1
    kind: club-measurement
    title: On which bike you measured, or which manual says it
    where: how you measured, or page and figure`;

function frontMatter(title: string, kind: PageKind, summary: string, facts = ''): string {
  return `---
title: ${title}
kind: ${kind}
summary: ${summary}
colours: jis
${facts}${sources}
---`;
}

const caution = `:::hazard{signal="warning" of="battery"}
What can hurt somebody at the step below, how, and how to avoid it. The maker's manual and local law go before this page.
:::`;

const bikeFacts = `maker:
model:
years:
markets: []
voltage: 12 V
ignition:
charging:
battery:
earth:
`;

/** The first page of a subject, by the shelf that it stands on. */
const overviews: Readonly<Record<Shelf, string>> = {
  donors: `${frontMatter('Maker and model', 'overview', 'What bike it is, in one sentence.', bikeFacts)}

What it is, and what makes it a good or a bad donor.

## Where everything is

Battery, fuses, regulator, ignition unit, relays, and where the loom runs.

## What must stay

What the engine needs from the old loom: pickup, ignition unit, interlocks.

## What can go
`,
  parts: `${frontMatter('Maker and name of the part', 'overview', 'What it is fitted instead of, in one sentence.', 'maker:\nmodel:\nvoltage: 12 V\n')}

What it does, and what it is fitted instead of.

## What it needs

Feed and fuse, earth, signals, and what it does not get on with.

## What it is known to do wrong
`,
  reference: `${frontMatter('Name of the topic', 'overview', 'What question it answers, in one sentence.')}

The answer first.

## Where it comes from

The standard, the table or the measurement, and where it does not hold.
`,
};

const bodies: Readonly<Record<Exclude<PageKind, 'overview'>, string>> = {
  pinouts: `${frontMatter('Connectors', 'pinouts', 'Which connectors, in one sentence.')}

Where the connector is, and how to be sure that it is this one.

:::connector{#connector-id name="Name of the connector" zone="headlight" layout="2x2" cite="c1"}
| Cavity | Wire | mm² | Circuit | Goes to | Years | Note |
| ------ | ---- | --- | ------- | ------- | ----- | ---- |
| 1      |      |     |         |         |       |      |
:::
`,
  quirks: `${frontMatter('Quirks', 'quirks', 'What it is known to do wrong, in one sentence.')}

## What it does

What one sees, what causes it, how to be sure, and what settles it.
`,
  'safe-mods': `${frontMatter('Safe modifications', 'safe-mods', 'What may be changed, in one sentence.')}

What is changed, why, and what must stay.

${caution}

:::wires{cite="c1"}
| From | To | Wire | mm² | Length m |
| ---- | -- | ---- | --- | -------- |
:::
`,
  checks: `${frontMatter('Checks', 'checks', 'What to measure, in one sentence.')}

${caution}

:::checks{cite="c1"}
| Check | Between | Expect | At | How |
| ----- | ------- | ------ | -- | --- |
:::
`,
  notes: `${frontMatter('Notes', 'notes', 'What this is about, in one sentence.')}

What you saw, on which bike, and how you know.
`,
};

/** The skeleton of a page of a kind, on a shelf. */
export function templateOf(kind: PageKind, shelf: Shelf): string {
  return kind === 'overview' ? overviews[shelf] : bodies[kind];
}

/** The kind that a page's slug speaks of: `pinouts-front` is pinouts; notes where it names none. */
export function kindOfSlug(slug: string): PageKind {
  const kinds = ['overview', ...(Object.keys(bodies) as PageKind[])] as const;
  return kinds.find((kind) => slug === kind || slug.startsWith(`${kind}-`)) ?? 'notes';
}
