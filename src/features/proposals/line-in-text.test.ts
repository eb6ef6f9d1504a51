import { expect, test } from 'vitest';
import { lineSpan } from './line-in-text.ts';

const text = 'one\ntwo\n\nfour';

test.each([
  [1, 'one'],
  [2, 'two'],
  [3, ''],
  [4, 'four'],
  [9, 'four'],
])('line %i of a text is %j', (line, expected) => {
  const { start, end } = lineSpan(text, line);
  expect(text.slice(start, end)).toBe(expected);
});
