const fence = /^\s*(:{3,})(.*)$/;

/**
 * The words of a Markdown text without its signs: for a caution that travels to where no Markdown is shown. Directives
 * inside it, with their tables, are left out: they are blocks of their own.
 */
export function plainWords(markdown: string): string {
  return linesOutsideDirectives(markdown)
    .join(' ')
    .replace(/!?\[([^[\]]{0,300})\]\([^()]{0,300}\)/g, '$1')
    .replace(/<\/?[a-z][^<>]{0,300}>/gi, '')
    .replace(/(\*\*|__|~~|\*|`)(\S(?:.{0,300}?\S)?)\1/g, '$2')
    .replace(/\\([!-/:-@[-`{-~])/g, '$1')
    .replace(/\s+/g, ' ')
    .trim();
}

function linesOutsideDirectives(markdown: string): readonly string[] {
  const kept: string[] = [];
  let open: number | null = null;
  for (const line of markdown.split(/\r\n|\n|\r/)) {
    const match = fence.exec(line);
    const colons = match?.[1]?.length ?? 0;
    const isClosing = match !== null && match[2]?.trim() === '';
    if (open !== null) {
      if (isClosing && colons >= open) open = null;
    } else if (match !== null && !isClosing) {
      open = colons;
    } else if (!isClosing && !line.trimStart().startsWith('|')) {
      kept.push(line.replace(/^\s*(?:[-*+]|\d{1,9}[.)]|>|#{1,6})\s+/, ''));
    }
  }
  return kept;
}
