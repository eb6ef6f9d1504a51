import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { PageSummary } from '../../shared/contracts/views.ts';
import { anyVariant, type Variant } from '../../shared/pages/applicability.ts';
import { pageKindLabels } from '../../shared/pages/page-kind.ts';
import { dayOf } from '../lib/dates.ts';
import { paths } from '../lib/paths.ts';
import { counted } from './words.ts';

interface PageLedgerProps {
  readonly pages: readonly PageSummary[];
  readonly caption: string;
  /** True where pages of several subjects stand in one list. */
  readonly withSubject?: boolean;
  readonly variant?: Variant;
}

/** Pages as rows of a day book. */
export function PageLedger({
  pages,
  caption,
  withSubject = false,
  variant = anyVariant,
}: PageLedgerProps): ReactElement {
  return (
    <table className="ledger ledger-close">
      <caption className="heard">{caption}</caption>
      <thead>
        <tr>
          <th scope="col">Page</th>
          <th scope="col">Kind</th>
          <th scope="col">What is on it</th>
          <th scope="col">Issued</th>
        </tr>
      </thead>
      <tbody>
        {pages.map((page) => (
          <tr key={`${page.shelf}/${page.subject}/${page.page}`}>
            <th scope="row">
              <Link className="ledger-name" to={paths.page(page, variant)}>
                {withSubject ? titleWithSubject(page) : page.title}
              </Link>
              {page.summary === '' ? null : <p className="ledger-summary">{page.summary}</p>}
            </th>
            <td>{pageKindLabels[page.kind]}</td>
            <td>{contentsOf(page)}</td>
            <td>
              Revision {page.revision}, {dayOf(page.publishedAt)}
              <span className="ledger-by">drawn by {page.author.name}</span>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** An overview has its subject's name already. */
function titleWithSubject({ title, subjectTitle, kind }: PageSummary): string {
  return kind === 'overview' ? title : `${subjectTitle}: ${title}`;
}

function contentsOf({ lines, connectors }: PageSummary): string {
  if (lines === 0) return 'Text';
  return connectors === 0 ? counted(lines, 'line') : `${counted(connectors, 'connector')}, ${counted(lines, 'line')}`;
}
