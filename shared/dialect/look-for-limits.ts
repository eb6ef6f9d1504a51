import { isContainerName } from './block-names.ts';
import { readLinePrefix, type LinePrefix } from './line-prefix.ts';
import { countCells, isDelimiterRow } from './table-shape.ts';
import type { TextRefusal } from './page-text.ts';
import { textLimits as limits } from './text-limits.ts';

/**
 * Looks, before a text is parsed, for what makes Markdown slow or deep: one pass over its lines, in linear time.
 * Gives the first limit that the text passes, with the line where it does, or null where it may be parsed.
 * It knows Markdown only roughly and errs towards counting too much; `textLimits` are far above any honest page.
 */
export function lookForLimits(markdown: string): TextRefusal | null {
  if (utf8Length(markdown) > limits.bytes) {
    return refusal('length', null, `The page is longer than ${limits.bytes / 1024} kB`, 'Divide it into two pages.');
  }
  const lines = markdown.split(/\r\n|\n|\r/);
  const look = new Look();
  const start = endOfFrontMatter(lines);
  for (let at = start; at < lines.length; at += 1) {
    const found = look.take(lines[at] ?? '', at + 1);
    if (found !== null) return found;
  }
  return null;
}

/** The index of the first line after the front matter; 0 where there is none or it is never closed. */
function endOfFrontMatter(lines: readonly string[]): number {
  if (!/^\uFEFF?---[ \t]*$/.test(lines[0] ?? '')) return 0;
  const end = lines.findIndex((line, at) => at > 0 && /^---[ \t]*$/.test(line));
  return end < 0 ? 0 : end + 1;
}

/** How many bytes a text has in UTF-8. */
function utf8Length(text: string): number {
  let bytes = text.length;
  for (let at = 0; at < text.length; at += 1) {
    const unit = text.charCodeAt(at);
    if (unit >= 0x80) bytes += unit < 0x800 || (unit >= 0xd800 && unit < 0xe000) ? 1 : 2;
  }
  return bytes;
}

function refusal(limit: TextRefusal['limit'], line: number | null, what: string, remedy: string): TextRefusal {
  const where = line === null ? '' : `Line ${line}: `;
  return { limit, message: `${where}${what}. ${remedy}`, line };
}

interface Fence {
  readonly sign: string;
  readonly length: number;
  readonly column: number;
}

