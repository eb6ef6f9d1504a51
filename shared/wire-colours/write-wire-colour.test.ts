import { expect, it } from 'vitest';
import { wireColourCode } from './write-wire-colour.ts';

it("writes a wire as each system's diagrams do", () => {
  const yellowRed = { base: 'yellow', tracer: 'red' } as const;
  expect(wireColourCode(yellowRed, 'jis')).toBe('Y/R');
  expect(wireColourCode(yellowRed, 'din')).toBe('YERD');
  expect(wireColourCode(yellowRed, 'bs-au7')).toBe('Y/R');
  expect(wireColourCode(yellowRed, 'iec')).toBe('YE/RD');
  expect(wireColourCode({ base: 'brown', tracer: null }, 'jis')).toBe('Br');
});

it("writes words where the system has no code, and a page's own code where it gives its key", () => {
  expect(wireColourCode({ base: 'turquoise', tracer: 'red' }, 'jis')).toBe('turquoise/red');
  expect(wireColourCode({ base: 'white', tracer: null }, 'own')).toBe('white');
  expect(wireColourCode({ base: 'white', tracer: 'black' }, { name: 'own', key: { B: 'white', N: 'black' } })).toBe(
    'B/N',
  );
});
