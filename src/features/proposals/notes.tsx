import { useRef, type ReactElement } from 'react';
import { Link, useLocation } from 'react-router';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { lineNamed } from '../../blocks/marked-line.ts';
import { dayOf } from '../../lib/dates.ts';
import { useFirstProblem } from '../../lib/use-first-problem.ts';
import { useHydrated } from '../../lib/use-hydrated.ts';
import { Button } from '../../ui/button.tsx';
import { TextArea, TextField } from '../../ui/field.tsx';
import { ProblemNotice } from '../../ui/notice.tsx';
import { useProposalForm } from './use-proposal-form.ts';

type Note = ProposalView['notes'][number];

const kindWords: Readonly<Record<Note['kind'], string>> = {
  note: 'wrote',
  'sent-back': 'sent it back',
  declined: 'declined it',
  published: 'published it',
};

/** What was said of a proposal, in the order in which it was said, and where to say more. */
export function Notes({ proposal }: { readonly proposal: ProposalView }): ReactElement {
  return (
    <>
      {proposal.notes.length === 0 ? <p className="soft">Nobody has written a note yet.</p> : null}
      <ol className="notes">
        {proposal.notes.map((note) => (
          <li key={note.id} className="note">
            <p className="note-head">
              <b>{note.author.name}</b> {kindWords[note.kind]} on {dayOf(note.createdAt)}
              <About note={note} />
            </p>
            <p className="note-text">{note.text}</p>
          </li>
        ))}
      </ol>
      {proposal.may.note ? <AddNote html={proposal.html} /> : null}
    </>
  );
}

function About({ note: { address, line } }: { readonly note: Note }): ReactElement | null {
  if (address !== null) {
    return (
      <>
        , of <Link to={encodeURI(address)}>{address.replace(/^#/, '')}</Link>
      </>
    );
  }
  return line === null ? null : <>, of line {line} of the text</>;
}

function AddNote({ html }: { readonly html: string }): ReactElement {
  const { Form, action, outcome, busy } = useProposalForm('note');
  const { hash } = useLocation();
  const hydrated = useHydrated();
  const form = useRef<HTMLFormElement>(null);
  useFirstProblem(form, outcome);
  // Whoever has marked a line of the page above wants to say something of it.
  const marked = hydrated ? lineNamed(hash, html) : null;
  return (
    <Form ref={form} className="form" method="post" action={action} noValidate>
      {outcome === null ? null : <ProblemNotice problem={outcome.problem} />}
      <TextArea
        label="A note"
        name="text"
        rows={3}
        defaultValue={outcome?.values['text']}
        problem={outcome?.problem.fields?.['text']}
      />
      <TextField
        key={marked ?? ''}
        label="Of which line, if of one"
        hint="Mark a line in the page above; or write its address (headlight.3), or the number of a line of the text."
        name="about"
        autoCapitalize="none"
        autoComplete="off"
        spellCheck={false}
        defaultValue={marked ?? outcome?.values['about'] ?? ''}
        problem={outcome?.problem.fields?.['line'] ?? outcome?.problem.fields?.['address']}
      />
      <Button name="do" value="note" disabled={busy}>
        Add the note
      </Button>
    </Form>
  );
}
