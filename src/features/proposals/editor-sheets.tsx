import type { ReactElement, ReactNode } from 'react';
import { Link, useActionData, useLoaderData, useLocation } from 'react-router';
import type { StartRequest } from '../../../shared/contracts/api.ts';
import { pageKindLabels } from '../../../shared/pages/page-kind.ts';
import { shelfLabels, subjectLabels } from '../../blocks/words.ts';
import { paths } from '../../lib/paths.ts';
import { shelfQuery, startQuery, subjectQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import type { editorAction } from './editor-action.ts';
import { Editor } from './editor.tsx';
import { furtherKinds, type changeLoader, type newPageLoader, type newSubjectLoader } from './editor-loaders.ts';
import { startOfProposal, startOfValues } from './editor-start.ts';
import { titleOf } from './page-title.ts';

/** Proposes a change of a page. */
export function ChangeSheet(): ReactElement {
  const { request, signedIn } = useLoaderData<typeof changeLoader>();
  return signedIn ? <Change request={request} /> : <SignedOut request={request} />;
}

/** Proposes a new donor, part or topic. */
export function NewSubjectSheet(): ReactElement {
  const { request, signedIn } = useLoaderData<typeof newSubjectLoader>();
  return signedIn ? <NewSubject request={request} /> : <SignedOut request={request} />;
}

/** Proposes a further page of a subject. */
export function NewPageSheet(): ReactElement {
  const { request, signedIn } = useLoaderData<typeof newPageLoader>();
  return signedIn ? <NewPage request={request} subject={request.subject ?? ''} /> : <SignedOut request={request} />;
}

interface RequestProps {
  readonly request: StartRequest;
}

function Change({ request }: RequestProps): ReactElement {
  const view = useAnswer(startQuery(useApi(), request));
  const { shelf, subject, page, subjectTitle, baseRevision } = view;
  if (subject === null || page === null) throw new Error('A change is of a page');
  const address = { shelf, subject, page };
  const title = titleOf(view.markdown) || page;
  return (
    <EditorSheet
      title={baseRevision === null ? `Write ${title}` : `Change ${title}`}
      line={
        <>
          <span className="title-line-kind">Proposal</span>
          <span>
            <Link to={paths.page(address)}>{subjectTitle === null ? title : `${subjectTitle}: ${title}`}</Link>
          </span>
          {baseRevision === null ? null : <span>From revision {baseRevision}</span>}
        </>
      }
      lead="Change the text. What you know and how you know it: name the source, and say where the book was wrong."
    >
      <OpenProposal id={view.openProposal} />
      {request.revision === null ? null : (
        <Notice look="warn" title={`This is the text of revision ${String(request.revision)}`}>
          <p>
            Sent as it stands, it undoes everything that was published since. Nothing is lost by it: going back is a new
            revision.
          </p>
        </Notice>
      )}
      <Editor key={`${String(request.revision)} ${page}`} start={startOfProposal(view, false)} />
    </EditorSheet>
  );
}

function NewSubject({ request }: RequestProps): ReactElement {
  const api = useApi();
  const view = useAnswer(startQuery(api, request));
  const { subjects } = useAnswer(shelfQuery(api, request.shelf));
  const what = subjectLabels[request.shelf].toLowerCase();
  return (
    <EditorSheet
      title={`A new ${what}`}
      line={
        <>
          <span className="title-line-kind">Proposal</span>
          <span>
            <Link to={paths.shelf(request.shelf)}>{shelfLabels[request.shelf]}</Link>
          </span>
        </>
      }
      lead={`It begins with its overview. The ${what}’s other pages can be written as soon as this one is published.`}
    >
      <Editor key={request.shelf} start={startOfProposal(view, true)} taken={subjects.map(({ slug }) => slug)} />
    </EditorSheet>
  );
}

function NewPage({ request, subject }: RequestProps & { readonly subject: string }): ReactElement {
  const api = useApi();
  const view = useAnswer(startQuery(api, request));
  const address = { shelf: request.shelf, subject };
  const { summary, pages } = useAnswer(subjectQuery(api, address));
  return (
    <EditorSheet
      title={`A new page of ${summary.title}`}
      line={
        <>
          <span className="title-line-kind">Proposal</span>
          <span>
            <Link to={paths.subject(address)}>{summary.title}</Link>
          </span>
        </>
      }
      lead="Choose what kind of page it is to be, and write over its skeleton."
    >
      <nav className="kinds" aria-label="Kinds of page">
        {furtherKinds.map((kind) => (
          <Link key={kind} to={`?kind=${kind}`} replace aria-current={kind === request.kind ? 'page' : undefined}>
            {pageKindLabels[kind]}
          </Link>
        ))}
      </nav>
      <Editor key={request.kind ?? ''} start={startOfProposal(view, false)} taken={pages.map(({ page }) => page)} />
    </EditorSheet>
  );
}

function OpenProposal({ id }: { readonly id: string | null }): ReactElement | null {
  if (id === null) return null;
  return (
    <Notice look="hint" title="You have a proposal of this page on its way">
      <p>What you write here becomes another one beside it.</p>
      <p className="button-row">
        <ButtonLink to={paths.revise(id)}>Go on with that one</ButtonLink>
      </p>
    </Notice>
  );
}

/** Nobody is signed in: whoever was while they wrote gets their text back, and everybody else the way in. */
function SignedOut({ request }: RequestProps): ReactElement {
  const posted = useActionData<typeof editorAction>();
  const start =
    posted === undefined
      ? null
      : startOfValues(posted.values, request.subject === null, request.subject !== null && request.page === null);
  return <SignInFirst>{start === null ? null : <Editor start={start} />}</SignInFirst>;
}

/** Asks to sign in, with whatever is to be gone on with. */
export function SignInFirst({ children }: { readonly children: ReactNode }): ReactElement {
  const { pathname, search } = useLocation();
  return (
    <EditorSheet
      title={children === null ? 'Sign in first' : 'You were signed out'}
      line={<span className="title-line-kind">Proposal</span>}
      lead={
        children === null
          ? 'Anybody may read and look. What changes the book is proposed by members, under their name.'
          : 'Nothing was lost: what you wrote stands below.'
      }
    >
      {children ?? (
        <p className="button-row">
          <ButtonLink look="primary" to={paths.signInAndReturn(pathname + search)}>
            Sign in and go on here
          </ButtonLink>
        </p>
      )}
    </EditorSheet>
  );
}

interface EditorSheetProps {
  readonly title: string;
  readonly line: ReactNode;
  readonly lead: string;
  readonly children: ReactNode;
}

/** The sheet round the editor. */
export function EditorSheet({ title, line, lead, children }: EditorSheetProps): ReactElement {
  return (
    <Sheet
      title={title}
      line={
        <nav className="title-line" aria-label="Where this belongs">
          {line}
        </nav>
      }
      lead={lead}
    >
      <PageHead title={`${title} · Earthstrap`} listed={false} />
      <div className="editor-sheet">{children}</div>
    </Sheet>
  );
}
