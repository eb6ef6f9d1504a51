import type { ProposalView, StartView } from '../../../shared/contracts/views.ts';
import { formatPageAddress, type Shelf } from '../../../shared/pages/address.ts';
import type { EditorValues } from './editor-values.ts';
import { keptKey } from './kept-texts.ts';
import { titleOf } from './page-title.ts';

/** What the editor starts from, wherever that comes from. */
export interface EditorStart {
  readonly shelf: Shelf;
  /** Null where its writer still chooses the address: of a new subject, or of a new page. */
  readonly subject: string | null;
  readonly page: string | null;
  readonly baseRevision: number | null;
  readonly markdown: string;
  readonly summary: string;
  /** The proposal that this is a further text of. */
  readonly proposal: string | null;
  /** True where the proposal waits: what is sent becomes its newest version at once, and there is no draft. */
  readonly waiting: boolean;
  /** A skeleton's title that suggests no address. */
  readonly placeholder: string;
  /** Where the browser keeps what is typed. */
  readonly keptAs: string;
}

/** Starts a proposal: a change of a page, a new page, or a new subject by its overview. */
export function startOfProposal(view: StartView, isNewSubject: boolean): EditorStart {
  const { shelf, subject, page, baseRevision, markdown, summary } = view;
  return {
    ...{ shelf, baseRevision, markdown, summary },
    subject: isNewSubject ? null : subject,
    page,
    proposal: null,
    waiting: false,
    placeholder: isNewSubject ? titleOf(markdown) : '',
    keptAs: keptKey([shelf, subject ?? 'new', page ?? 'new'].join('/'), baseRevision),
  };
}

/**
 * Goes on with a proposal from its newest text; or, where the page was published anew meanwhile, from the published text,
 * with the writer's own kept beside it.
 */
export function startOfRevising(proposal: ProposalView, fromPublished: boolean): EditorStart {
  const { id, shelf, subject, page, summary, state, publishedMarkdown, publishedRevision } = proposal;
  const own = ownText(proposal);
  const base = fromPublished && publishedMarkdown !== null ? publishedRevision : proposal.baseRevision;
  return {
    ...{ shelf, subject, page, summary },
    baseRevision: base,
    markdown: fromPublished ? (publishedMarkdown ?? own) : own,
    proposal: id,
    waiting: state === 'waiting',
    placeholder: '',
    keptAs: keptKey(`proposal ${id} ${formatPageAddress({ shelf, subject, page })}`, base),
  };
}

/** Starts from what was sent and came back, where nothing else is known any more: whoever sent it is signed out. */
export function startOfValues(values: EditorValues, choosesSubject: boolean, choosesPage: boolean): EditorStart {
  return {
    ...values,
    subject: choosesSubject ? null : values.subject,
    page: choosesPage ? null : values.page,
    placeholder: '',
  };
}

/** The newest text of a proposal. */
export function ownText({ versions }: ProposalView): string {
  return versions.at(-1)?.markdown ?? '';
}
