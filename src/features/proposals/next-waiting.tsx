import type { ReactElement } from 'react';
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
  const [next] = proposals
    .filter(({ id, author }) => id !== after && author.id !== memberId)
    .toSorted((a, b) => (waitsSince(a) < waitsSince(b) ? -1 : 1));
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

function waitsSince({ sentAt, createdAt }: { readonly sentAt: string | null; readonly createdAt: string }): string {
  return sentAt ?? createdAt;
}
