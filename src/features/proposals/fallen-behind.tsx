import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { Difference } from '../../blocks/difference.tsx';
import { paths } from '../../lib/paths.ts';
import { ownText } from './editor-start.ts';

/** What was published while a proposal was on its way, and both texts, side by side. */
export function FallenBehind({ proposal }: { readonly proposal: ProposalView }): ReactElement {
  const { baseRevision, publishedRevision, meanwhile, publishedMarkdown } = proposal;
  return (
    <>
      <p>
        {baseRevision === null
          ? 'This page did not exist when the proposal was begun, and does now.'
          : `The proposal starts from revision ${String(baseRevision)}.`}{' '}
        {publishedRevision === null ? null : (
          <>
            <Link to={paths.page(proposal)}>Revision {publishedRevision}</Link> was published since; this is what it
            changed.
          </>
        )}{' '}
        What the proposal itself changes stands below.
      </p>
      {meanwhile === null ? null : <Difference difference={meanwhile} />}
      {publishedMarkdown === null ? null : (
        <details className="both-texts">
          <summary>Both texts, whole</summary>
          <div className="both-texts-columns">
            <WholeText title={`Revision ${String(publishedRevision)}, published`} text={publishedMarkdown} />
            <WholeText title="The proposal" text={ownText(proposal)} />
          </div>
        </details>
      )}
    </>
  );
}

function WholeText({ title, text }: { readonly title: string; readonly text: string }): ReactElement {
  return (
    <section className="whole-text">
      <h3>{title}</h3>
      {/* A text wider than its column is scrolled by whoever reads it, also from the keyboard. */}
      {/* eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex */}
      <pre tabIndex={0} aria-label={title}>
        {text}
      </pre>
    </section>
  );
}
