import { formatPageAddress } from '../pages/address.ts';
import type { SearchDocument } from './search-document.ts';

/** A page as the prose index takes it. */
export interface ProsePage {
  /** `donors/qf550/quirks`. */
  readonly key: string;
  readonly title: string;
  readonly subjectTitle: string;
  /** Null while only titles and headings are known. */
  readonly summary: string | null;
  readonly cautions: readonly (string | null)[];
  readonly opening: string;
  readonly sections: readonly { readonly id: string; readonly heading: string; readonly text: string }[];
}

/** One page for the prose index, from its document. */
export function prosePageOf({ address, title, subjectTitle, summary, hazards, sections }: SearchDocument): ProsePage {
  return {
    key: formatPageAddress(address),
    title,
    subjectTitle,
    summary,
    cautions: hazards.map(({ text }) => text),
    opening: sections.find(({ id }) => id === '')?.text ?? '',
    sections: sections.filter(({ id }) => id !== ''),
  };
}
