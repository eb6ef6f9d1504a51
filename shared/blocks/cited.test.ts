import { describe, expect, it } from 'vitest';
import { sourceKinds, type Source } from '../pages/front-matter.ts';
import { isCited } from './cited.ts';

const sources = sourceKinds.map((kind): Source => ({ id: kind, kind, title: kind, where: null }));

describe('whether a line is cited', () => {
  it('is so by a factory manual or a standard, and by no other source', () => {
    expect(sourceKinds.filter((kind) => isCited(kind, sources))).toEqual(['factory-manual', 'standard']);
  });

  it('is so where one of several sources is such', () => {
    expect(isCited('word-of-mouth, standard', sources)).toBe(true);
    expect(isCited('word-of-mouth, parts-list', sources)).toBe(false);
  });

  it('is not so by nothing, nor by a source that the page does not list', () => {
    expect(isCited(null, sources)).toBe(false);
    expect(isCited('m9', sources)).toBe(false);
  });
});
