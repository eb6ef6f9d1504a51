import type { ReactElement } from 'react';
import { Form, Link, useLoaderData } from 'react-router';
import type { RevisionSummary } from '../../../shared/contracts/views.ts';
import type { PageAddress } from '../../../shared/pages/address.ts';
import { counted } from '../../blocks/words.ts';
import { dayOf } from '../../lib/dates.ts';
import { paths } from '../../lib/paths.ts';
import { revisionsQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { Button } from '../../ui/button.tsx';
import { SelectField } from '../../ui/field.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import type { revisionsLoader } from './page-loaders.ts';

/** Every revision of a page: who changed what, and who signed it off. */
export function RevisionsSheet(): ReactElement {
  const { address } = useLoaderData<typeof revisionsLoader>();
  const { title, revisions } = useAnswer(revisionsQuery(useApi(), address));
  return (
    <Sheet
      title={`Every revision of ${title}`}
      line={
        <nav className="title-line" aria-label="Where these revisions belong">
          <span className="title-line-kind">Revisions</span>
          <span>
            <Link to={paths.page(address)}>{title}</Link>
          </span>
          <span>{counted(revisions.length, 'revision')}</span>
        </nav>
      }
      lead="Nothing that was published is ever taken away or altered. Going back is a new revision."
    >
      <PageHead title={`Revisions of ${title} · Earthstrap`} listed={false} />
      {revisions.length > 1 ? <CompareTwo address={address} revisions={revisions} /> : null}
      <table className="ledger">
        <caption className="heard">The revisions, newest first</caption>
        <thead>
          <tr>
            <th scope="col">Rev.</th>
            <th scope="col">What changed</th>
            <th scope="col">Drawn by</th>
            <th scope="col">Signed off by</th>
            <th scope="col">Issued</th>
            <th scope="col">
              <span className="heard">What to do</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {revisions.map((revision) => (
            <RevisionRow key={revision.number} address={address} revision={revision} />
          ))}
        </tbody>
      </table>
    </Sheet>
  );
}

interface RevisionRowProps {
  readonly address: PageAddress;
  readonly revision: RevisionSummary;
}

function RevisionRow({ address, revision }: RevisionRowProps): ReactElement {
  const { number } = revision;
  return (
    <tr>
      <th scope="row" className="ledger-name">
        <Link to={paths.revision(address, number)}>
          <span className="heard">Revision </span>
          {number}
        </Link>
      </th>
      <td>{revision.summary}</td>
      <td data-label="Drawn by">{revision.author.name}</td>
      <td data-label="Signed off by">{revision.publishedBy?.name ?? 'came with the book'}</td>
      <td data-label="Issued">{dayOf(revision.publishedAt)}</td>
      <td className="ledger-do">
        {number === 1 ? (
          <Link to={paths.revision(address, number)}>Open it</Link>
        ) : (
          <Link to={paths.compare(address, number - 1, number)}>
            See what changed<span className="heard"> in revision {number}</span>
          </Link>
        )}
      </td>
    </tr>
  );
}

interface CompareTwoProps {
  readonly address: PageAddress;
  readonly revisions: readonly RevisionSummary[];
}

function CompareTwo({ address, revisions }: CompareTwoProps): ReactElement {
  const newest = revisions[0]?.number ?? 1;
  return (
    <Form className="compare-two" action={paths.compareTwo(address)} aria-label="Compare two revisions">
      <RevisionChoice label="From" name="from" chosen={newest - 1} revisions={revisions} />
      <RevisionChoice label="To" name="to" chosen={newest} revisions={revisions} />
      <Button>Compare</Button>
    </Form>
  );
}

interface RevisionChoiceProps {
  readonly label: string;
  readonly name: string;
  readonly chosen: number;
  readonly revisions: readonly RevisionSummary[];
}

function RevisionChoice({ label, name, chosen, revisions }: RevisionChoiceProps): ReactElement {
  return (
    <SelectField label={label} name={name} defaultValue={chosen}>
      {revisions.map(({ number, publishedAt }) => (
        <option key={number} value={number}>
          {`${String(number)}, ${dayOf(publishedAt)}`}
        </option>
      ))}
    </SelectField>
  );
}
