import { expect, test } from 'vitest';
import { passwordBodySchema } from './bodies.ts';
import { readBody } from './read-body.ts';

test('gives what the schema makes of a body', () => {
  const body = { current: 'old enough', next: 'ten letters at least' };
  expect(readBody(passwordBodySchema, body)).toEqual({ ok: true, value: body });
});

test('names each field that is wrong, with the first thing that is wrong with it', () => {
  const read = readBody(passwordBodySchema, { current: '', next: 'short' });
  expect(read).toMatchObject({
    ok: false,
    refusal: {
      status: 422,
      code: 'fields-invalid',
      fields: { current: 'Write the password that you have now.', next: 'Choose at least 10 characters.' },
    },
  });
});

test.each([undefined, null, 'text', 7, []])('refuses %j, which has no fields', (body) => {
  expect(readBody(passwordBodySchema, body)).toMatchObject({ ok: false, refusal: { code: 'fields-invalid' } });
});
