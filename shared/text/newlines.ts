/** A text whose lines end as the book keeps them: a form sends `\r\n` wherever the writer sees one new line. */
export function withBookNewlines(text: string): string {
  return text.replace(/\r\n?/g, '\n');
}
