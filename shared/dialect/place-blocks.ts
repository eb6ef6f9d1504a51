import type { Root, RootContent, TableRow } from 'mdast';
import { toString } from 'mdast-util-to-string';
import type { Block } from '../blocks/block.ts';
import type { PageOfBlock } from '../blocks/block-reading.ts';
import { readBlock } from '../blocks/read-block.ts';
import { finding, type Finding } from '../pages/finding.ts';
import { blockPlace, unreadPlace } from './block-place.ts';
import { directiveSource, isOwnDirective, linesOfNode, type DirectiveSource, type OwnDirective } from './directive-source.ts';
import type { SourceLines } from './source-lines.ts';

/** The blocks of a page in the order of its text, and what was found on the way. */
export interface PlacedBlocks {
  readonly blocks: readonly Block[];
  readonly findings: readonly Finding[];
}

/** What blocks are read with. */
export interface PlacingContext {
  readonly source: SourceLines;
  readonly page: PageOfBlock;
  /** What is wrong with the openings whose attributes do not parse, by their lines: such a block is shown and not read. */
  readonly unreadOpenings: ReadonlyMap<number, string>;
}

/**
 * Reads every directive of a parsed page as a block and puts a place in its stead, in the tree itself. What stands inside
 * a block beside its table follows the place; a block inside another is read as if it stood outside, after it.
 */
export function placeBlocks(tree: Root, context: PlacingContext): PlacedBlocks {
  const placing = new Placing(context);
  placing.walk(tree);
  return { blocks: placing.blocks, findings: placing.findings };
}

class Placing {
  readonly blocks: Block[] = [];
  readonly findings: Finding[] = [];
  readonly #context: PlacingContext;
  /** How many lines of colons are left over from blocks that another block inside them closed. */
  #strayFences = 0;

  constructor(context: PlacingContext) {
    this.#context = context;
  }

  walk(node: Root | RootContent): void {
    if (!('children' in node)) return;
    const children: RootContent[] = [];
    for (const child of node.children) {
      if (isOwnDirective(child)) children.push(...this.#place(child, false));
      else {
        if (this.#strayFences > 0 && this.#isOnlyStrayFence(child)) continue;
        this.walk(child);
        children.push(child);
      }
    }
    // What takes a directive's place is flow content, and so may stand wherever it stood.
    node.children.splice(0, node.children.length, ...(children as typeof node.children));
  }

  /** Gives what stands in a directive's stead. `closedByHolder`: no line of colons of its own is looked for. */
  #place(node: OwnDirective, closedByHolder: boolean): readonly RootContent[] {
    const source = directiveSource(node, this.#context.source);
    const { block: written } = source;
    const inner = node.type === 'containerDirective' ? node.children.filter(isOwnDirective) : [];
    const closers = this.#closingTooEarly(source, inner);
    if (!source.closed && !closedByHolder) {
      const message = `This ${written.name} block is never closed. Put a line of ${source.fence} colons under it.`;
      this.findings.push(finding('block-unreadable', message, written.line, addressOf(source)));
    }
    const unread = this.#context.unreadOpenings.get(written.line);
    const reading = unread === undefined ? readBlock(written, this.#context.page) : { block: null, findings: [] };
    this.findings.push(...reading.findings, ...this.#secondTable(node, source));
    const rest = node.children.filter((child): child is Exclude<typeof child, OwnDirective> => !isOwnDirective(child));
    const place: RootContent[] = [];
    if (reading.block === null) {
      const messages = unread === undefined ? reading.findings.map(({ message }) => message) : [unread];
      place.push(unreadPlace(messages, source.opening, rest));
    } else {
      const index = this.blocks.push(reading.block) - 1;
      if (reading.block.kind === 'hazard') place.push(blockPlace(index, rest));
      else place.push(...aroundTable(rest, written.table !== null, blockPlace(index, [])));
    }
    for (const child of rest) this.walk(child);
    return [...place, ...inner.flatMap((child) => this.#place(child, closers.has(child)))];
  }

  /** A fence inside another of the same length closes the outer one: says so, and which blocks did. */
  #closingTooEarly(outer: DirectiveSource, inner: readonly OwnDirective[]): ReadonlySet<OwnDirective> {
    const closers = new Set<OwnDirective>();
    for (const child of inner) {
      const { block, fence } = directiveSource(child, this.#context.source);
      if (child.type !== 'containerDirective' || fence < outer.fence) continue;
      closers.add(child);
      this.#strayFences += 1;
      const { name, line } = outer.block;
      const longer = ':'.repeat(fence + 1);
      const message = `The colons that end the ${block.name} block of line ${block.line} also end the ${name} block of line ${line}, which holds it. Begin and end the outer one with ${fence + 1} colons (\`${longer}${name}\`), or close it with its own line of colons before line ${block.line}.`;
      this.findings.push(finding('block-unreadable', message, line, addressOf(outer)));
    }
    return closers;
  }

  /** Takes a line of colons that is left over out of a paragraph or a table; true where nothing else stood there. */
  #isOnlyStrayFence(node: RootContent): boolean {
    if (node.type === 'table') {
      const at = node.children.findIndex((row) => isStrayRow(row));
      if (at > 0) {
        node.children.splice(at, 1);
        this.#strayFences -= 1;
      }
      return false;
    }
    if (node.type !== 'paragraph') return false;
    const at = node.children.findIndex((child) => child.type === 'text' && strayFence.test(child.value));
    const text = node.children[at];
    if (text?.type !== 'text') return false;
    this.#strayFences -= 1;
    text.value = text.value.replace(strayFence, '').replace(/^\n+/, '');
    return node.children.length === 1 && text.value.trim() === '';
  }

  #secondTable(node: OwnDirective, { block }: DirectiveSource): readonly Finding[] {
    if (block.name === 'hazard') return [];
    const [, second] = node.children.filter((child): child is Extract<typeof child, { type: 'table' }> => String(child.type) === 'table');
    if (second === undefined) return [];
    const message = `This ${block.name} block has a second table, which is shown and not read. Give each table a block of its own.`;
    return [finding('block-unreadable', message, linesOfNode(second).line)];
  }
}

const strayFence = /(?:^|\n):{3,}[ \t]*(?=\n|$)/;

function isStrayRow({ children }: TableRow): boolean {
  return children.length === 1 && /^:{3,}$/.test(toString(children).trim());
}

/** What stands inside a block before its table comes before the block, the rest after it. */
function aroundTable(rest: readonly RootContent[], hasTable: boolean, place: RootContent): readonly RootContent[] {
  const table = hasTable ? rest.findIndex(({ type }) => type === 'table') : -1;
  return table < 0 ? [place, ...rest] : [...rest.slice(0, table), place, ...rest.slice(table + 1)];
}

function addressOf({ block }: DirectiveSource): string | undefined {
  return block.id === null ? undefined : `#${block.id}`;
}
