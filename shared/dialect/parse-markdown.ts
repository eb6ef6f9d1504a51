import type { Root } from 'mdast';
import remarkDirective from 'remark-directive';
import remarkFrontmatter from 'remark-frontmatter';
import remarkGfm from 'remark-gfm';
import remarkParse from 'remark-parse';
import { unified, type Processor } from 'unified';
import { ownDirectivesOnly } from './own-directives.ts';

const parser = unified()
  .use(remarkParse)
  // A single `~` is a range (13.8~14.6 V), not strikethrough.
  .use(remarkGfm, { singleTilde: false })
  .use(remarkFrontmatter, ['yaml'])
  .use(remarkDirective)
  .use(ownDirectivesOnly)
  .use(leaveOut)
  .freeze();

/**
 * Leaves two things of the parser out. HTML as a block of its own: without it the words between tags are Markdown like
 * all others. E-mail addresses while tokenizing: that looks back over the paragraph at every word, and they are found
 * afterwards as well.
 */
function leaveOut(this: Processor): undefined {
  const data = this.data();
  data.micromarkExtensions = [...(data.micromarkExtensions ?? []), { disable: { null: ['htmlFlow', 'emailAutolink'] } }];
}

/**
 * Parses a page's Markdown in the book's dialect: CommonMark, GFM, YAML front matter, and the directives that are
 * blocks. Takes any text that `lookForLimits` lets pass; positions are of the text as given.
 */
export function parseMarkdown(markdown: string): Root {
  return parser.parse(markdown);
}
