import { finding, type Finding } from '../pages/finding.ts';
import { hazardKinds, type Block, type HazardKind } from './block.ts';
import { hazardsNamed, hazardsOf, hazardsTouched } from './hazards.ts';
import { blockAddress } from './lines.ts';

/** A heading of a page, as far as checks look at it. */
export interface PageHeading {
  readonly text: string;
  readonly line: number;
}

interface Touch {
  readonly line: number;
  readonly address: string | null;
  readonly where: string;
}

/** Finds the hazards that a page touches without a caution of them: one finding a hazard, where it is touched first. */
export function checkCautions(
  blocks: readonly Block[],
  headings: readonly PageHeading[],
): readonly Finding[] {
  const covered = new Set(blocks.flatMap((block) => (block.kind === 'hazard' ? [...hazardsOf(block)] : [])));
  const findings: Finding[] = [];
  for (const kind of hazardKinds) {
    if (covered.has(kind)) continue;
    const touch = firstTouch(kind, blocks, headings);
    if (touch === null) continue;
    const message = `${touch.where} touches a hazard (${kind}) and the page has no caution of it. Put one that fits before the step: :::hazard{signal="warning" of="${kind}"}. Until then the book's own stands there.`;
    findings.push(finding('caution-missing', message, touch.line, touch.address === null ? undefined : `#${touch.address}`));
  }
  return findings;
}

function firstTouch(kind: HazardKind, blocks: readonly Block[], headings: readonly PageHeading[]): Touch | null {
  const touches: Touch[] = [];
  const block = blocks.find((candidate) => hazardsTouched(candidate).includes(kind));
  if (block !== undefined) {
    const label = block.id === null ? `This ${block.kind} block` : `The ${block.kind} block \`${block.id}\``;
    touches.push({ line: block.line, address: blockAddress(block), where: label });
  }
  const heading = headings.find(({ text }) => hazardsNamed(text).includes(kind));
  if (heading !== undefined) touches.push({ line: heading.line, address: null, where: `“${heading.text}”` });
  return touches.toSorted((a, b) => a.line - b.line)[0] ?? null;
}
