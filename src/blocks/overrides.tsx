import type { ReactElement } from 'react';
import type { Override } from '../../shared/contracts/views.ts';
import { Notice } from '../ui/notice.tsx';

/** What a moderator let through against a finding, with the reason that the page carries. */
export function Overrides({ overrides }: { readonly overrides: readonly Override[] }): ReactElement | null {
  if (overrides.length === 0) return null;
  return (
    <div className="overrides">
      {overrides.map((override) => (
        <Notice
          key={`${override.code}-${override.address ?? ''}`}
          look="warn"
          title={
            override.address === null ? (
              'Published although the book objects'
            ) : (
              <>
                Published although the book objects to{' '}
                <a href={override.address}>{override.address.replace(/^#/, '')}</a>
              </>
            )
          }
        >
          <p>{override.reason}</p>
        </Notice>
      ))}
    </div>
  );
}
