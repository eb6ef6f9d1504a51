import type { PageAddress } from '../../shared/pages/address.ts';

/** What has become of the book, told after the commit. */
export interface BookEvent {
  readonly kind: 'published';
  readonly address: PageAddress;
  /** The revision's number. */
  readonly revision: number;
}

export type BookListener = (event: BookEvent) => void;

/** Tells whoever listens (kept pages, search) what was published. */
export interface BookEvents {
  /** Gives the function that stops listening. */
  listen(listener: BookListener): () => void;
  tell(event: BookEvent): void;
}

/**
 * Makes the book's events.
 * @param onFailure what to do with what a listener throws: the publication stands, and the other listeners still hear of it
 */
export function createBookEvents(onFailure: (failure: unknown, event: BookEvent) => void): BookEvents {
  const listeners = new Set<BookListener>();
  return {
    listen(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    tell(event) {
      for (const listener of [...listeners]) {
        try {
          listener(event);
        } catch (failure) {
          onFailure(failure, event);
        }
      }
    },
  };
}
