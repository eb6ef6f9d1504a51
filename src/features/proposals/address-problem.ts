import { isSlug } from '../../../shared/lib/slug.ts';
import { reservedSlugs } from '../../../shared/pages/address.ts';

/**
 * What is wrong with the address that somebody wants for a new page or subject, in a sentence; null where nothing is.
 * @param taken the addresses that stand beside it already
 * @param what it is to be: `donor`, `page`
 */
export function addressProblem(slug: string, taken: readonly string[], what: string): string | null {
  if (slug === '') return null;
  if (!isSlug(slug)) return 'Use lower-case letters and numbers, joined by single hyphens; at most 64 of them.';
  if ((reservedSlugs as readonly string[]).includes(slug))
    return `The site uses “${slug}” itself. Choose another word.`;
  if (taken.includes(slug))
    return `There is a ${what} of this address already. Choose another, or propose a change of that one.`;
  return null;
}
