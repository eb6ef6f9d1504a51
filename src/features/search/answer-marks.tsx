import type { ReactElement } from 'react';
import type { SearchHit } from '../../../shared/contracts/views.ts';
import { classNames } from '../../ui/class-names.ts';

type LineSaid = NonNullable<SearchHit['line']>;

/** A drawing of our own hand, in which every text is escaped. */
export function DrawnMarkup({ svg, className }: { readonly svg: string; readonly className: string }): ReactElement {
  return <span className={className} dangerouslySetInnerHTML={{ __html: svg }} />;
}

/** A wire as it is drawn everywhere: the cable, then its letters, then its words. */
export function WireSaid({ line }: { readonly line: LineSaid }): ReactElement | null {
  if (line.colour === null) return null;
  return (
    <span className="wire answer-wire">
      {line.wireSvg === null ? null : <DrawnMarkup className="answer-cable" svg={line.wireSvg} />}
      <b className="wire-code">{line.colour}</b> <span className="wire-words">{line.colourWords}</span>
    </span>
  );
}

/** How far the line may be trusted. */
export function MarkSaid({ mark }: { readonly mark: SearchHit['mark'] }): ReactElement | null {
  return mark === null ? null : <span className={classNames('mark', `mark-${mark}`)}>{mark}</span>;
}

/** The signal word of the hazard that the line belongs to, with its sentence. */
export function HazardSaid({ hazard }: { readonly hazard: LineSaid['hazard'] }): ReactElement | null {
  if (hazard === null) return null;
  return (
    <div className={classNames('caution', `caution-${hazard.signal}`, 'answer-caution')} role="note">
      <p className="caution-word">{hazard.signal}</p>
      <div className="caution-text">
        <p>{hazard.text}</p>
      </div>
    </div>
  );
}
