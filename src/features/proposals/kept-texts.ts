/*
 * What somebody types is kept in their browser, so that a reload, a post that failed or a session that ended costs them
 * nothing. Kept by the page's address and the revision that it starts from; a text is given back to its own writer only.
 */

/** A text as it was typed and not yet acknowledged by the server. */
export interface KeptText {
  readonly id: string;
  readonly memberId: string;
  readonly markdown: string;
  readonly summary: string;
  /** When it was last typed at: ISO 8601. */
  readonly keptAt: string;
}

/** Where texts are kept: a browser's own storage, or a test's. */
export type Drawer = Pick<Storage, 'getItem' | 'setItem' | 'removeItem'>;

/** So many texts are kept of one page and revision: the one that is being typed, and what was left behind before. */
const mostTexts = 3;

/** Where a text is kept: what it is a text of, and the revision that it starts from. */
export function keptKey(of: string, baseRevision: number | null): string {
  return `earthstrap-text ${of} ${baseRevision === null ? 'new' : String(baseRevision)}`;
}

/** The texts that are kept there, the last typed first; none where storage is forbidden or damaged. */
export function readKept(drawer: Drawer, key: string): readonly KeptText[] {
  try {
    const kept: unknown = JSON.parse(drawer.getItem(key) ?? '[]');
    return Array.isArray(kept) ? kept.filter(isKeptText) : [];
  } catch {
    return [];
  }
}

/** Keeps a text in the place of its earlier state. False where the browser does not keep it: full, or forbidden. */
export function keepText(drawer: Drawer, key: string, text: KeptText): boolean {
  const others = readKept(drawer, key).filter(({ id }) => id !== text.id);
  return write(drawer, key, [text, ...others].slice(0, mostTexts));
}

/** Forgets what has been acknowledged or thrown away. */
export function forgetTexts(drawer: Drawer, key: string, isDone: (text: KeptText) => boolean): void {
  write(
    drawer,
    key,
    readKept(drawer, key).filter((text) => !isDone(text)),
  );
}

function write(drawer: Drawer, key: string, texts: readonly KeptText[]): boolean {
  try {
    if (texts.length === 0) drawer.removeItem(key);
    else drawer.setItem(key, JSON.stringify(texts));
    return true;
  } catch {
    return false;
  }
}

function isKeptText(value: unknown): value is KeptText {
  if (typeof value !== 'object' || value === null) return false;
  const fields: Record<string, unknown> = { ...value };
  return ['id', 'memberId', 'markdown', 'summary', 'keptAt'].every((name) => typeof fields[name] === 'string');
}
