import { IncomingMessage } from 'node:http';
import { Socket } from 'node:net';
import { describe, expect, test } from 'vitest';
import { isCrossSite } from '../../server/http/cross-site.ts';

function ask(method: string, headers: Record<string, string>): IncomingMessage {
  return Object.assign(new IncomingMessage(new Socket()), { method, headers });
}

describe('behind TLS, a request that changes something', () => {
  const base = new URL('https://book.example');
  const ours = 'https://book.example';

  test.each([
    ['with our origin passes', { origin: ours }, false],
    ['with the browser saying that it is ours passes', { 'sec-fetch-site': 'same-origin' }, false],
    ['from a page of ours without a referrer passes', { origin: 'null', 'sec-fetch-site': 'same-origin' }, false],
    ['that says nothing is refused', {}, true],
    ['from another site is refused', { origin: 'https://elsewhere.example' }, true],
    ['from a subdomain is refused', { origin: 'https://www.book.example', 'sec-fetch-site': 'same-site' }, true],
    ['by the same name without TLS is refused', { origin: 'http://book.example', host: 'book.example' }, true],
    ['from a frame without an origin is refused', { origin: 'null' }, true],
    ['typed into the address bar is refused', { 'sec-fetch-site': 'none' }, true],
    [
      'that the browser calls another site’s is refused, whatever its origin',
      { origin: ours, 'sec-fetch-site': 'cross-site' },
      true,
    ],
    ['with an origin that only begins like ours is refused', { origin: `${ours}.elsewhere.example` }, true],
  ])('%s', (_, headers, refused) => {
    for (const method of ['POST', 'PUT', 'DELETE', 'PATCH'])
      expect(isCrossSite(ask(method, headers), base)).toBe(refused);
  });

  test.each(['GET', 'HEAD', 'OPTIONS'])('is not what %s is', (method) => {
    expect(isCrossSite(ask(method, { origin: 'https://elsewhere.example' }), base)).toBe(false);
  });
});

describe('without TLS, where the site has several names', () => {
  const base = new URL('http://127.0.0.1:3000');

  test('the name that the browser asked for passes', () => {
    expect(isCrossSite(ask('POST', { origin: 'http://localhost:3000', host: 'localhost:3000' }), base)).toBe(false);
    expect(isCrossSite(ask('POST', { origin: 'http://127.0.0.1:3000', host: 'localhost:3000' }), base)).toBe(false);
  });

  test('another name or port is refused', () => {
    expect(isCrossSite(ask('POST', { origin: 'http://localhost:4000', host: 'localhost:3000' }), base)).toBe(true);
    expect(isCrossSite(ask('POST', { origin: 'http://elsewhere.example', host: 'localhost:3000' }), base)).toBe(true);
  });
});
