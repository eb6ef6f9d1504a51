import { expect, it } from 'vitest';
import { dayOf } from './dates.ts';

it('says a day in words, by the clock of Greenwich wherever it is read', () => {
  expect(dayOf('2026-05-03T23:59:59.000Z')).toBe('3 May 2026');
  expect(dayOf('2026-12-31T23:30:00+02:00')).toBe('31 December 2026');
});

it('does not make up a day of what is no time', () => {
  expect(dayOf('soon')).toBe('an unknown day');
});
