import type { ReactElement, ReactNode } from 'react';
import { Link } from 'react-router';
import type { PageView, RevisionSummary } from '../../shared/contracts/views.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { pageKindLabels } from '../../shared/pages/page-kind.ts';
import { dayOf } from '../lib/dates.ts';
import { paths } from '../lib/paths.ts';
import { ButtonLink } from '../ui/button.tsx';
import { ProposeSign } from '../ui/signs.tsx';
import { PrintButton } from './print-button.tsx';
import { sourceLabels, subjectLabels } from './words.ts';

interface TitleBlockProps {
  readonly address: PageAddress;
  readonly view: PageView;
  /** True where an old revision is shown: nothing can be proposed from here but going back to it. */
  readonly old?: boolean;
}

/** The title block at the foot of a page: who drew it, who signed it off, by what sources, and how it came to be so. */
export function TitleBlock({ address, view, old = false }: TitleBlockProps): ReactElement {
  return (
    <footer className="title-block" aria-label="Title block">
      <dl className="title-block-fields">
        <Field name="Title" className="title-block-name">
          {view.title}
        </Field>
        <Field name={subjectLabels[address.shelf]} className="title-block-subject">
          {view.subjectTitle}
        </Field>
        <Field name="Page">{pageKindLabels[view.kind]}</Field>
        <Field name="Holds for">{view.applies ?? 'All years and markets'}</Field>
        <Field name="Drawn by">{view.author.name}</Field>
        <Field name="Signed off by">{view.publishedBy?.name ?? 'Came with the book'}</Field>
        <Field name="Revision">
          {view.revision}
          {view.revision === view.newestRevision ? '' : ` of ${String(view.newestRevision)}`}
        </Field>
        <Field name="Issued">{dayOf(view.publishedAt)}</Field>
        <Field name="Sources" className="title-block-wide">
          {view.sources.length === 0 ? (
            'None named yet. If you know where this comes from, propose it.'
          ) : (
            <ul>
              {view.sources.map((source) => (
                <li key={source.id}>
                  <b>{source.id}</b> {sourceLabels[source.kind]}: {source.title}
                  {source.where === null ? '' : `, ${source.where}`}
                </li>
              ))}
            </ul>
          )}
        </Field>
      </dl>
      {view.lastRevisions.length === 0 ? null : <LastRevisions address={address} revisions={view.lastRevisions} />}
      <div className="title-block-actions button-row unprinted">
        {old ? null : (
          <ButtonLink look="primary" to={paths.propose(address)}>
            <ProposeSign /> Propose a change
          </ButtonLink>
        )}
        <ButtonLink to={paths.revisions(address)}>Every revision</ButtonLink>
        <PrintButton />
      </div>
    </footer>
  );
}

interface FieldProps {
  readonly name: string;
  readonly className?: string;
  readonly children: ReactNode;
}

function Field({ name, className = '', children }: FieldProps): ReactElement {
  return (
    <div className={className}>
      <dt>{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}

interface LastRevisionsProps {
  readonly address: PageAddress;
  readonly revisions: readonly RevisionSummary[];
}

function LastRevisions({ address, revisions }: LastRevisionsProps): ReactElement {
  return (
    <div className="title-block-revisions">
      <table className="ledger">
        <caption className="heard">The last revisions</caption>
        <thead>
          <tr>
            <th scope="col">Rev.</th>
            <th scope="col">What changed</th>
            <th scope="col">Drawn by</th>
            <th scope="col">Issued</th>
            <th scope="col">
              <span className="heard">What to do</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {revisions.map((revision) => (
            <tr key={revision.number}>
              <th scope="row">{revision.number}</th>
              <td>{revision.summary}</td>
              <td data-label="Drawn by">{revision.author.name}</td>
              <td data-label="Issued">{dayOf(revision.publishedAt)}</td>
              <td className="ledger-do unprinted">
                {revision.number === 1 ? (
                  <Link to={paths.revision(address, 1)}>See the first</Link>
                ) : (
                  <Link to={paths.compare(address, revision.number - 1, revision.number)}>
                    See what changed<span className="heard"> in revision {revision.number}</span>
                  </Link>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
