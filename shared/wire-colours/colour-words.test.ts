import { describe, expect, it } from 'vitest';
import { colourNames } from './colour-system.ts';
import { colourOfWords, wireColourWords } from './colour-words.ts';

describe('colourOfWords', () => {
  it('knows every colour by its own name, in any case', () => {
    for (const name of colourNames) expect(colourOfWords(name.toUpperCase())).toBe(name);
  });

  it.each([
    ['gray', 'grey'],
    ['slate', 'grey'],
    ['purple', 'violet'],
    ['sky blue', 'light blue'],
    ['  Light   Green ', 'light green'],
    ['dark brown', 'chocolate'],
  ])('knows %j as %s', (words, colour) => {
    expect(colourOfWords(words)).toBe(colour);
  });

  it('knows no other word', () => {
    expect(colourOfWords('fuse')).toBeNull();
    expect(colourOfWords('')).toBeNull();
    expect(colourOfWords('constructor')).toBeNull();
  });
});

describe('wireColourWords', () => {
  it('says base and tracer, or the base alone', () => {
    expect(wireColourWords({ base: 'yellow', tracer: 'red' })).toBe('yellow, red tracer');
    expect(wireColourWords({ base: 'yellow', tracer: null })).toBe('yellow');
  });
});
