import type { ReactElement } from 'react';
import { Link, useLoaderData } from 'react-router';
import type { RevisionSummary } from '../../../shared/contracts/views.ts';
import type { PageAddress } from '../../../shared/pages/address.ts';
import { Difference } from '../../blocks/difference.tsx';
import { dayOf } from '../../lib/dates.ts';
import { paths } from '../../lib/paths.ts';
import { compareQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { PageHead } from '../../ui/page-head.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import type { compareLoader } from './page-loaders.ts';

/** What changed from one revision of a page to another. */
export function CompareSheet(): ReactElement {
  const { address, from, to } = useLoaderData<typeof compareLoader>();
  const view = useAnswer(compareQuery(useApi(), address, from, to));
  return (
    <Sheet
      title={`What changed in ${view.title}`}
      line={
        <nav className="title-line" aria-label="Where this comparison belongs">
          <span className="title-line-kind">Comparison</span>
          <span>
            <Link to={paths.page(address)}>{view.title}</Link>
          </span>
          <span>
            <Link to={paths.revisions(address)}>Every revision</Link>
          </span>
        </nav>
      }
      lead={`From revision ${String(view.from.number)} to revision ${String(view.to.number)}`}
    >
      <PageHead title={`What changed in ${view.title} · Earthstrap`} listed={false} />
      <dl className="compare-ends">
        <End name="From" address={address} revision={view.from} />
        <End name="To" address={address} revision={view.to} />
      </dl>
      <Difference difference={view.difference} />
    </Sheet>
  );
}

interface EndProps {
  readonly name: string;
  readonly address: PageAddress;
  readonly revision: RevisionSummary;
}

function End({ name, address, revision }: EndProps): ReactElement {
  return (
    <div>
      <dt>{name}</dt>
      <dd>
        <Link to={paths.revision(address, revision.number)}>Revision {revision.number}</Link>, issued on{' '}
        {dayOf(revision.publishedAt)}
        <br />
        {revision.summary} <span className="soft">Drawn by {revision.author.name}.</span>
      </dd>
    </div>
  );
}
