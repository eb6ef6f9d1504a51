import type { ReactElement } from 'react';
import { openProposals } from '../../blocks/proposal-words.ts';
import { paths } from '../../lib/paths.ts';
import { proposalsQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';

interface NextWaitingProps {
  /** The proposal that is done with. */
  readonly after: string;
  readonly memberId: string;
}

/** Leads on to what has waited longest for this moderator. */
export function NextWaiting({ after, memberId }: NextWaitingProps): ReactElement {
  const { proposals } = useAnswer(proposalsQuery(useApi(), 'waiting', false));
  const next = openProposals(proposals).find(({ id, author }) => id !== after && author.id !== memberId);
  return (
    <p className="button-row next-waiting unprinted">
      {next === undefined ? (
        <>
          <span>Nothing else waits for you.</span>
          <ButtonLink to={paths.home}>Go to the first page</ButtonLink>
        </>
      ) : (
        <ButtonLink look="primary" to={paths.proposal(next.id)}>
          Next: {next.title}
        </ButtonLink>
      )}
    </p>
  );
}
