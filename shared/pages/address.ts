/** The three collections of the book. */
export const shelves = ['donors', 'parts', 'reference'] as const;

/** One of the three collections. */
export type Shelf = (typeof shelves)[number];

/** Which subject: one donor, part or topic on its shelf. */
export interface SubjectAddress {
  readonly shelf: Shelf;
  readonly subject: string;
}

/** Which page of a subject. The overview's page is `overview`. */
export interface PageAddress extends SubjectAddress {
  readonly page: string;
}

/** Words that no donor, part or page may have as its slug, since the site's own addresses use them. */
export const reservedSlugs = ['new', 'path', 'findings', 'revisions', 'compare', 'propose'] as const;

/** True where the text is the name of a shelf. */
export function isShelf(text: string): text is Shelf {
  return (shelves as readonly string[]).includes(text);
}

/** `donors/qf550/pinouts`: the address of a page as it stands before a line's `#`. */
export function formatPageAddress({ shelf, subject, page }: PageAddress): string {
  return `${shelf}/${subject}/${page}`;
}

/** The site's path of a page: `/donors/qf550/pinouts`, and `/donors/qf550` for an overview. */
export function pagePath({ shelf, subject, page }: PageAddress): string {
  return page === 'overview' ? `/${shelf}/${subject}` : `/${shelf}/${subject}/${page}`;
}

/** The site's path of a line: its page's path with the line's own address as the fragment. */
export function linePath(address: PageAddress, line: string): string {
  return `${pagePath(address)}#${encodeURI(line)}`;
}
