import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router';

/**
 * Moves the focus to a new sheet's title, so that a screen reader begins there and the next Tab goes on from there. Not
 * on the first sheet, nor where only the query or the fragment changed.
 */
export function useFocusKeeper(): void {
  const { pathname } = useLocation();
  const shown = useRef(pathname);
  useEffect(() => {
    if (shown.current === pathname) return;
    shown.current = pathname;
    document.querySelector<HTMLElement>('#sheet h1')?.focus({ preventScroll: true });
  }, [pathname]);
}
