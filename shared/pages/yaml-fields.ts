import { isMap, isNode, isScalar, LineCounter, parseDocument, type Document } from 'yaml';
import { shortened } from '../lib/quoted.ts';

/** A mapping's values by their names. */
export type Fields = Readonly<Record<string, unknown>>;

/** A YAML text as fields: what could be read of it, where each stands, and what is wrong with it, lines from 0. */
export interface FieldsReading {
  /** Null where the text is no list of fields; without fields where it is empty. */
  readonly fields: Fields | null;
  readonly lines: ReadonlyMap<string, number>;
  readonly problem: { readonly message: string; readonly line: number } | null;
}

/** A longer text is not read: some YAML costs the square of its length. */
const longestText = 8 * 1024;
/** Front matter needs three levels: fields, the list of sources, a source. */
const deepestFlow = 12;
const manyIndicators = /(?:[-?:]\s+){12}/;

/** True where a value has fields of its own. */
export function isFields(value: unknown): value is Fields {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/**
 * Reads a YAML text that should be a list of fields. Never throws; a text that is nested so deeply that the parser could
 * run out of stack is not given to it, since that may end the whole process and cannot be caught.
 */
export function readFields(yaml: string): FieldsReading {
  if (yaml.length > longestText)
    return refused(`It is longer than ${longestText / 1024} kB; text belongs in the page.`);
  if (isNestedDeeply(yaml)) return refused('It is nested too deeply.');
  const lineCounter = new LineCounter();
  const lineAt = (offset: number): number => lineCounter.linePos(offset).line - 1;
  let document: Document.Parsed;
  let values: unknown;
  try {
    document = parseDocument(yaml, { lineCounter, prettyErrors: false, logLevel: 'silent' });
    values = document.toJS({ maxAliasCount: 20 });
  } catch {
    return refused('Its aliases refer to one another or are too many.');
  }
  const [error] = document.errors;
  const problem = error === undefined ? null : { message: `${sentence(error.message)}.`, line: lineAt(error.pos[0]) };
  const lines = new Map<string, number>();
  if (values === null || values === undefined) return { fields: {}, lines, problem };
  if (!isMap(document.contents) || !isFields(values)) return { fields: null, lines, problem };
  for (const { key } of document.contents.items) {
    const offset = isNode(key) ? key.range?.[0] : undefined;
    if (isScalar(key) && offset !== undefined) lines.set(String(key.value), lineAt(offset));
  }
  return { fields: values, lines, problem };
}

function refused(message: string): FieldsReading {
  return { fields: {}, lines: new Map(), problem: { message, line: 0 } };
}

function sentence(message: string): string {
  return shortened(message.split('\n')[0] ?? '').replace(/\.$/, '');
}

function isNestedDeeply(yaml: string): boolean {
  if (manyIndicators.test(yaml)) return true;
  let depth = 0;
  for (const character of yaml) {
    if (character === '[' || character === '{') depth += 1;
    else if (character === ']' || character === '}') depth = Math.max(0, depth - 1);
    if (depth > deepestFlow) return true;
  }
  return false;
}
