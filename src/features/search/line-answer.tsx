import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { SearchHit } from '../../../shared/contracts/views.ts';
import { classNames } from '../../ui/class-names.ts';
import { DrawnMarkup, HazardSaid, MarkSaid, WireSaid } from './answer-marks.tsx';

interface LineAnswerProps {
  readonly hit: SearchHit;
  readonly line: NonNullable<SearchHit['line']>;
}

/** A line as the answer itself: where it is, its wire, what for, where it goes, how far to trust it, and its face. */
export function LineAnswer({ hit, line }: LineAnswerProps): ReactElement {
  return (
    <li className={classNames('answer', 'answer-line', !line.appliesHere && 'answer-set-back')}>
      <div className="answer-said">
        <p className="answer-place">
          <span className="answer-subject">{hit.subjectTitle}</span>
          {hit.excerpt === null ? null : <span className="soft"> · {hit.excerpt}</span>}
        </p>
        <h3 className="answer-title">
          <Link to={hit.path} data-answer="">
            {line.where}
          </Link>
        </h3>
        {line.colour === null ? null : (
          <p className="answer-colour">
            <WireSaid line={line} />
            {line.size === null ? null : <span className="answer-size">{line.size}</span>}
          </p>
        )}
        {line.circuit === null ? null : <p className="answer-circuit">{line.circuit}</p>}
        {line.goesTo === null ? null : (
          <p className="answer-goes">
            <span className="soft">Goes to</span> <code>{line.goesTo}</code>
          </p>
        )}
        <p className="answer-trust">
          <MarkSaid mark={hit.mark} />
          {line.applies === null ? null : (
            <span className={line.appliesHere ? 'soft' : 'answer-why'}>
              {line.appliesHere ? `Holds ${line.applies}` : `Set back: it holds ${line.applies}`}
            </span>
          )}
        </p>
      </div>
      {line.faceSvg === null ? null : (
        <figure className="answer-face">
          <DrawnMarkup className="answer-face-drawing" svg={line.faceSvg} />
        </figure>
      )}
      <HazardSaid hazard={line.hazard} />
    </li>
  );
}
