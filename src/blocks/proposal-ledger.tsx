import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { ProposalSummary } from '../../shared/contracts/views.ts';
import { dayOf } from '../lib/dates.ts';
import { paths } from '../lib/paths.ts';
import { isOpen, nextStep, standsSince, stateLabels } from './proposal-words.ts';
import { counted, shelfLabels } from './words.ts';

interface ProposalLedgerProps {
  readonly proposals: readonly ProposalSummary[];
  /** Who looks: the next thing to do is theirs. */
  readonly memberId: string;
  readonly caption: string;
  /** False where all are of one author. */
  readonly withAuthor?: boolean;
}

/** Proposals as rows of a day book, with the next thing to do in the last column. */
export function ProposalLedger({ proposals, memberId, caption, withAuthor = true }: ProposalLedgerProps): ReactElement {
  return (
    <table className="ledger">
      <caption className="heard">{caption}</caption>
      <thead>
        <tr>
          <th scope="col">Since</th>
          <th scope="col">Page</th>
          <th scope="col">What changed, and why</th>
          {withAuthor ? <th scope="col">By</th> : null}
          <th scope="col">Where it stands</th>
          <th scope="col">
            <span className="heard">What to do</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {proposals.map((proposal) => (
          <Row key={proposal.id} proposal={proposal} memberId={memberId} withAuthor={withAuthor} />
        ))}
      </tbody>
    </table>
  );
}

interface RowProps {
  readonly proposal: ProposalSummary;
  readonly memberId: string;
  readonly withAuthor: boolean;
}

function Row({ proposal, memberId, withAuthor }: RowProps): ReactElement {
  const { verb, path } = nextStep(proposal, memberId);
  return (
    <tr>
      <td className="ledger-day">{dayOf(standsSince(proposal))}</td>
      <th scope="row">
        <Link className="ledger-name" to={paths.proposal(proposal.id)}>
          {proposal.title}
        </Link>
        <p className="ledger-summary">
          {proposal.baseRevision === null ? 'New: ' : ''}
          {shelfLabels[proposal.shelf]} / {proposal.subject} / {proposal.page}
        </p>
      </th>
      <td>{proposal.summary}</td>
      {withAuthor ? <td data-label="By">{proposal.author.id === memberId ? 'you' : proposal.author.name}</td> : null}
      <td>
        {stateLabels[proposal.state]}
        {remarksOn(proposal).map((remark) => (
          <span key={remark} className="ledger-remark">
            {remark}
          </span>
        ))}
      </td>
      <td className="ledger-do">
        <Link to={path}>
          {verb}
          <span className="heard">: {proposal.title}</span>
        </Link>
      </td>
    </tr>
  );
}

/** What whoever opens it should know before. */
function remarksOn(proposal: ProposalSummary): string[] {
  const { stops, fallenBehind, notes } = proposal;
  return [
    isOpen(proposal) && stops > 0 ? `${counted(stops, 'finding stops', 'findings stop')} it` : '',
    fallenBehind ? 'fallen behind' : '',
    notes > 0 ? counted(notes, 'note') : '',
  ].filter((remark) => remark !== '');
}
