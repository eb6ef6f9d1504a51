import type { ReactElement } from 'react';
import type { SubjectView } from '../../../shared/contracts/views.ts';

/** A donor's or part's facts along one line; nothing where there are none. */
export function FactsLine({ facts }: { readonly facts: SubjectView['facts'] }): ReactElement | null {
  const named = [
    { name: 'Maker', text: facts.maker },
    { name: 'Model', text: facts.model },
    { name: 'Years', text: facts.years },
    { name: 'Markets', text: facts.markets.length === 0 ? null : facts.markets.join(', ') },
    { name: 'System', text: systemOf(facts) },
    { name: 'Ignition', text: facts.ignition },
    { name: 'Charging', text: facts.charging },
  ].filter(({ text }) => text !== null);
  if (named.length === 0) return null;
  return (
    <dl className="facts">
      {named.map(({ name, text }) => (
        <div key={name}>
          <dt>{name}</dt>
          <dd>{text}</dd>
        </div>
      ))}
    </dl>
  );
}

/** `12 V, negative earth`. */
function systemOf({ voltage, earth }: SubjectView['facts']): string | null {
  const parts = [voltage, earth === null ? null : `${earth} earth`].filter((part) => part !== null);
  return parts.length === 0 ? null : parts.join(', ');
}
