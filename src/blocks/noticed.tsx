import type { ReactElement } from 'react';
import type { PageView } from '../../shared/contracts/views.ts';
import { classNames } from '../ui/class-names.ts';
import { counted } from './words.ts';

/** What the book noticed in a page, for its readers: folded, since it is about the page and not about the bike. */
export function Noticed({ findings }: { readonly findings: PageView['findings'] }): ReactElement | null {
  if (findings.length === 0) return null;
  return (
    <details className="noticed">
      <summary>The book noticed {counted(findings.length, 'thing')} on this page</summary>
      <ul>
        {findings.map((finding) => (
          <li
            key={`${finding.code}-${String(finding.line)}-${finding.address ?? ''}`}
            className={classNames('notice', `notice-${finding.severity}`)}
          >
            <p>{finding.message}</p>
            {finding.path === undefined ? null : <p className="soft">{finding.path.join(' – ')}</p>}
            {finding.applies === undefined ? null : <p className="soft">Only for {finding.applies}.</p>}
          </li>
        ))}
      </ul>
    </details>
  );
}
