import { useActionData, useFetcher, type FetcherWithComponents } from 'react-router';
import type { proposalAction, ProposalAct, ProposalOutcome } from './proposal-action.ts';

export interface ProposalForm {
  /** The form's element: it posts without leaving the sheet, and like any form without a script. */
  readonly Form: FetcherWithComponents<unknown>['Form'];
  /** Why the book refused what this form asked for; null where it did not, or nothing was asked. */
  readonly outcome: ProposalOutcome | null;
  readonly busy: boolean;
}

/** One of the forms of a proposal's sheet. */
export function useProposalForm(act: ProposalAct): ProposalForm {
  const fetcher = useFetcher<typeof proposalAction>();
  const posted = useActionData<typeof proposalAction>();
  const outcome = fetcher.data ?? (posted?.act === act ? posted : null);
  return { Form: fetcher.Form, outcome: outcome ?? null, busy: fetcher.state !== 'idle' };
}
