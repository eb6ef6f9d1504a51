import {
  formatPageAddress,
  pagePath,
  type PageAddress,
  type Shelf,
  type SubjectAddress,
} from '../../shared/pages/address.ts';
import { anyVariant, type Variant } from '../../shared/pages/applicability.ts';
import { variantQuery } from './bench.ts';

/** Every address of the site, so that no sheet writes one by hand. */
export const paths = {
  home: '/',
  bench: '/bench',
  face: '/face',
  signIn: '/sign-in',
  signOut: '/sign-out',
  account: '/account',
  proposals: '/proposals',

  signInAndReturn: (next: string): string => `/sign-in?next=${encodeURIComponent(next)}`,
  proposal: (id: string): string => `/proposals/${encodeURIComponent(id)}`,
  /** Where an author goes on writing; from the text that was published meanwhile, where their proposal has fallen behind. */
  revise: (id: string, from?: 'published'): string =>
    `/proposals/${encodeURIComponent(id)}/revise${from === undefined ? '' : `?from=${from}`}`,
  search: (query?: string): string => (query === undefined ? '/search' : `/search?q=${encodeURIComponent(query)}`),

  shelf: (shelf: Shelf): string => `/${shelf}`,
  newSubject: (shelf: Shelf): string => `/${shelf}/new`,
  subject: ({ shelf, subject }: SubjectAddress, variant: Variant = anyVariant): string =>
    `/${shelf}/${subject}${variantQuery(variant)}`,
  page: (address: PageAddress, variant: Variant = anyVariant): string => `${pagePath(address)}${variantQuery(variant)}`,
  line: (address: PageAddress, line: string): string => `${pagePath(address)}#${encodeURI(line)}`,

  /** A new page of a subject that is there already. */
  newPage: ({ shelf, subject }: SubjectAddress): string => `/${shelf}/${subject}/new`,
  propose: (address: PageAddress, revision?: number): string =>
    `/${formatPageAddress(address)}/propose${revision === undefined ? '' : `?revision=${String(revision)}`}`,
  revisions: (address: PageAddress): string => `/${formatPageAddress(address)}/revisions`,
  revision: (address: PageAddress, number: number): string =>
    `/${formatPageAddress(address)}/revisions/${String(number)}`,
  /** Where two revisions are chosen for: the form adds which. */
  compareTwo: (address: PageAddress): string => `/${formatPageAddress(address)}/compare`,
  compare: (address: PageAddress, from: number, to: number): string =>
    `/${formatPageAddress(address)}/compare?from=${String(from)}&to=${String(to)}`,
};
