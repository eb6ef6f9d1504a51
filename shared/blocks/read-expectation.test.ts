import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readExpectation } from './read-expectation.ts';

function between(lowest: number, highest: number, unit: string): unknown {
  return { kind: 'range', lowest, highest, lowestIncluded: true, highestIncluded: true, unit };
}

describe('readExpectation', () => {
  it.each(['100–130 Ω', '100-130 Ω', '100~130 Ω', '100 to 130 Ω', '100 Ω – 130 Ω', '100–130 \u2126'])(
    'reads %j as a range',
    (written) => {
      expect(readExpectation(written)).toEqual(between(100, 130, 'Ω'));
    },
  );

  it('reads decimal commas, negative figures and units of every kind', () => {
    expect(readExpectation('0,1–0,2 V')).toEqual(between(0.1, 0.2, 'V'));
    expect(readExpectation('−5 – −2 °C')).toEqual(between(-5, -2, '°C'));
    expect(readExpectation('50–60 V AC')).toEqual(between(50, 60, 'V AC'));
    expect(readExpectation('1100–1300 rpm')).toEqual(between(1100, 1300, 'rpm'));
  });

  it('reckons a tolerance, in the unit or in parts of a hundred', () => {
    expect(readExpectation('5 ± 0.5 Ω')).toEqual(between(4.5, 5.5, 'Ω'));
    expect(readExpectation('5 Ω ± 0.5 Ω')).toEqual(between(4.5, 5.5, 'Ω'));
    expect(readExpectation('4.7 ± 10 % kΩ')).toEqual(between(4.23, 5.17, 'kΩ'));
    expect(readExpectation('4.7 kΩ ± 10%')).toEqual(between(4.23, 5.17, 'kΩ'));
    expect(readExpectation('5 +/- 0.5 Ω')).toEqual(between(4.5, 5.5, 'Ω'));
  });

  it.each([
    ['< 0.2 V', null, 0.2, true, false],
    ['≤ 0.2 V', null, 0.2, true, true],
    ['<= 0.2 V', null, 0.2, true, true],
    ['max 0.2 V', null, 0.2, true, true],
    ['0.2 V max.', null, 0.2, true, true],
    ['> 0.2 V', 0.2, null, false, true],
    ['≥ 0.2 V', 0.2, null, true, true],
    ['>= 0.2 V', 0.2, null, true, true],
    ['Min. 0.2 V', 0.2, null, true, true],
  ])('reads %j as a limit', (written, lowest, highest, lowestIncluded, highestIncluded) => {
    expect(readExpectation(written)).toEqual({
      kind: 'range',
      lowest,
      highest,
      lowestIncluded,
      highestIncluded,
      unit: 'V',
    });
  });

  it('reads continuity and open', () => {
    expect(readExpectation('Continuity')).toEqual({ kind: 'continuity' });
    expect(readExpectation('open')).toEqual({ kind: 'open' });
  });

  it.each([
    '',
    'About 5 Ω',
    '5 Ω',
    '5–7',
    '< 5',
    '5 ± 10 %',
    '50 % ± 5 %',
    '7–5 Ω',
    '5 Ω – 7 kΩ',
    '1,000–1,200 Ω',
    'good',
    '5–7 teeth',
    '5–7 Ω or so',
    '± 5 V',
    'not open',
  ])('finds no expectation in %j', (written) => {
    expect(readExpectation(written)).toBeNull();
  });

  it('reads any range that it is given, and keeps its ends in order', () => {
    const figure = fc.integer({ min: 0, max: 99_999 }).map((hundredths) => hundredths / 100);
    fc.assert(
      fc.property(figure, figure, fc.constantFrom('V', 'Ω', 'kΩ', 'A', 'mA', 'W', '°C'), (a, b, unit) => {
        const [lowest, highest] = [Math.min(a, b), Math.max(a, b)];
        expect(readExpectation(`${lowest}–${highest} ${unit}`)).toEqual(between(lowest, highest, unit));
      }),
    );
  });

  it('never throws, and gives no range that runs backwards', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[0-9.,<>±~ –maxminVΩ%-]{0,20}$/)), (written) => {
        const read = readExpectation(written);
        if (read?.kind !== 'range') return;
        expect(read.lowest ?? -Infinity).toBeLessThanOrEqual(read.highest ?? Infinity);
      }),
    );
  });
});
