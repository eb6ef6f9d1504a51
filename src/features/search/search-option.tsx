import { useEffect, useRef, type ReactElement } from 'react';
import type { SearchHit } from '../../../shared/contracts/views.ts';
import { classNames } from '../../ui/class-names.ts';
import { WireSaid } from './answer-marks.tsx';

interface SearchOptionProps {
  readonly id: string;
  /** Null for the last one, which leads to all answers. */
  readonly hit: SearchHit | null;
  readonly active: boolean;
  readonly onChoose: () => void;
}

/** One of the likeliest answers, in two lines. */
export function SearchOption({ id, hit, active, onChoose }: SearchOptionProps): ReactElement {
  const element = useRef<HTMLLIElement>(null);
  useEffect(() => {
    if (active) element.current?.scrollIntoView({ block: 'nearest' });
  }, [active]);
  return (
    // Keys are the field's business: the option itself never has the focus.
    // eslint-disable-next-line jsx-a11y/click-events-have-key-events
    <li
      ref={element}
      id={id}
      role="option"
      aria-selected={active}
      className={classNames(
        'search-option',
        active && 'search-option-active',
        hit?.line?.appliesHere === false && 'answer-set-back',
      )}
      onMouseDown={(event) => event.preventDefault()}
      onClick={onChoose}
    >
      {hit === null ? <span className="search-option-all">All answers</span> : <OptionText hit={hit} />}
    </li>
  );
}

function OptionText({ hit }: { readonly hit: SearchHit }): ReactElement {
  const { line } = hit;
  return (
    <>
      <span className="search-option-title">{line?.where ?? hit.title}</span>
      <span className="search-option-more">
        {line === null ? null : <WireSaid line={line} />}
        {line?.circuit === null || line === null ? null : <span>{line.circuit}</span>}
        <span className="soft">{hit.subjectTitle}</span>
        {line?.hazard ? <b className={`signal-word signal-${line.hazard.signal}`}>{line.hazard.signal}</b> : null}
        {line === null && hit.excerpt !== null ? (
          <span className="soft search-option-excerpt">{hit.excerpt}</span>
        ) : null}
        {line?.appliesHere === false ? <span className="answer-why">Set back: it holds {line.applies}</span> : null}
      </span>
    </>
  );
}
