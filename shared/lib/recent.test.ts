import { describe, expect, it } from 'vitest';
import { createRecent } from './recent.ts';

describe('a memory of what was used last', () => {
  it('forgets the value longest not used when there is no room', () => {
    const recent = createRecent<string, number>(2);
    recent.set('a', 1);
    recent.set('b', 2);
    recent.get('a');
    recent.set('c', 3);
    expect([recent.get('a'), recent.get('b'), recent.get('c')]).toEqual([1, undefined, 3]);
  });

  it('keeps one value a key, the newest', () => {
    const recent = createRecent<string, number>(2);
    recent.set('a', 1);
    recent.set('a', 2);
    recent.set('b', 3);
    expect([recent.get('a'), recent.get('b')]).toEqual([2, 3]);
  });

  it('forgets everything when it is cleared', () => {
    const recent = createRecent<string, number>(2);
    recent.set('a', 1);
    recent.clear();
    expect(recent.get('a')).toBeUndefined();
  });
});
