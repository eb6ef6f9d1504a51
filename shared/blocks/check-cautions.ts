import { quoted } from '../lib/quoted.ts';
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
  readonly kind: HazardKind;
  readonly line: number;
  readonly address: string | null;
  readonly where: string;
}

/** Finds the hazards that a page touches without a caution of them: one finding a hazard, where it is touched first. */
export function checkCautions(blocks: readonly Block[], headings: readonly PageHeading[]): readonly Finding[] {
  const touches: readonly Touch[] = [
    ...blocks.flatMap((block) => hazardsTouched(block).map((kind) => touchOf(kind, block))),
    ...headings.flatMap(({ text, line }) =>
      hazardsNamed(text).map((kind) => ({ kind, line, address: null, where: `${quoted(text)}` })),
    ),
  ].toSorted((a, b) => a.line - b.line);
  const covered = new Set(blocks.flatMap((block) => (block.kind === 'hazard' ? [...hazardsOf(block)] : [])));
  const findings: Finding[] = [];
  for (const kind of hazardKinds) {
    if (covered.has(kind)) continue;
    const touch = touches.find((one) => one.kind === kind);
    if (touch === undefined) continue;
    const message = `${touch.where} touches a hazard (${kind}) and the page has no caution of it. Put one that fits before the step: :::hazard{signal="warning" of="${kind}"}. Until then the book's own stands there.`;
    findings.push(
      finding('caution-missing', message, touch.line, touch.address === null ? undefined : `#${touch.address}`),
    );
  }
  return findings;
}

function touchOf(kind: HazardKind, block: Block): Touch {
  const where = block.id === null ? `This ${block.kind} block` : `The ${block.kind} block \`${block.id}\``;
  return { kind, line: block.line, address: blockAddress(block), where };
}
