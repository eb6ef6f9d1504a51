import { readCalculator } from './read-calculator.ts';
import { readChecks } from './read-checks.ts';
import { readComponents } from './read-components.ts';
import { readConnector } from './read-connector.ts';
import { readHazard } from './read-hazard.ts';
import { readInside } from './read-inside.ts';
import { readSwitch } from './read-switch.ts';
import { readWires } from './read-wires.ts';
import type { Block } from './block.ts';
import type { BlockReading, PageOfBlock } from './block-reading.ts';
import type { SourceBlock } from './source-table.ts';

const readers: Readonly<Record<Block['kind'], (source: SourceBlock, page: PageOfBlock) => BlockReading>> = {
  connector: readConnector,
  components: readComponents,
  switch: readSwitch,
  wires: readWires,
  inside: readInside,
  checks: readChecks,
  hazard: readHazard,
  calculator: readCalculator,
};

/** True where a directive's name is one that the book reads. */
export function isBlockName(name: string): name is Block['kind'] {
  return Object.hasOwn(readers, name);
}

/**
 * Reads a directive as a block. Never throws: where too little can be read the block is null, where a row cannot be read
 * it stands in `unreadRows`, and findings say what was expected. A directive of another name is null without a finding.
 */
export function readBlock(source: SourceBlock, page: PageOfBlock): BlockReading {
  return isBlockName(source.name) ? readers[source.name](source, page) : { block: null, findings: [] };
}
