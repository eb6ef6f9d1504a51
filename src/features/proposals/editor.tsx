import { useRef, useState, type MouseEvent, type ReactElement } from 'react';
import { useActionData, useFetcher } from 'react-router';
import { SignInFields } from '../../blocks/sign-in-fields.tsx';
import { viewerQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { useFirstProblem } from '../../lib/use-first-problem.ts';
import { useHydrated } from '../../lib/use-hydrated.ts';
import { Button } from '../../ui/button.tsx';
import { TextArea, TextField } from '../../ui/field.tsx';
import { Notice, ProblemNotice } from '../../ui/notice.tsx';
import { AddressField } from './address-field.tsx';
import type { editorAction } from './editor-action.ts';
import { EditorLook } from './editor-look.tsx';
import type { EditorStart } from './editor-start.ts';
import { previewBody } from './editor-values.ts';
import { KeptOffers } from './kept-offers.tsx';
import type { KeptText } from './kept-texts.ts';
import { goToLine } from './line-in-text.ts';
import { suggestedAddress, titleOf } from './page-title.ts';
import { useKeptText } from './use-kept-text.ts';
import { usePreview } from './use-preview.ts';

interface EditorProps {
  readonly start: EditorStart;
  /** Addresses that a new subject or page cannot have. */
  readonly taken?: readonly string[];
}

/** Where a page's text is written: the text, what changed and why, and beside them what the book makes of it. */
export function Editor({ start: given, taken = [] }: EditorProps): ReactElement {
  // An answer of the book that arrives later must not move the ground under what is being typed.
  const [start] = useState(given);
  const posted = useActionData<typeof editorAction>();
  const fetcher = useFetcher<typeof editorAction>();
  const outcome = fetcher.data ?? posted ?? null;
  const [first] = useState(() => posted?.values ?? start);
  const hydrated = useHydrated();
  const form = useRef<HTMLFormElement>(null);
  const text = useRef<HTMLTextAreaElement>(null);
  const summary = useRef<HTMLInputElement>(null);
  const findings = useRef<HTMLHeadingElement>(null);

  const [title, setTitle] = useState(() => titleOf(first.markdown));
  const [ownAddress, setOwnAddress] = useState<string | null>(
    () => (start.subject === null ? posted?.values.subject : posted?.values.page) ?? null,
  );
  const [typed, setTyped] = useState(0);
  const choosesAddress = start.subject === null || start.page === null;
  const address = ownAddress ?? suggestedAddress(title, start.placeholder);
  const member = useAnswer(viewerQuery(useApi())).member;
  const [memberId] = useState(member?.id ?? null);
  const kept = useKeptText(start.keptAs, memberId, start);
  const preview = usePreview(
    () =>
      previewBody({
        markdown: text.current?.value ?? first.markdown,
        shelf: start.shelf,
        subject: start.subject ?? address,
        page: start.page ?? address,
      }),
    typed,
    posted?.preview ? { view: posted.preview, markdown: posted.values.markdown } : null,
  );

  useFirstProblem(form, outcome);

  function written(): { markdown: string; summary: string } {
    return { markdown: text.current?.value ?? '', summary: summary.current?.value ?? '' };
  }
  function typing(): void {
    kept.keep(written());
  }
  function typingText(): void {
    typing();
    setTitle(titleOf(written().markdown));
    setTyped((times) => times + 1);
  }
  function takeBack(offered: KeptText): void {
    if (text.current === null || summary.current === null) return;
    text.current.value = offered.markdown;
    summary.current.value = offered.summary;
    kept.takeBack(offered);
    setTitle(titleOf(offered.markdown));
    setTyped((times) => times + 1);
    text.current.focus();
  }
  function lookOver(event: MouseEvent): void {
    // Looked over as one types: only the way to what was found is left to go.
    event.preventDefault();
    findings.current?.focus();
    findings.current?.scrollIntoView({ block: 'start' });
  }

  const { problem, needsSignIn } = outcome ?? { problem: null, needsSignIn: false };
  const proposal = outcome?.values.proposal ?? start.proposal;
  const busy = fetcher.state !== 'idle';
  return (
    <div className="editor">
      <fetcher.Form ref={form} className="editor-write form" method="post" noValidate>
        <KeptOffers offers={kept.offers} onTakeBack={takeBack} onThrowAway={kept.throwAway} />
        {problem === null ? null : (
          <ProblemNotice problem={problem}>
            {needsSignIn ? <p>What you wrote is here. Sign in below, and it goes on from where it stood.</p> : null}
          </ProblemNotice>
        )}
        {proposal !== null && start.proposal === null ? (
          <Notice look="good" title="What you wrote is kept as a draft">
            <p>It is on the sheet of your proposals, too.</p>
          </Notice>
        ) : null}
        {needsSignIn ? (
          <fieldset className="plate form">
            <legend className="heard">Sign in again</legend>
            <SignInFields email={member?.email ?? ''} problem={problem} />
          </fieldset>
        ) : null}
        <HiddenFields start={start} proposal={proposal} />
        {choosesAddress ? (
          <AddressField
            start={start}
            value={address}
            onChange={setOwnAddress}
            taken={taken}
            problem={problem?.fields?.[start.subject === null ? 'subject' : 'page']}
          />
        ) : null}
        <TextArea
          ref={text}
          className="editor-text"
          label="The page’s text"
          name="markdown"
          defaultValue={first.markdown}
          onInput={typingText}
          rows={24}
          spellCheck={false}
          autoCapitalize="off"
          autoComplete="off"
          problem={problem?.fields?.['markdown']}
        />
        <TextField
          ref={summary}
          label="What did you change, and why?"
          hint="In a sentence. It stands beside the revision for good."
          name="summary"
          defaultValue={first.summary}
          onInput={typing}
          maxLength={300}
          autoComplete="off"
          problem={problem?.fields?.['summary']}
        />
        <div className="button-row">
          <Button name="do" value="look" onClick={hydrated ? lookOver : undefined}>
            Look it over
          </Button>
          {start.waiting ? null : (
            <Button name="do" value="keep" disabled={busy}>
              Keep as draft
            </Button>
          )}
          <Button name="do" value="send" look="primary" disabled={busy}>
            {start.waiting ? 'Send this text instead' : 'Send to the moderators'}
          </Button>
        </div>
        <p className="soft small" role="status">
          {keepingWords(kept.keeping)}
        </p>
      </fetcher.Form>
      <EditorLook
        ref={findings}
        preview={preview}
        onLine={hydrated ? (line) => text.current !== null && goToLine(text.current, line) : undefined}
        alive={hydrated}
      />
    </div>
  );
}

function HiddenFields({
  start,
  proposal,
}: {
  readonly start: EditorStart;
  readonly proposal: string | null;
}): ReactElement {
  const fields = {
    shelf: start.shelf,
    subject: start.subject,
    page: start.page,
    'base-revision': start.baseRevision === null ? '' : String(start.baseRevision),
    proposal,
    waiting: String(start.waiting),
    placeholder: start.placeholder,
    'kept-as': start.keptAs,
  };
  return (
    <>
      {Object.entries(fields).map(([name, value]) =>
        value === null ? null : <input key={name} type="hidden" name={name} value={value} />,
      )}
    </>
  );
}

function keepingWords(keeping: boolean | null): string {
  if (keeping === null)
    return 'A draft is yours alone. What you send the moderators see, and you can change it until they decide.';
  return keeping
    ? 'Kept in this browser as you type.'
    : 'This browser keeps nothing (its storage is full or forbidden): keep a draft before you leave.';
}
