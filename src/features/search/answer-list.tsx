import type { KeyboardEvent, ReactElement } from 'react';
import type { SearchHit } from '../../../shared/contracts/views.ts';
import { LineAnswer } from './line-answer.tsx';
import { ProseAnswer } from './prose-answer.tsx';

const groupTitles: Readonly<Record<SearchHit['kind'], string>> = {
  line: 'Lines',
  section: 'In the text',
  page: 'Pages',
  sum: 'Sums',
};

interface Group {
  readonly kind: SearchHit['kind'];
  readonly title: string;
  readonly hits: SearchHit[];
}

/** Hits of one kind together, in the order in which the search gave them: the first kind is the answer. */
function groupsOf(hits: readonly SearchHit[]): Group[] {
  const groups: Group[] = [];
  for (const hit of hits) {
    const group = groups.at(-1);
    if (group?.kind === hit.kind) {
      group.hits.push(hit);
      continue;
    }
    const again = groups.some(({ kind }) => kind === hit.kind);
    groups.push({
      kind: hit.kind,
      title: again ? `More ${groupTitles[hit.kind].toLowerCase()}` : groupTitles[hit.kind],
      hits: [hit],
    });
  }
  return groups;
}

/** The answers, the likeliest kind first. Arrows go from one to the next. */
export function AnswerList({ hits }: { readonly hits: readonly SearchHit[] }): ReactElement {
  return (
    // The arrows only move between the links inside, which are what has the focus.
    // eslint-disable-next-line jsx-a11y/no-static-element-interactions
    <div className="answers" onKeyDown={moveByArrows}>
      {groupsOf(hits).map((group) => (
        <section key={group.title} className="answer-group" aria-label={group.title}>
          <h2 className="answer-group-title">{group.title}</h2>
          <ol className="answer-rows">
            {group.hits.map((hit) =>
              hit.line === null ? (
                <ProseAnswer key={hit.path} hit={hit} />
              ) : (
                <LineAnswer key={hit.address} hit={hit} line={hit.line} />
              ),
            )}
          </ol>
        </section>
      ))}
    </div>
  );
}

/** The links of all answers on the sheet, in order. */
export function answerLinks(): HTMLElement[] {
  return [...document.querySelectorAll<HTMLElement>('[data-answer]')];
}

function moveByArrows(event: KeyboardEvent<HTMLElement>): void {
  if (event.key !== 'ArrowDown' && event.key !== 'ArrowUp' && event.key !== 'Escape') return;
  if (event.altKey || event.ctrlKey || event.metaKey || event.shiftKey) return;
  const links = answerLinks();
  const at = links.findIndex((link) => link === document.activeElement);
  if (at < 0) return;
  event.preventDefault();
  const back = event.key === 'Escape' || (event.key === 'ArrowUp' && at === 0);
  const next = back
    ? document.querySelector<HTMLElement>('[data-search-field="sheet"]')
    : links[at + (event.key === 'ArrowDown' ? 1 : -1)];
  next?.focus();
}
