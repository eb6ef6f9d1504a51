import type { ReactElement } from 'react';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { paths } from '../../lib/paths.ts';
import { Button, ButtonLink } from '../../ui/button.tsx';
import { ProblemNotice } from '../../ui/notice.tsx';
import { useProposalForm } from './use-proposal-form.ts';

/** What an author can do with their own proposal. */
export function AuthorActs({ proposal }: { readonly proposal: ProposalView }): ReactElement {
  const { id, state, fallenBehind, may, publishedRevision } = proposal;
  return (
    <div className="decision">
      {state === 'waiting' ? (
        <p>A moderator decides on it. Nobody decides on their own proposal, whatever their role.</p>
      ) : null}
      <div className="button-row">
        {fallenBehind && may.revise && publishedRevision !== null ? (
          <ButtonLink look="primary" to={paths.revise(id, 'published')}>
            Start from revision {publishedRevision}, with my text beside it
          </ButtonLink>
        ) : null}
        {may.revise ? (
          <ButtonLink look={fallenBehind || state === 'waiting' ? 'plain' : 'primary'} to={paths.revise(id)}>
            {reviseWords[state]}
          </ButtonLink>
        ) : null}
        {may.send ? <Send again={state === 'sent-back'} /> : null}
      </div>
      {may.withdraw ? <Withdraw /> : null}
    </div>
  );
}

const reviseWords: Readonly<Record<ProposalView['state'], string>> = {
  draft: 'Go on writing',
  waiting: 'Change what you sent',
  'sent-back': 'Answer it in the text',
  published: '',
  declined: '',
  withdrawn: '',
};

function Send({ again }: { readonly again: boolean }): ReactElement {
  const { Form, action, outcome, busy } = useProposalForm('send');
  return (
    <Form method="post" action={action}>
      {outcome === null ? null : <ProblemNotice problem={outcome.problem} />}
      <Button name="do" value="send" disabled={busy}>
        {again ? 'Send it again as it is' : 'Send to the moderators'}
      </Button>
    </Form>
  );
}

function Withdraw(): ReactElement {
  const { Form, action, outcome, busy } = useProposalForm('withdraw');
  return (
    <details className="decision-with-words" open={outcome !== null}>
      <summary className="button button-plain">Withdraw</summary>
      <Form className="form" method="post" action={action}>
        {outcome === null ? null : <ProblemNotice problem={outcome.problem} />}
        <p>It will not be published. Its text stays here, but nothing more can be done with it.</p>
        <Button look="grave" name="do" value="withdraw" disabled={busy}>
          Withdraw it for good
        </Button>
      </Form>
    </details>
  );
}
