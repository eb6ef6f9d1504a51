import type { Paragraph, RootContent } from 'mdast';

/*
 * What stands in a page's tree where a block was: an empty `div` that names the block by its number, so that the drawings
 * and the ids of lines can be put in after the tree has been made safe.
 */

declare module 'mdast' {
  interface BlockPlace {
    type: 'blockPlace';
    children: RootContent[];
    data: { hName: 'div'; hProperties: { dataBlock?: string; className?: string[] } };
    position?: undefined;
  }
  interface RootContentMap {
    blockPlace: BlockPlace;
  }
  interface BlockContentMap {
    blockPlace: BlockPlace;
  }
}

/**
 * The place of a block.
 * @param index its number in the page's list of blocks
 * @param body a caution's own text; nothing for others
 */
export function blockPlace(index: number, body: RootContent[]): RootContent {
  return { type: 'blockPlace', children: body, data: { hName: 'div', hProperties: { dataBlock: String(index) } } };
}

/** What stands for a block that could not be read: what is wrong with it, then what was written, its first line as code. */
export function unreadPlace(messages: readonly string[], opening: string, written: RootContent[]): RootContent {
  const notes = messages.map((message): Paragraph => ({ type: 'paragraph', children: [{ type: 'text', value: message }] }));
  const first: Paragraph = { type: 'paragraph', children: [{ type: 'inlineCode', value: opening.trim() }] };
  return { type: 'blockPlace', children: [...notes, first, ...written], data: { hName: 'div', hProperties: { className: ['unread'] } } };
}
