import type { ReactElement } from 'react';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { dayOf } from '../../lib/dates.ts';

/** What was sent before, where a proposal was sent more than once. */
export function Versions({ proposal: { versions } }: { readonly proposal: ProposalView }): ReactElement | null {
  if (versions.length < 2) return null;
  return (
    <details>
      <summary>Its versions, the newest last</summary>
      <ol className="versions">
        {versions.map(({ number, summary, createdAt, sentAt }) => (
          <li key={number}>
            Version {number}, {sentAt === null ? `a draft of ${dayOf(createdAt)}` : `sent on ${dayOf(sentAt)}`}:{' '}
            {summary}
          </li>
        ))}
      </ol>
    </details>
  );
}
