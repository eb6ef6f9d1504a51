import type { Answer } from '../../shared/contracts/api.ts';
import type {
  CompareView,
  HomeView,
  PageData,
  PageView,
  PreviewView,
  RevisionsView,
  ShelfView,
  SubjectView,
} from '../../shared/contracts/views.ts';
import type { OutlineEntry, Section } from '../../shared/dialect/page-text.ts';
import type { Block } from '../../shared/blocks/block.ts';
import type { Actor } from '../../shared/members/member.ts';
import type { PageAddress, Shelf, SubjectAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import type { FrontMatter } from '../../shared/pages/front-matter.ts';

/** A published page as the search indexes it: everything that was read of its text but the tree. */
export interface PublishedDocument {
  readonly address: PageAddress;
  readonly subjectTitle: string;
  readonly revision: number;
  /** ISO 8601 in UTC. */
  readonly publishedAt: string;
  readonly frontMatter: FrontMatter;
  readonly outline: readonly OutlineEntry[];
  readonly sections: readonly Section[];
  readonly blocks: readonly Block[];
}

/** Reading the book. Each method mirrors one of `Api`, with who asks first; it is the guard of what it gives. */
export interface PageService {
  home(actor: Actor): Answer<HomeView>;
  shelf(actor: Actor, shelf: Shelf): Answer<ShelfView>;
  subject(actor: Actor, address: SubjectAddress): Answer<SubjectView>;
  page(actor: Actor, address: PageAddress, variant: Variant): Answer<PageView>;
  pageData(actor: Actor, address: PageAddress, variant: Variant): Answer<PageData>;
  revisions(actor: Actor, address: PageAddress): Answer<RevisionsView>;
  revision(actor: Actor, address: PageAddress, number: number, variant: Variant): Answer<PageView>;
  compare(actor: Actor, address: PageAddress, from: number, to: number): Answer<CompareView>;
  /** `networkAddress` is whose parsing time is rationed: 20 s a minute. */
  preview(actor: Actor, body: unknown, networkAddress: string): Answer<PreviewView>;

  /** Every page that is published and not retired, for the index; not guarded, so never hand it out as it is. */
  publishedDocuments(): Iterable<PublishedDocument>;
  /** One of them; null where it is not published or is retired. */
  publishedDocument(address: PageAddress): PublishedDocument | null;
}
