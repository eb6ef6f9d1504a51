import { useRef, type ReactElement } from 'react';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { useFirstProblem } from '../../lib/use-first-problem.ts';
import { Button } from '../../ui/button.tsx';
import { TextArea } from '../../ui/field.tsx';
import { Notice, ProblemNotice } from '../../ui/notice.tsx';
import type { FindingView } from './findings-list.tsx';
import { useProposalForm } from './use-proposal-form.ts';

/** What a moderator decides by: publish it, send it back with a note, or decline it with a reason. */
export function Decision({ proposal }: { readonly proposal: ProposalView }): ReactElement {
  return (
    <div className="decision">
      <Publish proposal={proposal} />
      <SendBack fallenBehind={proposal.fallenBehind} />
      <Decline />
    </div>
  );
}

/** A text that the book could not read; nothing can let that through. */
const unreadCode = 'text-unread';

function Publish({ proposal }: { readonly proposal: ProposalView }): ReactElement {
  const { Form, action, outcome, busy } = useProposalForm('publish');
  const form = useRef<HTMLFormElement>(null);
  useFirstProblem(form, outcome);
  if (proposal.fallenBehind) {
    return (
      <p>
        It cannot be published as it is: the page was published anew meanwhile, and this would undo it. Send it back,
        and its author can bring it up to date.
      </p>
    );
  }
  if (proposal.findings.some(({ code }) => code === unreadCode)) {
    return <p>It cannot be published: the book cannot read its text. Send it back with a note.</p>;
  }
  const stops = stopsOf(proposal.findings);
  return (
    <Form ref={form} className="form" method="post" action={action} noValidate>
      {outcome === null ? null : <ProblemNotice problem={outcome.problem} />}
      <input type="hidden" name="version" value={proposal.versions.at(-1)?.number ?? 1} />
      {stops.length === 0 ? null : (
        <p>
          The book would not publish this. You can let each of these through with a reason, which the page will carry
          from then on; or send it back.
        </p>
      )}
      {stops.map((stop, number) => (
        <Override
          key={`${stop.code} ${stop.address ?? ''}`}
          stop={stop}
          number={number}
          reason={outcome?.values[`reason-${String(number)}`] ?? ''}
          problem={isMissing(stop, outcome?.problem.missing) ? 'Give a reason, or send it back.' : undefined}
        />
      ))}
      <Button look="primary" name="do" value="publish" disabled={busy}>
        Publish
      </Button>
    </Form>
  );
}

interface OverrideProps {
  readonly stop: FindingView;
  readonly number: number;
  readonly reason: string;
  readonly problem: string | undefined;
}

function Override({ stop, number, reason, problem }: OverrideProps): ReactElement {
  return (
    <Notice look="stop" title={stop.message}>
      <input type="hidden" name={`code-${String(number)}`} value={stop.code} />
      <input type="hidden" name={`address-${String(number)}`} value={stop.address ?? ''} />
      <TextArea
        label={
          stop.address === undefined
            ? 'Why it may be published all the same'
            : `Why ${stop.address.slice(1)} may be published all the same`
        }
        name={`reason-${String(number)}`}
        rows={2}
        defaultValue={reason}
        problem={problem}
      />
    </Notice>
  );
}

/** What stops a publication, each once: a reason is given for a code at an address. */
export function stopsOf(findings: readonly FindingView[]): FindingView[] {
  const stops = findings.filter(({ severity }) => severity === 'stop');
  return stops.filter((stop, index) => stops.findIndex((other) => isSame(stop, other)) === index);
}

function isSame(a: Pick<FindingView, 'code' | 'address'>, b: Pick<FindingView, 'code' | 'address'>): boolean {
  return a.code === b.code && a.address === b.address;
}

function isMissing(stop: FindingView, missing: readonly { code: string; address: string | null }[] = []): boolean {
  return missing.some(({ code, address }) => code === stop.code && address === (stop.address ?? null));
}

function SendBack({ fallenBehind }: { readonly fallenBehind: boolean }): ReactElement {
  const { Form, action, outcome, busy } = useProposalForm('send-back');
  const form = useRef<HTMLFormElement>(null);
  useFirstProblem(form, outcome);
  return (
    <details className="decision-with-words" open={outcome !== null || fallenBehind}>
      <summary className="button button-plain">Send back</summary>
      <Form ref={form} className="form" method="post" action={action} noValidate>
        {outcome === null ? null : <ProblemNotice problem={outcome.problem} />}
        <TextArea
          label="What its author should do"
          hint="Say what is missing or wrong, and how you know. They answer it and send it again."
          name="note"
          rows={4}
          defaultValue={outcome?.values['note']}
          problem={outcome?.problem.fields?.['note']}
        />
        <Button name="do" value="send-back" disabled={busy}>
          Send it back with this note
        </Button>
      </Form>
    </details>
  );
}

function Decline(): ReactElement {
  const { Form, action, outcome, busy } = useProposalForm('decline');
  const form = useRef<HTMLFormElement>(null);
  useFirstProblem(form, outcome);
  return (
    <details className="decision-with-words" open={outcome !== null}>
      <summary className="button button-plain">Decline</summary>
      <Form ref={form} className="form" method="post" action={action} noValidate>
        {outcome === null ? null : <ProblemNotice problem={outcome.problem} />}
        <TextArea
          label="Why the book will not have it"
          hint="Its author reads this. Declining ends the proposal; its text is kept."
          name="reason"
          rows={4}
          defaultValue={outcome?.values['reason']}
          problem={outcome?.problem.fields?.['reason']}
        />
        <Button look="grave" name="do" value="decline" disabled={busy}>
          Decline it for this reason
        </Button>
      </Form>
    </details>
  );
}
