import { useActionData, useFetcher, useParams, type FetcherWithComponents } from 'react-router';
import { paths } from '../../lib/paths.ts';
import { decisionId, notesId } from './section-ids.ts';
import type { proposalAction, ProposalAct, ProposalOutcome } from './proposal-action.ts';

export interface ProposalForm {
  /** The form's element: it posts without leaving the sheet, and like any form without a script. */
  readonly Form: FetcherWithComponents<unknown>['Form'];
  /** Where it posts to: without a script the answer is shown at the form, and not at the head of the sheet. */
  readonly action: string;
  /** Why the book refused what this form asked for; null where it did not, or nothing was asked. */
  readonly outcome: ProposalOutcome | null;
  readonly busy: boolean;
}

/** One of the forms of a proposal's sheet. */
export function useProposalForm(act: ProposalAct): ProposalForm {
  const { id = '' } = useParams();
  const fetcher = useFetcher<typeof proposalAction>();
  const posted = useActionData<typeof proposalAction>();
  const outcome = fetcher.data ?? (posted?.act === act ? posted : null);
  const section = act === 'note' ? notesId : decisionId;
  return {
    Form: fetcher.Form,
    action: `${paths.proposal(id)}#${section}`,
    outcome: outcome ?? null,
    busy: fetcher.state !== 'idle',
  };
}
