import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { readPage } from '../../shared/dialect/read-page.ts';
import { isShelf, shelves, type PageAddress } from '../../shared/pages/address.ts';
import { searchDocumentOf, type PublishedText } from '../../shared/search/search-document-of.ts';
import type { SearchDocument } from '../../shared/search/search-document.ts';

const content = fileURLToPath(new URL('../../content/', import.meta.url));

/** The demo's pages as files of the seed, each with its address. */
export function demoPages(): { readonly address: PageAddress; readonly markdown: string }[] {
  return shelves.flatMap((shelf) =>
    readdirSync(`${content}${shelf}`).flatMap((subject) =>
      readdirSync(`${content}${shelf}/${subject}`).map((file) => ({
        address: { shelf, subject, page: file.replace(/\.md$/, '') },
        markdown: readFileSync(`${content}${shelf}/${subject}/${file}`, 'utf8'),
      })),
    ),
  );
}

/** The demo's pages as the store hands them to the search. */
export function demoTexts(): PublishedText[] {
  const read = demoPages().map(({ address, markdown }) => {
    const text = readPage(markdown);
    if (!text.ok) throw new Error(`${address.subject}/${address.page}: ${text.refusal.message}`);
    return { address, text: text.value };
  });
  return read.map(({ address, text }) => {
    const overview = read.find(
      (one) => isShelf(one.address.shelf) && one.address.subject === address.subject && one.address.page === 'overview',
    );
    return {
      address,
      subjectTitle: (overview?.text ?? text).frontMatter.title,
      frontMatter: text.frontMatter,
      outline: text.outline,
      sections: text.sections,
      blocks: text.blocks,
    };
  });
}

/** The demo's pages as the search indexes them. */
export function demoDocuments(): SearchDocument[] {
  return demoTexts().map(searchDocumentOf);
}
