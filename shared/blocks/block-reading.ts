import { isSlug } from '../lib/slug.ts';
import { shortened } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import { colourSystemNames, type ColourSystem } from '../wire-colours/colour-system.ts';
import type { Block } from './block.ts';
import type { SourceBlock, SourceTable } from './source-table.ts';

/** What came of reading a directive: the block, or null where too little of it could be read, and what was found. */
export interface BlockReading {
  readonly block: Block | null;
  readonly findings: readonly Finding[];
}

/** What a block takes from its page. */
export interface PageOfBlock {
  readonly colours: ColourSystem;
}

/** What every block has from its directive alone. */
export interface BlockHead {
  readonly id: string | null;
  readonly name: string | null;
  readonly cite: string | null;
  readonly line: number;
  readonly endLine: number;
  readonly otherAttributes: Readonly<Record<string, string>>;
}

/** Ids are slugs, but not `check`, which addresses of checks begin with, nor `s-…`, which headings' anchors have. */
export function isBlockId(text: string): boolean {
  return isSlug(text) && text !== 'check' && !text.startsWith('s-');
}

/** What an id has to be, for findings. */
export const idExpected = 'lower-case words with hyphens between them, not `check` and not beginning with `s-`';

/** An attribute's text; null where it is absent or empty. */
export function attribute(source: SourceBlock, name: string): string | null {
  const text = source.attributes[name]?.trim() ?? '';
  return text === '' ? null : text;
}

/** What a block is called in findings: its id, or its kind where it has none. */
export function blockLabel(source: SourceBlock): string {
  return source.id === null ? `This ${source.name} block` : `The ${source.name} block \`${shortened(source.id)}\``;
}

/** Reads what every block has; attributes that nobody reads are kept. */
export function readHead(source: SourceBlock, readAttributes: readonly string[]): BlockHead {
  const read = new Set(['id', 'name', 'cite', ...readAttributes]);
  const others = Object.entries(source.attributes).filter(([name]) => !read.has(name));
  return {
    id: source.id,
    name: attribute(source, 'name'),
    cite: attribute(source, 'cite'),
    line: source.line,
    endLine: source.endLine,
    otherAttributes: Object.fromEntries(others),
  };
}

/** A block that cannot be read, and why. */
export function unreadable(source: SourceBlock, message: string, line = source.line): Finding {
  const address = source.id === null ? undefined : `#${source.id}`;
  return finding('block-unreadable', `${blockLabel(source)} ${message}`, line, address);
}

/** The block's id, or null with a finding where it has none that other blocks could name. */
export function requireId(source: SourceBlock, findings: Finding[]): string | null {
  if (source.id !== null && isBlockId(source.id)) return source.id;
  const message = source.id === null ? 'has no id.' : 'has an id that no terminal can be named by.';
  findings.push(unreadable(source, `${message} Write one as in \`${source.name}{#tail-loom}\`: ${idExpected}.`));
  return null;
}

/** The block's table, or null with a finding where it has none. */
export function requireTable(source: SourceBlock, example: string, findings: Finding[]): SourceTable | null {
  if (source.table === null) {
    findings.push(unreadable(source, `has no table. Begin it with ${example} and a row of hyphens under it.`));
  }
  return source.table;
}

/** One of several words that an attribute may have; null, with a finding, where it is another. */
export function oneOf<Name extends string>(
  source: SourceBlock,
  name: string,
  names: readonly Name[],
  findings: Finding[],
): Name | null {
  const text = attribute(source, name);
  if (text === null) return null;
  const plain = text.toLowerCase().replace(/[\s_-]+/g, ' ');
  const found = names.find((candidate) => candidate.replace(/-/g, ' ') === plain);
  if (found === undefined) {
    findings.push(
      unreadable(
        source,
        `has \`${name}="${shortened(text)}"\`, which is not known. Write one of: ${names.join(', ')}.`,
      ),
    );
  }
  return found ?? null;
}

/** The colour system of a block: its own `colours`, else its page's. */
export function readColours(source: SourceBlock, page: PageOfBlock, findings: Finding[]): ColourSystem {
  const text = attribute(source, 'colours');
  if (text === null) return page.colours;
  const name = colourSystemNames.find((candidate) => candidate === text.toLowerCase());
  if (name === undefined) {
    findings.push(
      unreadable(
        source,
        `has \`colours="${shortened(text)}"\`, which is not known. Write one of: ${colourSystemNames.join(', ')}.`,
      ),
    );
    return page.colours;
  }
  if (name !== 'own') return { name };
  if (page.colours.name !== 'own') {
    findings.push(
      unreadable(
        source,
        'has `colours="own"`, but the page has no key. Put `colours: own` and a `colour-key` in its front matter.',
      ),
    );
  }
  return page.colours;
}
