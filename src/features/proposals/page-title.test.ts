import { expect, test } from 'vitest';
import { addressProblem } from './address-problem.ts';
import { suggestedAddress, titleOf } from './page-title.ts';

test.each([
  ['---\ntitle: Front connectors\nkind: pinouts\n---\n', 'Front connectors'],
  ['---\nkind: notes\ntitle: "Notes: the second bike"\n---\n', 'Notes: the second bike'],
  ["---\ntitle: 'Kestova''s 360'\n---\n", "Kestova''s 360"],
  ['---\ntitle:\n---\n', ''],
  ['title: not in the front matter', ''],
  ['---\ntitle: no end', ''],
  ['', ''],
])('the title of %j is %j', (markdown, title) => {
  expect(titleOf(markdown)).toBe(title);
});

test('suggests an address of a title, and none of a skeleton’s', () => {
  expect(suggestedAddress('Sörvik Strand 650', 'Maker and model')).toBe('sorvik-strand-650');
  expect(suggestedAddress('Maker and model', 'Maker and model')).toBe('');
});

test.each([
  ['', null],
  ['torimachi-qf551', null],
  ['QF 550', /lower-case/],
  ['new', /uses “new” itself/],
  ['findings', /uses “findings” itself/],
  ['torimachi-qf550', /a donor of this address already/],
])('the address %j', (slug, problem) => {
  const found = addressProblem(slug, ['torimachi-qf550'], 'donor');
  if (problem === null) expect(found).toBeNull();
  else expect(found).toMatch(problem);
});
