import { expect, it } from 'vitest';
import { blockOf, findingsOf } from '../../tests/factories/source-blocks.ts';

it('reads a sum by its name, with every other attribute as a figure as written', () => {
  const { block, findings } = blockOf('calculator', '::calculator{name="wire-size" current="9" length="2,4"}');
  expect(findings).toEqual([]);
  expect(block).toMatchObject({
    kind: 'calculator',
    sum: 'wire-size',
    figures: { current: '9', length: '2,4' },
    otherAttributes: {},
  });
});

it('asks which sum it is', () => {
  expect(findingsOf('::calculator{current="9"}')).toMatchObject([{ code: 'block-unreadable', line: 1 }]);
});