const wellFormedOpening = /^:{3,}[a-z]+(?:\{(?:[^"'{}]|"[^"]*"|'[^']*')*\})?[ \t]*$/;

/** What has been seen up to a line. */
class Look {
  #filledLines = 0;
  #beginnings = 0;
  /** Signs of quotes on the line before. */
  #quotesBefore = 0;
  #listItems = 0;
  #tableCells = 0;
  #delimiters = 0;
  #underlinedHeadings = 0;
  #definitions = 0;
  #runOnLines = 0;
  #paragraph = { delimiters: 0, length: 0 };
  /** The list items that are open: at which column their text stands, and whether they are numbered. */
  #lists: { readonly column: number; readonly numbered: boolean }[] = [];
  /** True where the line's own list item surely ends the paragraph before it. */
  #beginsItem = false;
  /** Quotes and notes on the line before, which a line without signs runs on from. */
  #openSigns = 0;
  /** The blocks that are open, from the outermost. */
  #directives: { readonly fence: number; readonly isWellFormed: boolean }[] = [];
  #fence: Fence | null = null;
  #columns = 0;
  #cellsBefore = 0;
  #filledBefore = false;

  take(line: string, number: number): TextRefusal | null {
    const prefix = readLinePrefix(line);
    if (prefix.rest === '' && prefix.listColumns.length === 0 && prefix.notes === 0) {
      this.#endParagraph();
      return this.#depthRefusal(prefix, number);
    }
    this.#filledLines += 1;
    if (this.#filledLines > limits.filledLines) {
      return refusal('length', number, `the page has more than ${limits.filledLines} lines`, 'Divide it into two pages.');
    }
    if (this.#isCode(line, prefix)) return null;
    return (
      this.#depthRefusal(prefix, number) ??
      this.#directiveRefusal(prefix.rest, number) ??
      this.#tableRefusal(prefix, number) ??
      this.#headingRefusal(prefix.rest, number) ??
      this.#definitionRefusal(prefix.rest, number) ??
      this.#runOnRefusal(prefix, number) ??
      this.#delimiterRefusal(prefix, number) ??
      this.#settle(prefix)
    );
  }

  #endParagraph(): void {
    this.#paragraph = { delimiters: 0, length: 0 };
    this.#runOnLines = 0;
    this.#openSigns = 0;
    this.#columns = 0;
    this.#cellsBefore = 0;
    this.#filledBefore = false;
  }

  /** True inside a fence of code, where nothing is read as Markdown. */
  #isCode(line: string, prefix: LinePrefix): boolean {
    const { rest, column } = prefix;
    const open = this.#fence;
    const [, marks = '', info = ''] = /^(`{3,}|~{3,})(.*)$/.exec(rest) ?? [];
    if (open !== null) {
      const plain = prefix.quotes === 0 && prefix.listColumns.length === 0;
      const closes = plain && marks.startsWith(open.sign.repeat(open.length)) && info.trim() === '';
      const left = column < open.column || /^\s{0,3}:{3,}/.test(line);
      if (closes || left) this.#fence = null;
      if (!left) return true;
    }
    const isOpening = marks !== '' && !(marks.startsWith('`') && info.includes('`')) && prefix.quotes === 0;
    const innermost = this.#lists.at(-1)?.column ?? 0;
    if (isOpening && prefix.listColumns.length === 0 && column <= innermost + 3) {
      this.#fence = { sign: marks.charAt(0), length: marks.length, column: Math.min(column, innermost) };
      this.#endParagraph();
      return true;
    }
    return false;
  }

  #depthRefusal(prefix: LinePrefix, number: number): TextRefusal | null {
    this.#openLists(prefix);
    const outer = prefix.quotes - prefix.innerQuotes;
    this.#beginnings += Math.max(0, outer - this.#quotesBefore) + prefix.innerQuotes + prefix.notes;
    this.#quotesBefore = prefix.quotes;
    this.#listItems += prefix.listColumns.length;
    this.#definitions += prefix.notes;
    const depth = prefix.quotes + prefix.notes + Math.max(this.#lists.length, prefix.listColumns.length);
    if (depth > limits.containerDepth) {
      return refusal('depth', number, `more than ${limits.containerDepth} quotes and lists stand inside one another`, 'Take some levels away.');
    }
    if (this.#listItems > limits.listItems) {
      return refusal('run', number, `the page has more than ${limits.listItems} list items`, 'Use a table, or divide the page.');
    }
    if (this.#beginnings <= limits.containerBeginnings) return null;
    const what = `more than ${limits.containerBeginnings} quotes, lists and notes begin on the page`;
    return refusal('run', number, what, 'Use tables, or divide the page.');
  }

  /** Closes the list items that a line is not indented for, and opens those that it begins. */
  #openLists({ listColumns, firstNumber, column, rest }: LinePrefix): void {
    const first = listColumns[0];
    const numbered = firstNumber !== null;
    let followsNumbered = false;
    let isFurther = false;
    while (this.#lists.length > 0) {
      const last = this.#lists.at(-1);
      if (last === undefined || last.column <= (first === undefined ? column : first - 2)) break;
      followsNumbered = last.numbered;
      isFurther = true;
      this.#lists.pop();
    }
    const innermost = this.#lists.at(-1)?.column ?? 0;
    // A line indented by four more, an empty item and a number other than 1 run on as text of the paragraph.
    const mayBegin = !numbered || firstNumber === 1 || followsNumbered;
    this.#beginsItem = first !== undefined && first - 2 <= innermost + 3 && rest !== '' && mayBegin;
    this.#beginnings += Math.max(0, listColumns.length - (isFurther ? 1 : 0));
    for (const at of listColumns.slice(0, limits.containerDepth + 1)) this.#lists.push({ column: at, numbered });
  }

  #directiveRefusal(rest: string, number: number): TextRefusal | null {
    const [, colons = '', name = ''] = /^(:{3,})([a-z]*)/.exec(rest) ?? [];
    if (colons === '') return null;
    if (rest.trim() === colons) {
      const closed = this.#directives.findIndex(({ fence }) => fence <= colons.length);
      // What was no block is text to the parser, and then so are the colons, which do not end a table either.
      if (closed >= 0 && this.#directives.slice(closed).every(({ isWellFormed }) => isWellFormed)) this.#columns = 0;
      if (closed >= 0) this.#directives.length = closed;
    } else if (isContainerName(name)) {
      this.#directives.push({ fence: colons.length, isWellFormed: wellFormedOpening.test(rest) });
    }
    if (this.#directives.length <= limits.directiveDepth) return null;
    const what = `more than ${limits.directiveDepth} blocks stand inside one another`;
    return refusal('directives', number, what, 'Close each block with a line of colons before the next begins.');
  }

  #tableRefusal({ rest }: LinePrefix, number: number): TextRefusal | null {
    if (this.#columns === 0) {
      const cells = countCells(rest);
      if (this.#cellsBefore === cells && isDelimiterRow(rest)) this.#columns = cells;
      this.#cellsBefore = cells;
    }
    if (this.#columns === 0) return null;
    const cells = Math.max(this.#columns, countCells(rest));
    this.#tableCells += cells;
    if (cells > limits.tableColumns) {
      return refusal('columns', number, `a table has more than ${limits.tableColumns} columns`, 'Divide it into two tables.');
    }
    if (this.#tableCells <= limits.tableCells) return null;
    return refusal('columns', number, `the page's tables have more than ${limits.tableCells} cells`, 'Divide the page into two.');
  }

  #headingRefusal(rest: string, number: number): TextRefusal | null {
    if (!this.#filledBefore || this.#columns > 0 || !/^(?:=+|-+)[ \t]*$/.test(rest)) return null;
    this.#underlinedHeadings += 1;
    if (this.#underlinedHeadings <= limits.underlinedHeadings) return null;
    const what = `more than ${limits.underlinedHeadings} headings are made by underlining`;
    return refusal('run', number, what, 'Write headings with `#`, and leave a line empty before a rule.');
  }

  #definitionRefusal(rest: string, number: number): TextRefusal | null {
    if (/^\[[^\]]{0,999}\]:/.test(rest)) this.#definitions += 1;
    if (this.#definitions <= limits.definitions) return null;
    return refusal('run', number, `more than ${limits.definitions} links or notes are defined`, 'Write links where they are used.');
  }

  #runOnRefusal(prefix: LinePrefix, number: number): TextRefusal | null {
    const signs = prefix.quotes + prefix.notes + prefix.listColumns.length;
    const runsOn = signs < this.#openSigns && this.#columns === 0;
    this.#runOnLines = runsOn ? this.#runOnLines + 1 : 0;
    if (!runsOn) this.#openSigns = Math.max(signs, this.#filledBefore ? this.#openSigns : 0);
    if (this.#runOnLines <= limits.runOnLines) return null;
    const what = `more than ${limits.runOnLines} lines run on from a quote or a list`;
    return refusal('run', number, what, 'Leave a line empty where the quote or the list ends.');
  }

  #delimiterRefusal({ rest }: LinePrefix, number: number): TextRefusal | null {
    const ownParagraph = this.#columns > 0 || this.#beginsItem || /^#{1,6}(?:[ \t]|$)/.test(rest);
    if (ownParagraph) this.#paragraph = { delimiters: 0, length: 0 };
    const { delimiters, longest } = weigh(rest);
    this.#delimiters += delimiters;
    this.#paragraph.delimiters += delimiters;
    this.#paragraph.length += rest.length + 1;
    if (longest > limits.unbroken && !(this.#columns > 0 && isDelimiterRow(rest))) {
      return refusal('run', number, `more than ${limits.unbroken} letters stand without a space`, 'Put spaces between them, or shorten the address.');
    }
    const { delimiters: many, length } = this.#paragraph;
    if (many > limits.delimitersInParagraph || many * length > limits.delimitersTimesLength) {
      return refusal('run', number, 'a paragraph has too many brackets, stars, underscores or backquotes to be read', 'Divide it, or put it between lines of ```.');
    }
    if (length > limits.paragraphLength) {
      return refusal('run', number, `a paragraph is longer than ${limits.paragraphLength} characters`, 'Divide it with an empty line.');
    }
    if (this.#delimiters <= limits.delimiters) return null;
    return refusal('run', number, 'the page has too many brackets, stars, underscores and backquotes to be read', 'Divide it into two pages.');
  }

  #settle(prefix: LinePrefix): null {
    this.#filledBefore = prefix.rest !== '';
    return null;
  }
}

const delimiterCodes = new Set([...'*_~[]<`'].map((character) => character.charCodeAt(0)));

/** Counts a line's delimiters, and the longest stretch of visible ASCII in it. */
function weigh(text: string): { delimiters: number; longest: number } {
  let delimiters = 0;
  let longest = 0;
  let stretch = 0;
  for (let at = 0; at < text.length; at += 1) {
    const unit = text.charCodeAt(at);
    if (delimiterCodes.has(unit)) delimiters += 1;
    stretch = unit > 0x20 && unit < 0x7f ? stretch + 1 : 0;
    if (stretch > longest) longest = stretch;
  }
  return { delimiters, longest };
}
