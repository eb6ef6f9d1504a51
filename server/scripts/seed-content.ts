import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse as parseYaml } from 'yaml';
import { z } from 'zod';
import { isSlug } from '../../shared/lib/slug.ts';
import { formatPageAddress, isShelf, shelves, type PageAddress } from '../../shared/pages/address.ts';

/** One text of a page and what its author said that changed. */
export interface SeedRevision {
  readonly markdown: string;
  readonly summary: string;
}

/** A page of `content/`, with every text that it had, oldest first. */
export interface SeedPage {
  readonly address: PageAddress;
  readonly revisions: readonly [SeedRevision, ...SeedRevision[]];
}

/** A proposal that nobody has published yet. */
export interface SeedProposal {
  readonly address: PageAddress;
  readonly markdown: string;
  readonly summary: string;
  /** What the moderator said when they sent it back; null where it still waits. */
  readonly sentBack: string | null;
}

/** Everything that the demo's book begins with. */
export interface SeedContent {
  readonly pages: readonly SeedPage[];
  readonly proposals: readonly SeedProposal[];
}

const firstIssue = 'First issue';

const address = z.string().transform((text, context): PageAddress => {
  const [shelf = '', subject = '', page = '', ...rest] = text.split('/');
  if (isShelf(shelf) && isSlug(subject) && isSlug(page) && rest.length === 0) return { shelf, subject, page };
  context.addIssue({ code: 'custom', message: `${text} is no page’s address: write shelf/subject/page` });
  return z.NEVER;
});

/** Exchanges one stretch of a text, which must stand in it exactly once. */
const exchange = z.strictObject({ find: z.string().min(1), put: z.string() });
type Exchange = z.output<typeof exchange>;

const historySchema = z.array(
  z.strictObject({
    page: address,
    /** Oldest first; each is today's text with these exchanges made in it. */
    before: z.array(z.strictObject({ summary: z.string(), exchange: z.array(exchange).min(1) })).min(1),
    /** What the newest revision's author said that changed. */
    summary: z.string(),
  }),
);

const proposalsSchema = z.array(
  z
    .strictObject({
      page: address,
      summary: z.string(),
      exchange: z.array(exchange).min(1).optional(),
      text: z.string().optional(),
      'sent-back': z.string().optional(),
    })
    .refine((one) => (one.exchange === undefined) !== (one.text === undefined), 'Write either exchange or text'),
);

function apply(text: string, exchanges: readonly Exchange[], where: string): string {
  let result = text;
  for (const { find, put } of exchanges) {
    const parts = result.split(find);
    if (parts.length !== 2)
      throw new Error(`${where}: this stands in it ${String(parts.length - 1)} times, not once: ${find}`);
    result = parts.join(put);
  }
  return result;
}

function readYaml<Schema extends z.ZodType>(file: string, schema: Schema): z.output<Schema> {
  const read = schema.safeParse(existsSync(file) ? parseYaml(readFileSync(file, 'utf8')) : []);
  if (read.success) return read.data;
  throw new Error(`${file} cannot be read: ${z.prettifyError(read.error)}`);
}

function foldersIn(folder: string): string[] {
  if (!existsSync(folder)) return [];
  const entries = readdirSync(folder, { withFileTypes: true });
  return entries.flatMap((entry) => (entry.isDirectory() ? [entry.name] : [])).toSorted();
}

/** The Markdown files of `content/`, by the address of their page, in alphabetical order. */
function readPages(folder: string): Map<string, { address: PageAddress; markdown: string }> {
  const pages = new Map<string, { address: PageAddress; markdown: string }>();
  for (const shelf of shelves) {
    for (const subject of foldersIn(join(folder, shelf))) {
      const files = readdirSync(join(folder, shelf, subject)).filter((file) => file.endsWith('.md'));
      for (const file of files.toSorted()) {
        const page = { shelf, subject, page: file.slice(0, -'.md'.length) };
        const markdown = readFileSync(join(folder, shelf, subject, file), 'utf8');
        pages.set(formatPageAddress(page), { address: page, markdown });
      }
    }
  }
  return pages;
}

/**
 * Reads the demo's pages from `content/`, the texts they had before from its `history.yaml`, and what is proposed from
 * its `proposals.yaml`.
 * @throws where a file cannot be read, or says that something stands in a page that does not
 */
export function readSeedContent(folder: string): SeedContent {
  const pages = readPages(folder);
  const textOf = (page: PageAddress, where: string): string => {
    const found = pages.get(formatPageAddress(page));
    if (found === undefined) throw new Error(`${where}: there is no page ${formatPageAddress(page)}`);
    return found.markdown;
  };
  const earlier = new Map<string, SeedPage['revisions']>();
  for (const { page, before, summary } of readYaml(join(folder, 'history.yaml'), historySchema)) {
    const key = formatPageAddress(page);
    const where = `history.yaml, ${key}`;
    const now = textOf(page, where);
    const [first, ...others] = before.map((one) => ({
      summary: one.summary,
      markdown: apply(now, one.exchange, where),
    }));
    if (first !== undefined) earlier.set(key, [first, ...others, { markdown: now, summary }]);
  }
  const proposals = readYaml(join(folder, 'proposals.yaml'), proposalsSchema).map((one): SeedProposal => {
    const where = `proposals.yaml, ${formatPageAddress(one.page)}`;
    const markdown = one.text ?? apply(textOf(one.page, where), one.exchange ?? [], where);
    return { address: one.page, markdown, summary: one.summary, sentBack: one['sent-back'] ?? null };
  });
  return {
    pages: [...pages].map(([key, page]) => ({
      address: page.address,
      revisions: earlier.get(key) ?? [{ markdown: page.markdown, summary: firstIssue }],
    })),
    proposals,
  };
}
