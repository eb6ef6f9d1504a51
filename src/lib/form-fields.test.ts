import { describe, expect, it } from 'vitest';
import { ownPath, readText, readWayBack } from './form-fields.ts';

describe('the way back that a form names', () => {
  it('is a path of this site with its query and fragment', () => {
    expect(ownPath('/donors/qf550/pinouts?year=1980#headlight.2')).toBe('/donors/qf550/pinouts?year=1980#headlight.2');
  });

  it.each([
    'https://elsewhere.example/',
    '//elsewhere.example/',
    '/\\elsewhere.example/',
    'javascript:alert(1)',
    '',
    'donors',
    '/\t/elsewhere.example',
  ])('never leads to another site: %j', (address) => {
    const form = new FormData();
    form.set('next', address);
    expect(readWayBack(form, '/bench')).toBe('/bench');
  });

  it('is empty for a field that is absent or is a file', () => {
    const form = new FormData();
    form.set('donor', new File(['x'], 'x.txt'));
    expect(readText(form, 'donor')).toBe('');
    expect(readText(form, 'year')).toBe('');
  });
});
