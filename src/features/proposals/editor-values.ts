import type { PreviewBody } from '../../../shared/contracts/bodies.ts';
import { isSlug } from '../../../shared/lib/slug.ts';
import type { Shelf } from '../../../shared/pages/address.ts';
import { isShelf } from '../../../shared/pages/address.ts';
import { readText } from '../../lib/form-fields.ts';
import { suggestedAddress, titleOf } from './page-title.ts';

/** Everything that the editor's form sends, so that all of it can be given back. */
export interface EditorValues {
  readonly shelf: Shelf;
  /** Empty where no address is written and the title suggests none. */
  readonly subject: string;
  readonly page: string;
  readonly baseRevision: number | null;
  readonly markdown: string;
  readonly summary: string;
  readonly proposal: string | null;
  readonly waiting: boolean;
  readonly keptAs: string;
}

/** Reads the editor's form; null where it names no shelf, so that it cannot be this form. */
export function readEditorValues(form: FormData): EditorValues | null {
  const shelf = readText(form, 'shelf');
  if (!isShelf(shelf)) return null;
  // A form's lines end with two characters; the book's with one.
  const markdown = readText(form, 'markdown').replace(/\r\n?/g, '\n');
  const base = readText(form, 'base-revision');
  const suggestion = suggestedAddress(titleOf(markdown), readText(form, 'placeholder'));
  return {
    shelf,
    subject: readText(form, 'subject').trim() || suggestion,
    page: readText(form, 'page').trim() || suggestion,
    baseRevision: base === '' ? null : Number(base),
    markdown,
    summary: readText(form, 'summary'),
    proposal: readText(form, 'proposal') || null,
    waiting: readText(form, 'waiting') === 'true',
    keptAs: readText(form, 'kept-as'),
  };
}

/** What is asked to look a text over: with its address as far as it has one, since other pages of the subject count. */
export function previewBody(text: Pick<EditorValues, 'markdown' | 'shelf' | 'subject' | 'page'>): PreviewBody {
  const { markdown, shelf, subject, page } = text;
  if (!isSlug(subject)) return { markdown, shelf };
  return isSlug(page) ? { markdown, shelf, subject, page } : { markdown, shelf, subject };
}
