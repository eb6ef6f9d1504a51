import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { PageView } from '../../shared/contracts/views.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import { pageKindLabels } from '../../shared/pages/page-kind.ts';
import { paths } from '../lib/paths.ts';

interface SiblingsProps {
  readonly address: PageAddress;
  readonly subjectTitle: string;
  readonly siblings: PageView['siblings'];
  readonly variant: Variant;
}

/** The other pages of the same subject, at the end of one. */
export function Siblings({ address, subjectTitle, siblings, variant }: SiblingsProps): ReactElement | null {
  const others = siblings.filter(({ page }) => page !== address.page);
  if (others.length === 0) return null;
  return (
    <nav className="siblings unprinted" aria-labelledby="siblings">
      <h2 id="siblings" className="siblings-title">
        More of the {subjectTitle}
      </h2>
      <ul>
        {others.map(({ page, title, kind }) => (
          <li key={page}>
            <Link to={paths.page({ ...address, page }, variant)}>
              <span className="siblings-kind">{pageKindLabels[kind]}</span> <span>{title}</span>
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
