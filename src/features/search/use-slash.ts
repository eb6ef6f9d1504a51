import { useEffect, type RefObject } from 'react';

/** `/` puts the cursor into the search field, from wherever nothing is being typed. */
export function useSlash(field: RefObject<HTMLInputElement | null>): void {
  useEffect(() => {
    function focusOnSlash(event: KeyboardEvent): void {
      if (event.key !== '/' || event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
      if (event.target instanceof Element && event.target.closest('input, textarea, select, [contenteditable]')) return;
      // A field that is not shown, such as the rail's on a phone, cannot take the cursor.
      if (field.current === null || field.current.getClientRects().length === 0) return;
      event.preventDefault();
      field.current.focus();
      field.current.select();
    }
    document.addEventListener('keydown', focusOnSlash);
    return () => document.removeEventListener('keydown', focusOnSlash);
  }, [field]);
}
