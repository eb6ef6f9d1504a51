import type { Root, RootContent } from 'mdast';
import { finding, type Finding } from '../pages/finding.ts';
import { containerNames, isContainerName, isLeafName, leafNames } from './block-names.ts';
import { linesOfNode } from './directive-source.ts';
import type { SourceLines } from './source-lines.ts';

/** A line that was meant to open a block and does not. */
export interface UnreadOpening {
  readonly line: number;
  readonly name: string;
  /** Where, in the text, what follows the name begins and ends; null where putting that right would not make it a block. */
  readonly attributes: { readonly from: number; readonly to: number } | null;
  readonly finding: Finding;
}

/**
 * Finds the lines of paragraphs that begin like one of the book's blocks and were not read as one: attributes that do not
 * parse, two colons for three, a name with a letter wrong. Text in code is left alone.
 */
export function findUnreadOpenings(tree: Root, source: SourceLines): readonly UnreadOpening[] {
  const found: UnreadOpening[] = [];
  const visit = (node: Root | RootContent): void => {
    if (node.type === 'paragraph') {
      const { line, endLine } = linesOfNode(node);
      for (let at = line; at <= endLine; at += 1) {
        const opening = readOpening(source, at);
        if (opening !== null) found.push(opening);
      }
    } else if ('children' in node) {
      node.children.forEach(visit);
    }
  };
  visit(tree);
  return found;
}

function readOpening(source: SourceLines, line: number): UnreadOpening | null {
  const text = source.lines[line - 1] ?? '';
  const match = /^([\s>]*)(:{2,})([A-Za-z-]{4,24})(?=[\s{[]|$)(.*)$/.exec(text);
  if (match === null) return null;
  const [, before = '', colons = '', name = '', after = ''] = match;
  const unread = (message: string, attributes: UnreadOpening['attributes'] = null): UnreadOpening => ({
    line,
    name,
    attributes,
    finding: finding('block-unreadable', message, line),
  });
  if (isContainerName(name) && colons.length >= 3) {
    const from = (source.offsets[line - 1] ?? 0) + before.length + colons.length + name.length;
    const message = `The attributes of this ${name} block cannot be read. Look for a quote or a brace that is missing, or words after the brace: \`:::${name}{#an-id name="A name"}\`.`;
    return unread(message, after.trim() === '' ? null : { from, to: from + after.length });
  }
  if (isContainerName(name)) {
    return unread(`A ${name} block begins with three colons, \`:::${name}\`, and ends with a line of three.`);
  }
  if (isLeafName(name)) {
    return unread(`A ${name} stands on one line of its own, with two colons: \`::${name}{name="wire-size" current="9" length="2.4"}\`.`);
  }
  const meant = colons.length >= 3 && after.trimStart().startsWith('{') ? nearName(name) : null;
  return meant === null ? null : unread(`\`:::${name}\` is no block of the book, so it is shown as it is written. Is \`:::${meant}\` meant?`);
}

/** The block's name that a word comes close to: another case, or one letter too many, too few or wrong. */
function nearName(word: string): string | null {
  const plain = word.toLowerCase();
  return [...containerNames, ...leafNames].find((name) => name.length > 4 && differsByOne(plain, name)) ?? null;
}

function differsByOne(one: string, other: string): boolean {
  let start = 0;
  while (start < one.length && start < other.length && one.charAt(start) === other.charAt(start)) start += 1;
  let end = 0;
  const shorter = Math.min(one.length, other.length) - start;
  while (end < shorter && one.charAt(one.length - 1 - end) === other.charAt(other.length - 1 - end)) end += 1;
  return Math.max(one.length, other.length) - start - end <= 1;
}
