import type { MouseEvent } from 'react';

/** Links in a page that is only looked over open apart, so that nobody loses their place in what they are doing. */
export function leadApart(event: MouseEvent): void {
  if (!(event.target instanceof Element)) return;
  const link = event.target.closest('a[href]');
  if (link === null || link.getAttribute('href')?.startsWith('#') === true) return;
  link.setAttribute('target', '_blank');
  link.setAttribute('rel', 'noopener');
}
