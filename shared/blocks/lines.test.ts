import { expect, it } from 'vitest';
import { blockOf } from '../../tests/factories/source-blocks.ts';
import { blockAddress, isTableBlock, linesOf, tableBlocks } from './lines.ts';

const wires = blockOf('wires', ':::wires\n| From | To |\n| - | - |\n| b.1 | a.1 |\n:::').block;
const noWires = blockOf('wires', ':::wires\n| From | To |\n| - | - |\n:::').block;
const unit = blockOf('inside', ':::inside{#unit}\n| From | As |\n| - | - |\n:::').block;
const caution = blockOf('hazard', ':::hazard{signal="notice"}\nMind the paint.\n:::').block;
const sum = blockOf('calculator', '::calculator{name="wire-size"}').block;

it('gives the lines of blocks that have a table, and none of a caution or a sum', () => {
  expect(linesOf(wires).map(({ address }) => address)).toEqual(['a.1--b.1']);
  expect(linesOf(caution)).toEqual([]);
  expect(linesOf(sum)).toEqual([]);
  expect(tableBlocks([caution, wires, sum, unit])).toEqual([wires, unit]);
  expect(isTableBlock(sum)).toBe(false);
});

it("addresses a block by its id, else by its first row's address", () => {
  expect(blockAddress(unit)).toBe('unit');
  expect(blockAddress(wires)).toBe('a.1--b.1');
  expect(blockAddress(noWires)).toBeNull();
  expect(blockAddress(caution)).toBeNull();
});
