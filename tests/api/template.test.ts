import { describe, expect, test } from 'vitest';
import { fillTemplate, refusalPage } from '../../server/http/template.ts';

const template = '<head><!--head--></head><body><div id="root"><!--page--></div><!--state--></body>';

describe('index.html', () => {
  test('is filled as it is written, whatever a page holds', () => {
    const parts = { head: "<title>$& and $'</title>", body: '<p><!--state--> $1</p>', state: '<script>{}</script>' };
    expect(fillTemplate(template, parts).toString()).toBe(
      '<head><title>$& and $\'</title></head><body><div id="root"><p><!--state--> $1</p></div><script>{}</script></body>',
    );
  });

  test('is refused where a marker is missing', () => {
    expect(() => fillTemplate('<head></head>', { head: '', body: '', state: '' })).toThrow('<!--head-->');
  });
});

test('a refusal is said in words, and nothing of it is markup', () => {
  const page = refusalPage(template, { title: 'A < B & "C"', detail: '<script>alert(1)</script>' }).toString();
  expect(page).toContain('<h1>A &lt; B &amp; &quot;C&quot;</h1>');
  expect(page).toContain('&lt;script&gt;');
  expect(page).not.toContain('<script');
});
