import type { ParsePool } from '../../server/pages/parse-pool-types.ts';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { accept, refuse } from '../../shared/lib/result.ts';

/** Reads texts with the book's own parser in the test's own thread: the pool's threads have their own tests. */
export function createDirectParsePool(): ParsePool {
  return {
    async parse({ markdown, context, address, variant }) {
      const text = readPage(markdown, context);
      if (!text.ok) return refuse({ kind: 'text', refusal: text.refusal });
      return accept({ text: text.value, html: renderPage(text.value, { address, variant, marks: 'shown' }) });
    },
    close: () => Promise.resolve(),
  };
}
