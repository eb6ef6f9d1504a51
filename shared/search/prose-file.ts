import { formatPageAddress } from '../pages/address.ts';
import type { LinesIndex } from './lines-index.ts';
import type { ProsePage } from './prose-page.ts';
import { proseVersion } from './prose-options.ts';
import type { SearchDocument } from './search-document.ts';

/** One page's prose: its summary, its cautions' words (null for the book's own), and the text under each heading. */
export type PackedProse = readonly [
  address: string,
  summary: string,
  cautions: readonly (string | null)[],
  /** What stands before the first heading comes first. */
  texts: readonly string[],
];

/** The prose of the book as it goes over the wire: text without tables; titles and headings are in the lines file. */
export interface ProseFile {
  readonly version: typeof proseVersion;
  readonly pages: readonly PackedProse[];
}

/** Puts documents' prose into the form that goes over the wire. */
export function buildProseFile(documents: readonly SearchDocument[]): ProseFile {
  return { version: proseVersion, pages: documents.map(packProse) };
}

function packProse({ address, summary, hazards, sections }: SearchDocument): PackedProse {
  const opening = sections.find(({ id }) => id === '')?.text ?? '';
  const texts = sections.filter(({ id }) => id !== '').map(({ text }) => text);
  return [formatPageAddress(address), summary, hazards.map(({ text }) => text), [opening, ...texts]];
}

/** True where a value that came over the wire is a prose file of this version. */
export function isProseFile(value: unknown): value is ProseFile {
  return (
    typeof value === 'object' &&
    value !== null &&
    'version' in value &&
    value.version === proseVersion &&
    'pages' in value
  );
}

/** The pages of a book for the prose index: titles and headings from the lines, the rest from the prose where it is there. */
export function prosePages(index: LinesIndex, file: ProseFile | null): ProsePage[] {
  const packed = new Map(file?.pages.map((page) => [page[0], page]));
  return index.pages.map(({ address, subject, title, headings }) => {
    const key = formatPageAddress(address);
    const prose = packed.get(key);
    const texts = prose?.[3];
    const fits = texts?.length === headings.length + 1;
    return {
      key,
      title,
      subjectTitle: index.subjects[subject]?.title ?? '',
      summary: prose?.[1] ?? null,
      cautions: prose?.[2] ?? [],
      opening: fits ? (texts[0] ?? '') : '',
      sections: headings.map(({ id, text }, at) => ({ id, heading: text, text: fits ? (texts[at + 1] ?? '') : '' })),
    };
  });
}
