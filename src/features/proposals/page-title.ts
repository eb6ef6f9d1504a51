import { slugOf } from '../../../shared/lib/slug.ts';

/** The title that a text's front matter gives its page; empty where it gives none. */
export function titleOf(markdown: string): string {
  const frontMatter = /^---[ \t]*\n([\s\S]*?)\n---/.exec(markdown)?.[1] ?? '';
  const written = /^title:[ \t]*(.*)$/m.exec(frontMatter)?.[1]?.trim() ?? '';
  return /^(["'])(.*)\1$/.exec(written)?.[2] ?? written;
}

/**
 * The address that a text's title suggests.
 * @param placeholder a skeleton's title that stands for one, and suggests nothing; empty where it is a title of its own
 */
export function suggestedAddress(title: string, placeholder: string): string {
  return title === placeholder ? '' : slugOf(title);
}
