import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { PageView } from '../../shared/contracts/views.ts';
import { pageKindLabels } from '../../shared/pages/page-kind.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { dayOf } from '../lib/dates.ts';
import { paths } from '../lib/paths.ts';
import { shelfLabels } from './words.ts';

interface TitleLineProps {
  readonly address: PageAddress;
  readonly view: PageView;
  /** True where an old revision is shown: what to do is to open the newest. */
  readonly old?: boolean;
}

/** The title block as one line at the head of a page: what, of what, for which, which revision, who signed it off. */
export function TitleLine({ address, view, old = false }: TitleLineProps): ReactElement {
  const isOverview = address.page === 'overview';
  return (
    <nav className="title-line" aria-label="What this page is and where it belongs">
      <span className="title-line-kind">{pageKindLabels[view.kind]}</span>
      <span>
        {isOverview ? (
          <Link to={paths.shelf(address.shelf)}>{shelfLabels[address.shelf]}</Link>
        ) : (
          <Link to={paths.subject(address)}>{view.subjectTitle}</Link>
        )}
      </span>
      {view.applies === null ? null : <span className="title-line-applies">{view.applies}</span>}
      <span>
        Revision {view.revision}, {dayOf(view.publishedAt)}
      </span>
      {view.publishedBy === null ? null : (
        <span className="title-line-more">Signed off by {view.publishedBy.name}</span>
      )}
      <span className="title-line-last unprinted">
        {old ? (
          <Link to={paths.page(address)}>Open the newest</Link>
        ) : (
          <Link to={paths.propose(address)}>Propose a change</Link>
        )}
      </span>
    </nav>
  );
}
