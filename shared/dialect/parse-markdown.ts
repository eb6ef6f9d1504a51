import type { Root } from 'mdast';
import { remark } from 'remark';
import remarkDirective from 'remark-directive';
import remarkFrontmatter from 'remark-frontmatter';
import remarkGfm from 'remark-gfm';
import type { Processor } from 'unified';
import { ownDirectivesOnly } from './own-directives.ts';

const base = remark()
  // A single `~` is a range (13.8~14.6 V), not strikethrough.
  .use(remarkGfm, { singleTilde: false })
  .use(remarkFrontmatter, ['yaml'])
  .use(remarkDirective)
  .use(ownDirectivesOnly)
  .use(leaveOut)
  .freeze();
const parser = base().freeze();
const parserWithoutLateAddresses = base().use(leaveOutLateAddresses).freeze();

/** What a text must have for an address to be found in it after tokenizing: as it is, or as a character reference. */
const mayHoldAddress = /@|www|http|&(?:#|commat;)/i;

/**
 * Leaves two things of the parser out. HTML as a block of its own: without it the words between tags are Markdown like
 * all others. E-mail addresses while tokenizing: that looks back over the paragraph at every word, and they are found
 * afterwards as well.
 */
function leaveOut(this: Processor): undefined {
  const data = this.data();
  data.micromarkExtensions = [...(data.micromarkExtensions ?? []), { disable: { null: ['htmlFlow', 'emailAutolink'] } }];
}

/** Leaves out the look for addresses after tokenizing: it walks the whole tree, and few pages have any. */
function leaveOutLateAddresses(this: Processor): undefined {
  const data = this.data();
  data.fromMarkdownExtensions = (data.fromMarkdownExtensions ?? []).map((extensions) =>
    [extensions].flat().map((extension) => ({ ...extension, transforms: [] })),
  );
}

/**
 * Parses a page's Markdown in the book's dialect: CommonMark, GFM, YAML front matter, and the directives that are
 * blocks. Takes any text that `lookForLimits` lets pass; positions are of the text as given.
 */
export function parseMarkdown(markdown: string): Root {
  return (mayHoldAddress.test(markdown) ? parser : parserWithoutLateAddresses).parse(markdown);
}
