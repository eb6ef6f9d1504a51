/** How bad a finding is: `stop` blocks publication unless a moderator overrides it with a reason. */
export type Severity = 'stop' | 'warn' | 'hint';

/** The findings that one page by itself can have, with their severity. */
export const pageFindingSeverities = {
  'block-unreadable': 'stop',
  'id-repeated': 'stop',
  'cavity-repeated': 'stop',
  'cavity-outside-face': 'stop',
  'colour-unknown': 'warn',
  'colour-ambiguous': 'warn',
  'face-unoriented': 'hint',
  'expect-unreadable': 'warn',
  'caution-missing': 'warn',
  uncited: 'hint',
  'html-left-out': 'hint',
} as const satisfies Record<string, Severity>;

/** The code of a finding. */
export type FindingCode = keyof typeof pageFindingSeverities;

/** Something that the program noticed in a page. */
export interface Finding {
  readonly code: FindingCode;
  readonly severity: Severity;
  /** In words that a hobbyist understands: what, where, and what settles it. */
  readonly message: string;
  /** Line of the page's text, counted from 1 with the front matter. */
  readonly line: number;
  /** The line's or block's address, `#headlight.3`; absent where it has none. */
  readonly address?: string;
  readonly path?: readonly string[];
  readonly applies?: string;
}

/** Makes a finding of a page with the severity that belongs to its code. */
export function finding(code: FindingCode, message: string, line: number, address?: string): Finding {
  const severity = pageFindingSeverities[code];
  return address === undefined ? { code, severity, message, line } : { code, severity, message, line, address };
}
