import { dialectVersion } from '../../shared/dialect/dialect-version.ts';
import type { PageText, TextRefusal } from '../../shared/dialect/page-text.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { createRecent } from '../../shared/lib/recent.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import { anyVariant, appliesToAll } from '../../shared/pages/applicability.ts';
import type { Database } from '../db/client.ts';
import { transact } from '../db/transact.ts';
import { createDerivedWriter } from './derived-store.ts';
import type { PagePublication } from './page-publication.ts';
import type { PageReader, PageRow, RevisionRow } from './page-store.ts';
import type { ParsePool } from './parse-pool-types.ts';

/** Texts and renderings kept in memory: some tens of megabytes at most, with pages of the longest allowed length. */
const textsKept = 100;
const renderingsKept = 200;

/** A published page's text as read, and as a reader of a variant sees it. */
export interface PageTexts {
  text(address: PageAddress, page: PageRow, revision: RevisionRow): Promise<PageText>;
  html(address: PageAddress, revision: RevisionRow, text: PageText, variant: Variant): string;
}

/**
 * What a revision shows that this version of the dialect refuses to read: its own text, as it was written. Nothing that
 * was published is ever dropped.
 */
function unreadText(
  { kind, summary }: PageRow,
  { title }: RevisionRow,
  markdown: string,
  refusal: TextRefusal,
): PageText {
  return {
    frontMatter: {
      title,
      kind,
      summary,
      applies: appliesToAll,
      colours: { name: 'jis' },
      wireStandard: 'jis',
      sources: [],
      facts: {
        maker: null,
        model: null,
        years: null,
        markets: [],
        voltage: null,
        ignition: null,
        charging: null,
        battery: null,
        earth: null,
      },
    },
    outline: [],
    sections: [],
    blocks: [],
    findings: [{ code: 'block-unreadable', severity: 'stop', message: refusal.message, line: refusal.line ?? 1 }],
    tree: {
      type: 'root',
      children: [{ type: 'element', tagName: 'pre', properties: {}, children: [{ type: 'text', value: markdown }] }],
    },
  };
}

/** Reads published texts once a revision and dialect, and renders them once a variant. */
export function createPageTexts(
  database: Database,
  reader: PageReader,
  publication: PagePublication,
  parsePool: ParsePool,
): PageTexts {
  const texts = createRecent<string, PageText>(textsKept);
  const renderings = createRecent<string, string>(renderingsKept);
  const derived = createDerivedWriter(database);

  async function read(address: PageAddress, page: PageRow, revision: RevisionRow): Promise<PageText> {
    const kept = reader.rendition(revision.id, dialectVersion);
    if (kept !== null) return kept;
    const markdown = reader.requireBody(revision.id);
    const request = { markdown, context: publication.context(address), address, variant: anyVariant };
    const parsed = await parsePool.parse(request, null);
    if (parsed.ok) {
      const { text } = parsed.value;
      transact(database, (writing) => derived.writeRendition(writing, revision.id, text));
      return text;
    }
    if (parsed.refusal.kind === 'text') return unreadText(page, revision, markdown, parsed.refusal.refusal);
    throw new Error(`Revision ${revision.id} could not be read: ${parsed.refusal.kind}`);
  }

  return {
    async text(address, page, revision) {
      const kept = texts.get(revision.id);
      if (kept !== undefined) return kept;
      const text = await read(address, page, revision);
      texts.set(revision.id, text);
      return text;
    },
    html(address, revision, text, variant) {
      const key = JSON.stringify([revision.id, variant.year, variant.market, variant.frame]);
      const kept = renderings.get(key);
      if (kept !== undefined) return kept;
      const html = renderPage(text, { address, variant, marks: 'shown' });
      renderings.set(key, html);
      return html;
    },
  };
}
