import { formatPageAddress, pagePath } from '../pages/address.ts';
import { textAt, type LinesIndex } from './lines-index.ts';
import type { SearchHit } from './search-hit.ts';

const mostListed = 24;

/**
 * The page of a block that the words of a query lead to, where the colour or cavity that was asked for is not there: it
 * leads to the block and says what the block has instead.
 */
export function offeredPage(index: LinesIndex, holderPlace: number): SearchHit | null {
  const holder = index.holders[holderPlace];
  const page = holder === undefined ? undefined : index.pages[holder.page];
  if (holder === undefined || page === undefined) return null;
  const name = holder.name === '' ? holder.id : holder.name;
  return {
    kind: 'page',
    address: formatPageAddress(page.address),
    path: `${pagePath(page.address)}#${holder.id}`,
    title: `${page.title}: ${name}`,
    subjectTitle: index.subjects[page.subject]?.title ?? '',
    excerpt:
      holder.kind === 'connector'
        ? `${name} has ${contents(index, holder.start, holder.end)}.`
        : `${name} stands on this page.`,
    mark: null,
    line: null,
  };
}

/** Cavity by cavity with its colours: `cavities 1 (W), 2 (Y/R or Y/B), 3 (empty)`. */
function contents(index: LinesIndex, start: number, end: number): string {
  const cavities = new Map<string, Set<string>>();
  for (let line = start; line < end; line += 1) {
    const cavity = index.names[index.own[line] ?? 0] ?? '';
    const colour = index.colours[index.colour[line] ?? 0]?.code;
    const said = index.states[line] === 1 ? 'empty' : (colour ?? textAt(index.texts, line));
    cavities.set(cavity, (cavities.get(cavity) ?? new Set<string>()).add(said));
  }
  const list = [...cavities].map(([cavity, said]) => `${cavity} (${[...said].join(' or ')})`);
  const shown = list.slice(0, mostListed).join(', ');
  return `${list.length === 1 ? 'cavity' : 'cavities'} ${shown}${list.length > mostListed ? ' and more' : ''}`;
}
