import { useRef, type ReactElement } from 'react';
import { Form, Link, useActionData, useFetcher, useLoaderData } from 'react-router';
import type { ProposalSummary } from '../../../shared/contracts/views.ts';
import { ProposalLedger } from '../../blocks/proposal-ledger.tsx';
import { decidedProposals, openProposals } from '../../blocks/proposal-words.ts';
import { variantWords, type Bench } from '../../lib/bench.ts';
import { paths } from '../../lib/paths.ts';
import { proposalsQuery, subjectQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { useFirstProblem } from '../../lib/use-first-problem.ts';
import { Button, ButtonLink } from '../../ui/button.tsx';
import { TextField } from '../../ui/field.tsx';
import { Notice, ProblemNotice } from '../../ui/notice.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { EmptyPlace, PlainSection, Sheet } from '../../ui/sheet.tsx';
import type { accountAction, accountLoader } from './account.ts';
import { roleWords } from './role-words.ts';

/** A member's own sheet. */
export function AccountSheet(): ReactElement {
  const { member, bench, passwordChanged } = useLoaderData<typeof accountLoader>();
  const { proposals } = useAnswer(proposalsQuery(useApi(), null, true));
  const { name, may } = roleWords[member.role];
  return (
    <Sheet
      title={member.name}
      line={
        <div className="title-line">
          <span className="title-line-kind">{name}</span>
          <span>{member.email}</span>
        </div>
      }
      lead={may}
    >
      <PageHead title={`${member.name} · Earthstrap`} listed={false} />
      {passwordChanged ? (
        <Notice look="good" title="Your password is changed">
          <p>Every other browser that you were signed in with has been signed out.</p>
        </Notice>
      ) : null}
      <PlainSection id="my-proposals" title="My proposals">
        {proposals.length === 0 ? (
          <EmptyPlace>
            <p>
              You have proposed nothing yet. If something in the book is not as it is on your bike, open that page and
              propose what you found.
            </p>
            <ButtonLink look="primary" to={paths.shelf('donors')}>
              Find the page
            </ButtonLink>
          </EmptyPlace>
        ) : (
          <MyProposals proposals={proposals} memberId={member.id} />
        )}
      </PlainSection>
      <PlainSection id="my-bench" title="On my bench">
        <OnTheBench bench={bench} />
      </PlainSection>
      <PlainSection id="my-password" title="My password">
        <ChangePassword key={String(passwordChanged)} />
      </PlainSection>
      <Form className="sheet-section" method="post" action={paths.signOut}>
        <Button>Sign out</Button>
      </Form>
    </Sheet>
  );
}

interface MyProposalsProps {
  readonly proposals: readonly ProposalSummary[];
  readonly memberId: string;
}

/** So many of those that were decided are shown here; the ledger has them all. */
const decidedShown = 5;

function MyProposals({ proposals, memberId }: MyProposalsProps): ReactElement {
  const open = openProposals(proposals);
  const decided = decidedProposals(proposals);
  const ledger = { memberId, withAuthor: false } as const;
  return (
    <>
      {open.length === 0 ? (
        <p>Nothing of yours is on its way.</p>
      ) : (
        <ProposalLedger {...ledger} proposals={open} caption="My proposals on their way, the oldest first" />
      )}
      {decided.length === 0 ? null : (
        <>
          <h3>Decided lately</h3>
          <ProposalLedger
            {...ledger}
            proposals={decided.slice(0, decidedShown)}
            caption="My proposals decided lately"
          />
          {decided.length <= decidedShown ? null : (
            <p>
              <Link to={`${paths.proposals}?state=decided`}>All {decided.length} that were decided</Link>
            </p>
          )}
        </>
      )}
    </>
  );
}

function OnTheBench({ bench }: { readonly bench: Bench }): ReactElement {
  if (bench.donor !== null) return <DonorOnTheBench donor={bench.donor} bench={bench} />;
  return (
    <EmptyPlace>
      <p>Nothing yet. Say which donor stands in front of you, and its lines come first wherever you look.</p>
      <ButtonLink to={paths.bench}>Put a donor on the bench</ButtonLink>
    </EmptyPlace>
  );
}

function DonorOnTheBench({ donor, bench }: { readonly donor: string; readonly bench: Bench }): ReactElement {
  const subject = { shelf: 'donors', subject: donor } as const;
  const { summary } = useAnswer(subjectQuery(useApi(), subject));
  const words = variantWords(bench.variant);
  return (
    <>
      <p>
        <Link to={paths.subject(subject)}>{summary.title}</Link>
        {words === null ? '' : `, ${words}`}
      </p>
      <ButtonLink to={paths.bench}>Change what is on it</ButtonLink>
    </>
  );
}

function ChangePassword(): ReactElement {
  const posted = useActionData<typeof accountAction>();
  const fetcher = useFetcher<typeof accountAction>();
  const problem = (fetcher.data ?? posted)?.problem ?? null;
  const form = useRef<HTMLFormElement>(null);
  useFirstProblem(form, problem);
  return (
    <fetcher.Form ref={form} className="form" method="post" action={paths.account} noValidate>
      {problem === null ? null : <ProblemNotice problem={problem} />}
      <TextField
        label="The password that you have now"
        name="current"
        type="password"
        autoComplete="current-password"
        problem={problem?.fields?.['current']}
      />
      <TextField
        label="The new one"
        hint="At least 10 characters. Three or four words that do not belong together are good, and can be remembered."
        name="next-password"
        type="password"
        autoComplete="new-password"
        problem={problem?.fields?.['next']}
      />
      <TextField
        label="The new one, once more"
        name="again"
        type="password"
        autoComplete="new-password"
        problem={problem?.fields?.['again']}
      />
      <Button disabled={fetcher.state !== 'idle'}>Change the password</Button>
    </fetcher.Form>
  );
}
