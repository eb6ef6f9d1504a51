import { appliesToAll, type Applicability } from '../pages/applicability.ts';
import { finding, type Finding } from '../pages/finding.ts';
import { areDisjoint } from '../pages/variant.ts';
import type { Block } from './block.ts';
import { linesOf } from './lines.ts';

/** The ids that other pages of the subject have. */
export interface IdsElsewhere {
  readonly idsElsewhere: readonly { readonly id: string; readonly page: string }[];
}

interface DeclaredId {
  readonly id: string;
  readonly line: number;
  readonly address: string;
  readonly applies: Applicability;
}

/**
 * Finds ids that two things have, on the page or on other pages of the subject, and lines that have one address.
 * Components of one id may stand side by side where their years, markets or frames are disjoint.
 * @param overlays true for safe modifications, where an id that the donor has takes its place on purpose
 */
export function checkIds(blocks: readonly Block[], context: IdsElsewhere, overlays: boolean): readonly Finding[] {
  const byId = new Map<string, DeclaredId[]>();
  const pageOf = new Map(overlays ? [] : context.idsElsewhere.map(({ id, page }) => [id, page]));
  const repeated: Finding[] = [];
  const elsewhere: Finding[] = [];
  for (const one of blocks.flatMap(declaredIds)) {
    const earlier = byId.get(one.id) ?? [];
    const clash = earlier.find((other) => !areDisjoint(one.applies, other.applies));
    if (clash !== undefined) repeated.push(repeatedId(one, `on line ${clash.line} of this page`));
    const page = pageOf.get(one.id);
    if (page !== undefined) elsewhere.push(repeatedId(one, `on the page ${page}`));
    if (earlier.length === 0) byId.set(one.id, [one]);
    else earlier.push(one);
  }
  const known = new Set(repeated.map(({ line }) => line));
  return [...repeated, ...elsewhere, ...repeatedAddresses(blocks).filter(({ line }) => !known.has(line))];
}

function declaredIds(block: Block): readonly DeclaredId[] {
  // An inside block names a component that stands elsewhere.
  const own =
    block.id === null || block.kind === 'inside'
      ? []
      : [{ id: block.id, line: block.line, address: `#${block.id}`, applies: appliesToAll }];
  if (block.kind !== 'components') return own;
  return [
    ...own,
    ...block.lines.map(({ id, line, address, applies }) => ({ id, line, address: `#${address}`, applies })),
  ];
}

function repeatedId({ id, line, address }: DeclaredId, where: string): Finding {
  const message = `The id \`${id}\` is already ${where}. Give one of them another: every connector, switch and component of a subject has its own.`;
  return finding('id-repeated', message, line, address);
}

function repeatedAddresses(blocks: readonly Block[]): readonly Finding[] {
  const firstLines = new Map<string, number>();
  const findings: Finding[] = [];
  for (const { address, line } of blocks.flatMap((block) => [...linesOf(block)])) {
    const first = firstLines.get(address);
    if (first === undefined) firstLines.set(address, line);
    else {
      const message = `The lines ${first} and ${line} have one address, \`#${address}\`. Say in Years, Markets or Frames which holds when, or give one another name.`;
      findings.push(finding('id-repeated', message, line, `#${address}`));
    }
  }
  return findings;
}
