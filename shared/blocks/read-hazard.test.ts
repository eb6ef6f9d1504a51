import { describe, expect, it } from 'vitest';
import { blockOf } from '../../tests/factories/source-blocks.ts';

describe('a caution', () => {
  it('reads its signal word, what it is of, and its words', () => {
    const { block, findings } = blockOf(
      'hazard',
      ':::hazard{signal="warning" of="battery, Charging"}\nTake the battery\'s *earthed* lead off.\n:::',
    );
    expect(findings).toEqual([]);
    expect(block).toMatchObject({
      kind: 'hazard',
      id: null,
      signal: 'warning',
      of: ['battery', 'charging'],
      text: "Take the battery's earthed lead off.",
    });
  });

  it.each([
    [':::hazard\nHot.\n:::', /no signal word/],
    [':::hazard{signal="beware"}\nHot.\n:::', /danger, warning, caution, notice/],
    [':::hazard{signal="danger" of="fire"}\nHot.\n:::', /battery, starter, ignition/],
    [':::hazard{signal="danger"}\n:::', /says nothing/],
  ])('is never dropped: %j is read, with a finding', (text, message) => {
    const { block, findings } = blockOf('hazard', text);
    expect(block.signal).toBe(text.includes('danger') ? 'danger' : 'warning');
    expect(findings).toMatchObject([{ code: 'block-unreadable', severity: 'stop', line: 1 }]);
    expect(findings[0]?.message).toMatch(message);
  });
});
