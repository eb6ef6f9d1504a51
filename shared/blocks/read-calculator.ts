import { isSlug } from '../lib/slug.ts';
import type { CalculatorBlock } from './block.ts';
import { attribute, readHead, unreadable, type BlockReading } from './block-reading.ts';
import type { SourceBlock } from './source-table.ts';

/** Reads a sum in a page: its name, and every other attribute as a figure. */
export function readCalculator(source: SourceBlock): BlockReading {
  const sum = attribute(source, 'name');
  if (sum === null || !isSlug(sum)) {
    const message = 'does not say which sum it is. Write its name as in `::calculator{name="wire-size" current="9"}`.';
    return { block: null, findings: [unreadable(source, message)] };
  }
  const head = readHead(source, []);
  const block: CalculatorBlock = {
    kind: 'calculator',
    ...head,
    name: null,
    otherAttributes: {},
    sum,
    figures: head.otherAttributes,
  };
  return { block, findings: [] };
}
