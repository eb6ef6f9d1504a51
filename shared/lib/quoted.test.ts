import { expect, it } from 'vitest';
import { quoted, shortened } from './quoted.ts';

it('quotes what somebody wrote, on one line', () => {
  expect(quoted('about 5 Ω')).toBe('“about 5 Ω”');
  expect(quoted('two\nlines')).toBe('“two lines”');
});

it('cuts what is too long for a sentence, and never within a character', () => {
  expect(shortened('x'.repeat(60))).toBe('x'.repeat(60));
  expect(shortened('x'.repeat(61))).toBe(`${'x'.repeat(60)}…`);
  expect(shortened('😀'.repeat(70))).toBe(`${'😀'.repeat(60)}…`);
  expect(shortened('x'.repeat(100_000))).toHaveLength(61);
});
