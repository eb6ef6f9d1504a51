import { expect, it } from 'vitest';
import { splitHead } from './document-head.ts';

it('moves what belongs in the head out of the markup, and nothing else', () => {
  const head =
    '<title>A &lt; B</title><meta name="description" content="x > y"/><link rel="canonical" href="/donors"/>';
  const body = '<main><title>not this one</title></main>';
  expect(splitHead(head + body)).toEqual({ head, body });
});

it('leaves markup without a head as it is', () => {
  expect(splitHead('<p>text</p>')).toEqual({ head: '', body: '<p>text</p>' });
});
