import { describe, expect, it } from 'vitest';
import { stopsOf } from './decision.tsx';
import type { FindingView } from './findings-list.tsx';
import { readNote, readPublication } from './proposal-action.ts';

function form(fields: Record<string, string>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries(fields)) data.set(name, value);
  return data;
}

describe('a note', () => {
  it.each([
    ['', {}],
    ['14', { line: 14 }],
    ['line 14', { line: 14 }],
    ['headlight.2~1980-', { address: '#headlight.2~1980-' }],
    ['#headlight.3', { address: '#headlight.3' }],
  ])('of %j', (about, expected) => {
    expect(readNote(form({ text: 'Look again.', about }))).toEqual({ text: 'Look again.', ...expected });
  });
});

describe('a publication', () => {
  it('names the version that was read, and gives each reason to its finding', () => {
    const fields = {
      version: '2',
      'code-0': 'cavity-repeated',
      'address-0': '#headlight.3',
      'reason-0': 'Both are right: two looms.',
      'code-1': 'block-unreadable',
      'address-1': '',
      'reason-1': ' It is a drawing. ',
    };
    expect(readPublication(form(fields))).toEqual({
      version: '2',
      overrides: [
        { code: 'cavity-repeated', address: '#headlight.3', reason: 'Both are right: two looms.' },
        { code: 'block-unreadable', address: null, reason: 'It is a drawing.' },
      ],
    });
  });

  it('takes an empty reason for none', () => {
    expect(readPublication(form({ version: '1', 'code-0': 'id-repeated', 'reason-0': '  ' })).overrides).toEqual([]);
  });

  it('asks for one reason where one finding stands twice, and for none where nothing stops it', () => {
    const stop: FindingView = { code: 'id-repeated', severity: 'stop', message: 'Twice.', line: 3, address: '#a' };
    const hint: FindingView = { code: 'uncited', severity: 'hint', message: 'No source.', line: 3 };
    expect(stopsOf([stop, hint, { ...stop, line: 9 }, { ...stop, address: '#b' }])).toEqual([
      stop,
      { ...stop, address: '#b' },
    ]);
  });
});
