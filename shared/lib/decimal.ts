/** The text of a decimal, for building patterns that find numbers among other text; it has no groups. */
export const decimalPattern = String.raw`[-−+]?(?:\d+(?:[.,]\d+)?|[.,]\d+)`;

const wholeDecimal = new RegExp(`^${decimalPattern}$`);
const thousandsOrDecimals = /^[-−+]?[1-9]\d{0,2},\d{3}$/;

/**
 * Reads a number written with a decimal point or a decimal comma: `0.85`, `0,85`, `.5`, `−3`.
 * Gives null for anything else, and for `1,000`, which is a thousand to one reader and one to another.
 */
export function readDecimal(text: string): number | null {
  const trimmed = text.trim();
  if (!wholeDecimal.test(trimmed) || thousandsOrDecimals.test(trimmed)) return null;
  const value = Number(trimmed.replace('−', '-').replace(',', '.'));
  return Number.isFinite(value) ? value : null;
}
