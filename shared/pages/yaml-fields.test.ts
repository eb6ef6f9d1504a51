import { describe, expect, it } from 'vitest';
import { readFields } from './yaml-fields.ts';

describe('readFields', () => {
  it('reads fields with the lines that they stand on', () => {
    const { fields, lines, problem } = readFields('title: QF 550\n\nkind: notes\n');
    expect(fields).toEqual({ title: 'QF 550', kind: 'notes' });
    expect([...lines]).toEqual([
      ['title', 0],
      ['kind', 2],
    ]);
    expect(problem).toBeNull();
  });

  it('has no fields of an empty text or of comments, and none that are fields of a list', () => {
    expect(readFields('')).toMatchObject({ fields: {}, problem: null });
    expect(readFields('# nothing yet')).toMatchObject({ fields: {}, problem: null });
    expect(readFields('- a')).toMatchObject({ fields: null, problem: null });
    expect(readFields('words')).toMatchObject({ fields: null, problem: null });
  });

  it('says what is wrong and on which line, and gives what it could read', () => {
    expect(readFields('title: a\nkind: notes\ntitle: b')).toMatchObject({
      fields: { kind: 'notes' },
      problem: { message: 'Map keys must be unique.', line: 2 },
    });
  });

  const multiplying = [
    'a: &a [x,x,x,x,x,x,x,x,x]',
    ...[...'bcdefgh'].map(
      (name, at) =>
        `${name}: &${name} [${Array(9)
          .fill(`*${'abcdefg'[at] ?? 'a'}`)
          .join(',')}]`,
    ),
  ].join('\n');

  it.each([
    ['aliases that multiply', multiplying],
    ['aliases without an anchor', 'a: *b'],
    ['nested lists', '['.repeat(8000)],
    ['nested fields', '{a: '.repeat(2000)],
    ['lists in one line', '- '.repeat(4000)],
    ['questions in one line', '? '.repeat(4000)],
    ['colons in one line', ': '.repeat(4000)],
    ['length without end', `title: ${'x'.repeat(20_000)}`],
  ])('refuses %s', (_, yaml) => {
    expect(readFields(yaml).problem).not.toBeNull();
  });

  it('takes brackets in a title for what they are', () => {
    expect(readFields('title: "Plug [front] {left}"')).toMatchObject({
      fields: { title: 'Plug [front] {left}' },
      problem: null,
    });
  });
});
