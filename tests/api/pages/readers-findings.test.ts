import { describe, expect, it } from 'vitest';
import { readersFindings } from '../../../server/pages/readers-findings.ts';
import { finding } from '../../../shared/pages/finding.ts';

describe('a page’s findings as readers see them', () => {
  it('begin with what stops, then what warns, then hints, each in the order of the page', () => {
    const findings = [
      finding('face-unoriented', 'No first cavity.', 3, '#one'),
      finding('colour-unknown', 'Not in the system.', 9, '#two.1'),
      finding('id-repeated', 'Twice.', 20, '#three'),
      finding('caution-missing', 'No caution.', 5),
    ];
    expect(readersFindings(findings).map(({ code }) => code)).toEqual([
      'id-repeated',
      'caution-missing',
      'colour-unknown',
      'face-unoriented',
    ]);
  });

  it('gather hints of one kind into one that names what it is about, and leave a single one as it is', () => {
    const uncited = ['#b.1', '#a', '#c'].map((address, index) =>
      finding('uncited', `${address} names none.`, index + 10, address),
    );
    const [gathered, ...others] = readersFindings(uncited);
    expect(others).toEqual([]);
    expect(gathered).toMatchObject({ code: 'uncited', severity: 'hint', line: 10 });
    expect(gathered?.message).toContain('3 blocks');
    expect(gathered?.message).toContain('b.1, a, c');
    expect(readersFindings(uncited.slice(0, 1))).toEqual(uncited.slice(0, 1));
  });

  it('never gather what stops or warns', () => {
    const warnings = [1, 2, 3].map((line) => finding('colour-unknown', 'Not in the system.', line));
    expect(readersFindings(warnings)).toEqual(warnings);
  });
});
