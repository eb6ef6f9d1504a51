/**
 * How much a page's text may hold (design, section 14: hostile Markdown). Each number is far above what an honest page
 * has, and low enough that a text within all of them is parsed in about two seconds on a slow machine; the test of
 * tests/fixtures/slow-inputs.ts guards them. Counts are of one page unless the name says otherwise.
 */
export const textLimits = {
  /** In UTF-8. */
  bytes: 64 * 1024,
  /** Lines that are not empty: the parser's cost is by the line as much as by the byte. */
  filledLines: 4000,
  /** Quotes, lists and notes inside one another. */
  containerDepth: 12,
  listItems: 1500,
  /** Quotes, lists and notes that begin: for each the parser moves all that it has read since. Further items count nothing. */
  containerBeginnings: 600,
  /** Blocks (`:::`) inside one another. */
  directiveDepth: 4,
  tableColumns: 24,
  /** Rows times columns, over all tables: short rows are filled up, so few bytes make many cells. */
  tableCells: 12_000,
  /** Brackets, stars, underscores, backquotes and the like in one paragraph, list item or cell. */
  delimitersInParagraph: 300,
  /** In characters: some signs make the parser look back over all of the paragraph at every word. */
  paragraphLength: 16_000,
  /** Delimiters, times the paragraph's length in characters: each may be compared with all that follows it. */
  delimitersTimesLength: 3_000_000,
  delimiters: 8000,
  /** Letters without a space between them; a long address of a web page has about 500. */
  unbroken: 1000,
  /** Lines that run on from a quote or a list without its sign. */
  runOnLines: 150,
  /** Headings that are made by underlining. */
  underlinedHeadings: 150,
  /** Definitions of links and of notes. */
  definitions: 400,
} as const;
