import type { ReactElement } from 'react';
import { PageHead } from '../ui/page-head.tsx';

/** What stands where a sheet could not even be drawn. It needs nothing: no router, no script, no answer of the book. */
export function LastResort(): ReactElement {
  return (
    <main className="sheet">
      <PageHead title="Something broke · Earthstrap" listed={false} />
      <div className="sheet-field">
        <div className="sheet-title">
          <h1>This sheet could not be drawn</h1>
          <p className="sheet-lead">
            The fault is ours and has been written down. The book itself is as it was, and so is whatever you had sent
            before.
          </p>
        </div>
        <p className="button-row">
          <a className="button button-primary" href="/">
            Go to the first page
          </a>
        </p>
      </div>
    </main>
  );
}
