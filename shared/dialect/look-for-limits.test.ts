import { describe, expect, it } from 'vitest';
import { lookForLimits } from './look-for-limits.ts';
import { textLimits } from './text-limits.ts';

const table = '| Cavity | Wire |\n| ------ | ---- |\n| 1 | B |\n';

describe('The look before a text is parsed', () => {
  it('lets an ordinary page pass', () => {
    const page = `---\ntitle: A\n---\n\nText with [a link](#a.1), **weight** and \`code\`.\n\n:::connector{#a}\n${table}:::\n`;
    expect(lookForLimits(page)).toBeNull();
  });

  it('lets a page of exactly 64 kB pass and refuses one byte more, counted in UTF-8', () => {
    const lines = `${'word '.repeat(20).trim()}\n\n`;
    const page = lines.repeat(Math.floor(textLimits.bytes / lines.length)).padEnd(textLimits.bytes, ' ');
    expect(lookForLimits(page)).toBeNull();
    expect(lookForLimits(`${page} `)).toMatchObject({ limit: 'length', line: null });
    expect(lookForLimits(`${page.slice(0, -1)}Ω`)).toMatchObject({ limit: 'length' });
    expect(lookForLimits(`${page.slice(0, -4)}😀`)).toBeNull();
    expect(lookForLimits(`${page.slice(0, -3)}😀`)).toMatchObject({ limit: 'length' });
  });

  it('allows quotes twelve deep, and names the line where a thirteenth begins', () => {
    expect(lookForLimits(`Text.\n\n${'> '.repeat(12)}deep\n`)).toBeNull();
    expect(lookForLimits(`Text.\n\n${'> '.repeat(13)}deep\n`)).toMatchObject({ limit: 'depth', line: 3 });
    expect(lookForLimits('>'.repeat(2000))).toMatchObject({ limit: 'depth', line: 1 });
    expect(lookForLimits(`${'- '.repeat(13)}a`)).toMatchObject({ limit: 'depth', line: 1 });
    const steps = Array.from({ length: 13 }, (_, depth) => `${'  '.repeat(depth)}- a`).join('\n');
    expect(lookForLimits(steps)).toMatchObject({ limit: 'depth', line: 13 });
  });

  it('takes a rule for a rule and not for lists inside lists', () => {
    expect(lookForLimits(`${'- '.repeat(40)}\n\n${'* '.repeat(40)}\n`)).toBeNull();
  });

  it('allows blocks four deep, and names the line of the fifth', () => {
    const nested = (depth: number): string =>
      Array.from({ length: depth }, (_, at) => `${':'.repeat(12 - at)}hazard{signal="notice"}`).join('\n');
    expect(lookForLimits(nested(4))).toBeNull();
    expect(lookForLimits(nested(5))).toMatchObject({ limit: 'directives', line: 5 });
    expect(lookForLimits(':::hazard\na\n:::\n\n'.repeat(40))).toBeNull();
    expect(lookForLimits(':::note\n'.repeat(40))).toBeNull();
  });

  it('allows tables of 24 columns and no more', () => {
    const wide = (columns: number): string => `${'| a '.repeat(columns)}|\n${'| - '.repeat(columns)}|\n`;
    expect(lookForLimits(wide(24))).toBeNull();
    expect(lookForLimits(`Text.\n\n${wide(25)}`)).toMatchObject({ limit: 'columns', line: 4 });
    expect(lookForLimits(`${wide(24)}${'| a '.repeat(25)}|\n`)).toMatchObject({ limit: 'columns', line: 3 });
    expect(lookForLimits(`Pipes in text ${'| a '.repeat(60)}\n`)).toBeNull();
  });

  it('counts the cells that short rows will be filled up to', () => {
    const page = `${'| a '.repeat(24)}|\n${'| - '.repeat(24)}|\n${'| b |\n'.repeat(600)}`;
    expect(lookForLimits(page)).toMatchObject({ limit: 'columns', line: 502 });
  });

  it('bounds the delimiters of a paragraph, but not of code, nor of a table or list as a whole', () => {
    expect(lookForLimits('*a '.repeat(301))).toMatchObject({ limit: 'run', line: 1 });
    expect(lookForLimits(`\`\`\`\n${'*a '.repeat(301)}\n\`\`\`\n`)).toBeNull();
    expect(lookForLimits('| `a` | [b](c) |\n'.replace(/^/, '| a | b |\n| - | - |\n') + '| `a` | [b](c) |\n'.repeat(200))).toBeNull();
    expect(lookForLimits('- [a](b) `c`\n'.repeat(200))).toBeNull();
    expect(lookForLimits(`a\n${'   - *_*_*_*_*_*\n'.repeat(60)}`)).toBeNull();
    expect(lookForLimits(`a\n${'     - *_*_*_*_*_*\n'.repeat(60)}`)).toMatchObject({ limit: 'run' });
  });

  it('is not led to take text for code', () => {
    const much = '*a '.repeat(301);
    expect(lookForLimits(`\`\`\` a\`b\n${much}\n`)).toMatchObject({ limit: 'run' });
    expect(lookForLimits(`> \`\`\`\n${much}\n`)).toMatchObject({ limit: 'run' });
    expect(lookForLimits(`\`\`\`\n> \`\`\`\n\`\`\`\n${much}\n`)).toMatchObject({ limit: 'run' });
    expect(lookForLimits(`- a\n  \`\`\`\nb\n${much}\n`)).toMatchObject({ limit: 'run' });
    expect(lookForLimits(`---\n${much}\n`)).toMatchObject({ limit: 'run' });
  });

  it('bounds letters without a space', () => {
    expect(lookForLimits(`https://example.org/${'a'.repeat(900)}`)).toBeNull();
    expect(lookForLimits('a'.repeat(1001))).toMatchObject({ limit: 'run', line: 1 });
    expect(lookForLimits('漢'.repeat(1001))).toBeNull();
  });

  it('bounds lines that run on from a quote or a list', () => {
    expect(lookForLimits(`> a\n${'b\n'.repeat(151)}`)).toMatchObject({ limit: 'run', line: 152 });
    expect(lookForLimits(`> a\n${'b\n'.repeat(100)}\n${'b\n'.repeat(400)}`)).toBeNull();
  });

  it('bounds underlined headings, list items, definitions and notes', () => {
    expect(lookForLimits('a\n===\n\n'.repeat(151))).toMatchObject({ limit: 'run' });
    expect(lookForLimits('- a\n'.repeat(1501))).toMatchObject({ limit: 'run' });
    expect(lookForLimits('[a]: b\n\n'.repeat(401))).toMatchObject({ limit: 'run' });
    expect(lookForLimits('[^a]: b\n\n'.repeat(401))).toMatchObject({ limit: 'run' });
  });

  it('says in one sentence what the limit is and in another what to do', () => {
    const refusal = lookForLimits(`Text.\n\n${'> '.repeat(13)}deep\n`);
    expect(refusal?.message).toBe('Line 3: more than 12 quotes and lists stand inside one another. Take some levels away.');
  });
});
