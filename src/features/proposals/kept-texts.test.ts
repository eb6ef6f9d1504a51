import { expect, test } from 'vitest';
import { forgetTexts, keepText, keptKey, readKept, type KeptText } from './kept-texts.ts';

function drawer(full = false) {
  const places = new Map<string, string>();
  return {
    places,
    getItem: (key: string) => places.get(key) ?? null,
    setItem(key: string, value: string) {
      if (full) throw new DOMException('full', 'QuotaExceededError');
      places.set(key, value);
    },
    removeItem: (key: string) => void places.delete(key),
  };
}

function text(id: string, markdown = 'typed'): KeptText {
  return { id, memberId: 'writer', markdown, summary: '', keptAt: '2026-05-03T10:00:00Z' };
}

const key = keptKey('donors/qf550/pinouts', 3);

test('keeps the texts of two revisions of one page apart, and those of a new page', () => {
  const keys = [
    keptKey('donors/qf550/pinouts', 3),
    keptKey('donors/qf550/pinouts', 4),
    keptKey('donors/qf550/pinouts', null),
  ];
  expect(new Set(keys).size).toBe(3);
});

test('gives back what was typed last first, each text once', () => {
  const kept = drawer();
  keepText(kept, key, text('a', 'first'));
  keepText(kept, key, text('b', 'other'));
  keepText(kept, key, text('a', 'further'));
  expect(readKept(kept, key).map(({ id, markdown }) => [id, markdown])).toEqual([
    ['a', 'further'],
    ['b', 'other'],
  ]);
});

test('drops the oldest of many rather than filling the browser', () => {
  const kept = drawer();
  for (const id of ['a', 'b', 'c', 'd']) keepText(kept, key, text(id));
  expect(readKept(kept, key).map(({ id }) => id)).toEqual(['d', 'c', 'b']);
});

test('forgets what the server has acknowledged and keeps the rest', () => {
  const kept = drawer();
  keepText(kept, key, text('a', 'sent'));
  keepText(kept, key, text('b', 'another'));
  forgetTexts(kept, key, ({ markdown }) => markdown === 'sent');
  expect(readKept(kept, key).map(({ id }) => id)).toEqual(['b']);
  forgetTexts(kept, key, () => true);
  expect(kept.places.size).toBe(0);
});

test('says so where the browser keeps nothing', () => {
  expect(keepText(drawer(true), key, text('a'))).toBe(false);
});

test.each(['', 'null', '{}', '[1, {"id": "a"}]', '[{'])('reads nothing from a damaged place: %s', (written) => {
  const kept = drawer();
  kept.places.set(key, written);
  expect(readKept(kept, key)).toEqual([]);
});
