import { useMemo, useState } from 'react';
import { useHydrated } from '../../lib/use-hydrated.ts';
import { browserDrawer } from './browser-drawer.ts';
import { forgetTexts, keepText, readKept, type KeptText } from './kept-texts.ts';

/** What a member writes: the page's text and the sentence about it. */
export interface Typed {
  readonly markdown: string;
  readonly summary: string;
}

export interface KeptTexts {
  /** Texts of this member that were typed here before and never reached the server, the last one first. */
  readonly offers: readonly KeptText[];
  /** Whether what is typed now is kept; null before anything was typed. */
  readonly keeping: boolean | null;
  keep(typed: Typed): void;
  /** Throws an offered text away. */
  throwAway(id: string): void;
  /** Takes an offered text back: it is what is being typed from here on. */
  takeBack(text: KeptText): void;
}

/** Keeps what is typed in the browser, and offers what was left behind there. */
export function useKeptText(key: string, memberId: string | null, initial: Typed): KeptTexts {
  const hydrated = useHydrated();
  const [ownId] = useState(makeId);
  const [settled, setSettled] = useState<readonly string[]>([]);
  const [keeping, setKeeping] = useState<boolean | null>(null);
  const { markdown, summary } = initial;
  const found = useMemo(
    () =>
      (hydrated ? readKept(browserDrawer(), key) : []).filter(
        (text) =>
          text.memberId === memberId && text.id !== ownId && (text.markdown !== markdown || text.summary !== summary),
      ),
    [hydrated, key, memberId, ownId, markdown, summary],
  );

  function keep(typed: Typed): void {
    if (memberId === null) return;
    const keptAt = new Date().toISOString();
    setKeeping(keepText(browserDrawer(), key, { id: ownId, memberId, ...typed, keptAt }));
  }

  function throwAway(id: string): void {
    forgetTexts(browserDrawer(), key, (text) => text.id === id);
    setSettled((ids) => [...ids, id]);
  }

  return {
    offers: found.filter(({ id }) => !settled.includes(id)),
    keeping,
    keep,
    throwAway,
    takeBack(text) {
      keep(text);
      throwAway(text.id);
    },
  };
}

/** Told apart only within one page of one browser, which need not be a place where better randomness is to be had. */
function makeId(): string {
  return `${Date.now().toString(36)}-${Math.random().toString(36).slice(2)}`;
}
