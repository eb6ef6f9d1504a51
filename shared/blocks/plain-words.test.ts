import { expect, it } from 'vitest';
import { plainWords } from './plain-words.ts';

it('takes the signs of Markdown away and leaves every word', () => {
  expect(plainWords('Take the **battery** off *first*.\nThen `unplug` the [regulator](parts/x).')).toBe(
    'Take the battery off first. Then unplug the regulator.',
  );
  expect(plainWords('- one\n- two\n\n> three')).toBe('one two three');
});

it('leaves alone what only looks like a sign', () => {
  expect(plainWords('13.8~14.6 V at 2 * 3 and a_b')).toBe('13.8~14.6 V at 2 * 3 and a_b');
  expect(plainWords('less than \\* a star')).toBe('less than * a star');
});

it('leaves out blocks inside the text, with their tables', () => {
  expect(plainWords('Before.\n\n:::wires\n| From | To |\n| - | - |\n| a.1 | b.1 |\n:::\n\nAfter.')).toBe(
    'Before. After.',
  );
});

it('takes no longer than the text is long', () => {
  for (const sign of ['*a ', '[', '<a', '`', '**', '_']) expect(typeof plainWords(sign.repeat(20_000))).toBe('string');
});
