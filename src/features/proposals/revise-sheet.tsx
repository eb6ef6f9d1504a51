import type { ReactElement } from 'react';
import { Link, useActionData, useLoaderData } from 'react-router';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { Difference } from '../../blocks/difference.tsx';
import { stateLabels } from '../../blocks/proposal-words.ts';
import { dayOf } from '../../lib/dates.ts';
import { paths } from '../../lib/paths.ts';
import { proposalQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { TextArea } from '../../ui/field.tsx';
import { Notice } from '../../ui/notice.tsx';
import type { editorAction } from './editor-action.ts';
import type { reviseLoader } from './editor-loaders.ts';
import { EditorSheet, SignInFirst } from './editor-sheets.tsx';
import { ownText, startOfRevising, startOfValues } from './editor-start.ts';
import { Editor } from './editor.tsx';

/** Where an author goes on writing at a proposal. */
export function ReviseSheet(): ReactElement {
  const { id, fromPublished, signedIn } = useLoaderData<typeof reviseLoader>();
  const posted = useActionData<typeof editorAction>();
  if (signedIn) return <Revise id={id} fromPublished={fromPublished} />;
  return (
    <SignInFirst>
      {posted === undefined ? null : <Editor start={startOfValues(posted.values, false, false)} />}
    </SignInFirst>
  );
}

interface ReviseProps {
  readonly id: string;
  readonly fromPublished: boolean;
}

function Revise({ id, fromPublished }: ReviseProps): ReactElement {
  const proposal = useAnswer(proposalQuery(useApi(), id));
  const posted = useActionData<typeof editorAction>();
  const { title, state, may } = proposal;
  const isFromPublished = fromPublished && proposal.publishedMarkdown !== null;
  return (
    <EditorSheet
      title={`Go on with ${title}`}
      line={
        <>
          <span className="title-line-kind">Proposal</span>
          <span>
            <Link to={paths.proposal(id)}>{stateLabels[state]}</Link>
          </span>
          <Base proposal={proposal} fromPublished={isFromPublished} />
        </>
      }
      lead={leads[state]}
    >
      {may.revise ? null : (
        <Notice look="warn" title="Nothing more can be written to this proposal">
          <p>
            Somebody has decided on it, or it was withdrawn. What you typed is still here: take it to a new proposal.
          </p>
          <p className="button-row">
            <ButtonLink to={paths.proposal(id)}>See what became of it</ButtonLink>
            <ButtonLink to={paths.propose(proposal)}>Propose a change anew</ButtonLink>
          </p>
        </Notice>
      )}
      <LastNote proposal={proposal} />
      {isFromPublished ? <OwnText proposal={proposal} /> : null}
      {may.revise || posted !== undefined ? (
        <Editor key={`${id} ${String(isFromPublished)}`} start={startOfRevising(proposal, isFromPublished)} />
      ) : null}
    </EditorSheet>
  );
}

const leads: Readonly<Record<ProposalView['state'], string>> = {
  draft: 'Nobody else sees it until you send it.',
  waiting: 'It waits for a moderator. What you send now takes the place of what you sent before.',
  'sent-back': 'A moderator asks for something. Answer it in the text, and send it again.',
  published: 'It was published.',
  declined: 'It was declined.',
  withdrawn: 'It was withdrawn.',
};

function Base({ proposal, fromPublished }: { readonly proposal: ProposalView; readonly fromPublished: boolean }) {
  const base = fromPublished ? proposal.publishedRevision : proposal.baseRevision;
  return base === null ? <span>A new page</span> : <span>From revision {base}</span>;
}

/** What the moderator asked for, above the text that is to answer it. */
function LastNote({ proposal }: { readonly proposal: ProposalView }): ReactElement | null {
  const note = proposal.notes.findLast(({ kind }) => kind === 'sent-back');
  if (note === undefined || proposal.state !== 'sent-back') return null;
  return (
    <Notice look="warn" title={`${note.author.name} sent it back on ${dayOf(note.createdAt)}`}>
      <p className="note-text">{note.text}</p>
    </Notice>
  );
}

/** The author's own text, kept beside the published one that they start from anew. */
function OwnText({ proposal }: { readonly proposal: ProposalView }): ReactElement {
  const wasSent = proposal.versions.at(-1)?.sentAt !== null;
  return (
    <Notice
      look="hint"
      title={`Below is the text of revision ${String(proposal.publishedRevision)}; yours is kept beside it`}
    >
      <p>
        Write into it what of yours still holds.{' '}
        {wasSent
          ? 'What you had sent stays with the proposal.'
          : 'Yours was never sent: it stands here until you keep or send this one.'}
      </p>
      <details>
        <summary>What you had changed</summary>
        <Difference difference={proposal.difference} />
      </details>
      <details>
        <summary>Your whole text</summary>
        <TextArea className="editor-text" label="Your text as it was" value={ownText(proposal)} rows={16} readOnly />
      </details>
    </Notice>
  );
}
