import type { PageText, SubjectContext, TextRefusal } from '../../shared/dialect/page-text.ts';
import type { Result } from '../../shared/lib/result.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';

/** A text to read and render away from the server's own thread. */
export interface ParseRequest {
  readonly markdown: string;
  readonly context: SubjectContext;
  /** Null for a text that has no page yet. */
  readonly address: PageAddress | null;
  readonly variant: Variant;
}

/** A text read, and its safe HTML. */
export interface ParsedPage {
  readonly text: PageText;
  readonly html: string;
}

/** Why a text was not read: its own limits, too many texts at once, or the asker's time is used up. */
export type ParseRefusal =
  | { readonly kind: 'text'; readonly refusal: TextRefusal }
  | { readonly kind: 'busy' }
  | { readonly kind: 'rationed'; readonly retryAfterSeconds: number };

/**
 * Whose parsing time is used: `member:{id}`, a network address, or null for the book's own work (seed, publication,
 * rebuilding), which is not rationed.
 */
export type ParseAsker = string | null;

export interface ParsePool {
  parse(request: ParseRequest, asker: ParseAsker): Promise<Result<ParsedPage, ParseRefusal>>;
  /** Ends the workers; whatever still waits is answered `busy`. */
  close(): Promise<void>;
}

/** What a worker says: that it begins to read what it was sent, and then how that ended. */
export type FromParseWorker =
  | { readonly kind: 'reading' }
  | { readonly kind: 'read'; readonly page: ParsedPage }
  | { readonly kind: 'refused'; readonly refusal: TextRefusal }
  | { readonly kind: 'failed'; readonly stack: string };
