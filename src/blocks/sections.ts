import type { PageView } from '../../shared/contracts/views.ts';
import type { SheetSection } from '../ui/sheet.tsx';

/** The sections that carry a letter: a page's headings of the first rank under its title. */
export function sectionsOf(outline: PageView['outline']): SheetSection[] {
  return outline.filter(({ level }) => level === 2).map(({ id, text }) => ({ id, text }));
}
