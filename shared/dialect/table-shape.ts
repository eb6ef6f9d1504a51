/** How many cells a row has, by its pipes that no backslash escapes; 0 where it has no pipe and is no delimiter row. */
export function countCells(row: string): number {
  const text = row.trim();
  let pipes = 0;
  let lastPipe = -1;
  for (let at = 0; at < text.length; at += 1) {
    const character = text.charAt(at);
    if (character === '\\') at += 1;
    else if (character === '|') {
      pipes += 1;
      lastPipe = at;
    }
  }
  if (text === '') return 0;
  return pipes + 1 - (text.startsWith('|') ? 1 : 0) - (lastPipe === text.length - 1 && text.length > 1 ? 1 : 0);
}

/** True where a line can be what stands under a table's headings: hyphens, colons and pipes. */
export function isDelimiterRow(row: string): boolean {
  return /^[-:| \t]+$/.test(row) && row.includes('-') && /[|:]/.test(row);
}
