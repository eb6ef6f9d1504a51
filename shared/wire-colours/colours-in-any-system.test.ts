import { expect, it } from 'vitest';
import { coloursInAnySystem } from './colours-in-any-system.ts';

it('finds a wire in any spelling of any system', () => {
  for (const written of ['Y/R', 'YR', 'YERD', 'ge/rt', 'YE/RD', 'yellow red', 'yellow with a red stripe']) {
    expect(coloursInAnySystem(written), written).toEqual([{ base: 'yellow', tracer: 'red' }]);
  }
});

it('gives every meaning of letters that the systems read differently, each once', () => {
  expect(coloursInAnySystem('P')).toEqual([
    { base: 'pink', tracer: null },
    { base: 'violet', tracer: null },
  ]);
});

it('finds nothing in what is no colour', () => {
  expect(coloursInAnySystem('fuse')).toEqual([]);
  expect(coloursInAnySystem('')).toEqual([]);
});
