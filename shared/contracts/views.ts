import { z } from 'zod';
import type { Block } from '../blocks/block.ts';
import { roles } from '../members/member.ts';
import { shelves } from '../pages/address.ts';
import { pageKinds } from '../pages/page-kind.ts';
import { sourceKinds } from '../pages/front-matter.ts';
import { proposalStates } from '../proposals/proposal.ts';

/*
 * What crosses the wire from the server, as schemas: the OpenAPI document is made from them, and the contract tests
 * parse both doors' answers with them. The browser imports the types only, which cost it nothing.
 * Times are ISO 8601 strings in UTC.
 */

const time = z.iso.datetime();
export const shelfSchema = z.enum(shelves);
export const pageKindSchema = z.enum(pageKinds);

export const memberNameSchema = z.object({ id: z.string(), name: z.string() });
export const memberSchema = memberNameSchema.extend({
  email: z.string(),
  role: z.enum(roles),
  suspended: z.boolean(),
});

/** Who is signed in, and how many proposals wait for them (0 for who may not decide). */
export const viewerSchema = z.object({ member: memberSchema.nullable(), waiting: z.number().int() });
export type Viewer = z.infer<typeof viewerSchema>;

export const variantSchema = z.object({
  year: z.number().int().nullable(),
  market: z.string().nullable(),
  frame: z.string().nullable(),
});

/** What a reader of a subject may choose between. */
export const variantChoicesSchema = z.object({
  years: z.object({ from: z.number().int(), to: z.number().int() }).nullable(),
  markets: z.array(z.string()),
  frames: z.array(z.string()),
});
export type VariantChoices = z.infer<typeof variantChoicesSchema>;

export const zoneCountSchema = z.object({ zone: z.string(), connectors: z.number().int() });

export const subjectSummarySchema = z.object({
  shelf: shelfSchema,
  slug: z.string(),
  title: z.string(),
  summary: z.string(),
  maker: z.string().nullable(),
  model: z.string().nullable(),
  years: z.string().nullable(),
  markets: z.array(z.string()),
  pages: z.number().int(),
  connectors: z.number().int(),
  lines: z.number().int(),
  /** How many of the lines are cited from a factory manual or a standard. */
  cited: z.number().int(),
  zones: z.array(zoneCountSchema),
});
export type SubjectSummary = z.infer<typeof subjectSummarySchema>;

export const shelfViewSchema = z.object({ shelf: shelfSchema, subjects: z.array(subjectSummarySchema) });
export type ShelfView = z.infer<typeof shelfViewSchema>;

/** A page as a row of a list. */
export const pageSummarySchema = z.object({
  shelf: shelfSchema,
  subject: z.string(),
  subjectTitle: z.string(),
  page: z.string(),
  title: z.string(),
  kind: pageKindSchema,
  summary: z.string(),
  revision: z.number().int(),
  publishedAt: time,
  publishedBy: memberNameSchema.nullable(),
  author: memberNameSchema,
  lines: z.number().int(),
  connectors: z.number().int(),
});
export type PageSummary = z.infer<typeof pageSummarySchema>;

/** The pages sheet of the home page: subjects to choose one's bench from, and what was issued lately. */
export const homeViewSchema = z.object({
  shelves: z.array(z.object({ shelf: shelfSchema, subjects: z.number().int(), lines: z.number().int() })),
  donors: z.array(subjectSummarySchema),
  lately: z.array(pageSummarySchema),
});
export type HomeView = z.infer<typeof homeViewSchema>;

export const revisionSummarySchema = z.object({
  number: z.number().int(),
  title: z.string(),
  /** What the author said that changed. */
  summary: z.string(),
  author: memberNameSchema,
  /** Who put their name to it; null for what the seed brought. */
  publishedBy: memberNameSchema.nullable(),
  publishedAt: time,
  proposal: z.string().nullable(),
});
export type RevisionSummary = z.infer<typeof revisionSummarySchema>;

/** A `stop` finding that a moderator let through, with the reason that the page carries. */
export const overrideSchema = z.object({ code: z.string(), address: z.string().nullable(), reason: z.string() });
export type Override = z.infer<typeof overrideSchema>;

export const findingSchema = z.object({
  code: z.string(),
  severity: z.enum(['stop', 'warn', 'hint']),
  message: z.string(),
  line: z.number().int(),
  address: z.string().optional(),
  path: z.array(z.string()).optional(),
  applies: z.string().optional(),
});

export const outlineEntrySchema = z.object({
  level: z.number().int(),
  text: z.string(),
  id: z.string(),
  line: z.number().int(),
});

export const sourceSchema = z.object({
  id: z.string(),
  kind: z.enum(sourceKinds),
  title: z.string(),
  where: z.string().nullable(),
});

export const subjectFactsSchema = z.object({
  maker: z.string().nullable(),
  model: z.string().nullable(),
  years: z.string().nullable(),
  markets: z.array(z.string()),
  voltage: z.string().nullable(),
  ignition: z.string().nullable(),
  charging: z.string().nullable(),
  battery: z.string().nullable(),
  earth: z.enum(['negative', 'positive']).nullable(),
});

/** A published page (or one of its old revisions) as a reader sees it. */
export const pageViewSchema = z.object({
  /** `donors/qf550/pinouts`. */
  address: z.string(),
  shelf: shelfSchema,
  subject: z.string(),
  subjectTitle: z.string(),
  page: z.string(),
  title: z.string(),
  kind: pageKindSchema,
  summary: z.string(),
  revision: z.number().int(),
  /** The page's newest published revision: differs from `revision` where an old one is shown. */
  newestRevision: z.number().int(),
  retired: z.boolean(),
  publishedAt: time,
  author: memberNameSchema,
  publishedBy: memberNameSchema.nullable(),
  sources: z.array(sourceSchema),
  facts: subjectFactsSchema,
  /** What the page says that it holds for, in words; null where it holds for all. */
  applies: z.string().nullable(),
  variant: variantSchema,
  choices: variantChoicesSchema,
  outline: z.array(outlineEntrySchema),
  findings: z.array(findingSchema),
  overrides: z.array(overrideSchema),
  lastRevisions: z.array(revisionSummarySchema),
  /** The subject's pages, in the order of their kinds. */
  siblings: z.array(z.object({ page: z.string(), title: z.string(), kind: pageKindSchema })),
  /** Safe HTML with the drawings in it; the only large field, sent once. */
  html: z.string(),
});
export type PageView = z.infer<typeof pageViewSchema>;

export const lineViewSchema = z.object({
  address: z.string(),
  /** A short hash of what the line says; opaque until trust exists. */
  claim: z.string(),
  mark: z.enum(['unchecked', 'cited']),
});

/** What `GET /api/pages/…` gives: the page view with its text and data. */
export const pageDataSchema = pageViewSchema.extend({
  markdown: z.string(),
  blocks: z.array(z.custom<Block>()),
  lines: z.array(lineViewSchema),
});
export type PageData = z.infer<typeof pageDataSchema>;

export const subjectViewSchema = z.object({
  summary: subjectSummarySchema,
  facts: subjectFactsSchema,
  pages: z.array(pageSummarySchema),
  /** Every connector of the subject, for the sheet that lists faces by zone. */
  connectors: z.array(
    z.object({
      page: z.string(),
      id: z.string(),
      name: z.string(),
      zone: z.string().nullable(),
      cavities: z.number().int(),
      /** The face's shape as a block writes it, for a thumbnail: `xx.xx+xxxxx`, `round 6`. */
      layout: z.string().optional(),
    }),
  ),
});
export type SubjectView = z.infer<typeof subjectViewSchema>;

export const revisionsViewSchema = z.object({
  address: z.string(),
  title: z.string(),
  revisions: z.array(revisionSummarySchema),
});
export type RevisionsView = z.infer<typeof revisionsViewSchema>;

/** A stretch of text in a comparison: the same in both, or only in one. */
export const wordChangeSchema = z.object({ kind: z.enum(['same', 'removed', 'added']), text: z.string() });

/** A line of text or a row of a table in a comparison. `table` rows carry their cells' words joined by ` | `. */
export const lineChangeSchema = z.object({
  kind: z.enum(['same', 'removed', 'added', 'changed']),
  table: z.boolean(),
  fromLine: z.number().int().nullable(),
  toLine: z.number().int().nullable(),
  words: z.array(wordChangeSchema),
});

export const differenceSchema = z.object({
  lines: z.array(lineChangeSchema),
  /** True where the texts were too long to compare in the time allowed, and whole lines are shown instead. */
  coarse: z.boolean(),
});
export type DifferenceView = z.infer<typeof differenceSchema>;

export const compareViewSchema = z.object({
  address: z.string(),
  title: z.string(),
  from: revisionSummarySchema,
  to: revisionSummarySchema,
  difference: differenceSchema,
});
export type CompareView = z.infer<typeof compareViewSchema>;

export const previewViewSchema = z.object({
  html: z.string(),
  outline: z.array(outlineEntrySchema),
  blocks: z.array(z.custom<Block>()),
  findings: z.array(findingSchema),
});
export type PreviewView = z.infer<typeof previewViewSchema>;

export const searchHitSchema = z.object({
  kind: z.enum(['line', 'section', 'page', 'sum']),
  /** In full: `donors/qf550/pinouts#headlight.2~1980-`. */
  address: z.string(),
  /** Where it leads on this site. */
  path: z.string(),
  title: z.string(),
  subjectTitle: z.string(),
  /** For a section or page: the words around what was found. */
  excerpt: z.string().nullable(),
  mark: z.enum(['unchecked', 'cited']).nullable(),
  /** What the line says, for a line. */
  line: z
    .object({
      where: z.string(),
      colour: z.string().nullable(),
      colourWords: z.string().nullable(),
      size: z.string().nullable(),
      circuit: z.string().nullable(),
      goesTo: z.string().nullable(),
      applies: z.string().nullable(),
      /** False where the chosen year or market rules it out. */
      appliesHere: z.boolean(),
      /** Signal word and sentence of the hazard that it belongs to. */
      hazard: z.object({ signal: z.string(), text: z.string() }).nullable(),
      /** The wire and the connector's face with the cavity ringed, as SVG markup; null for a line that has none. */
      wireSvg: z.string().nullable(),
      faceSvg: z.string().nullable(),
    })
    .nullable(),
});
export type SearchHit = z.infer<typeof searchHitSchema>;

export const searchViewSchema = z.object({
  query: z.string(),
  hits: z.array(searchHitSchema),
  /** What the search made of the query, where that helps: a code that no line has, a donor preferred. */
  remarks: z.array(z.string()),
  /** The donor on the bench that was preferred, where there is one. */
  bench: z.string().nullable(),
});
export type SearchView = z.infer<typeof searchViewSchema>;

export const proposalVersionSchema = z.object({
  number: z.number().int(),
  markdown: z.string(),
  summary: z.string(),
  baseRevision: z.number().int().nullable(),
  createdAt: time,
  /** Null for the one that is still being written. */
  sentAt: time.nullable(),
});

export const proposalNoteSchema = z.object({
  id: z.string(),
  author: memberNameSchema,
  kind: z.enum(['note', 'sent-back', 'declined', 'published']),
  text: z.string(),
  address: z.string().nullable(),
  line: z.number().int().nullable(),
  createdAt: time,
});

export const proposalSummarySchema = z.object({
  id: z.string(),
  shelf: shelfSchema,
  subject: z.string(),
  page: z.string(),
  title: z.string(),
  summary: z.string(),
  state: z.enum(proposalStates),
  author: memberNameSchema,
  baseRevision: z.number().int().nullable(),
  /** The page's published revision now; null where it has none. */
  publishedRevision: z.number().int().nullable(),
  fallenBehind: z.boolean(),
  versions: z.number().int(),
  notes: z.number().int(),
  stops: z.number().int(),
  createdAt: time,
  updatedAt: time,
  sentAt: time.nullable(),
});
export type ProposalSummary = z.infer<typeof proposalSummarySchema>;

export const proposalsViewSchema = z.object({ proposals: z.array(proposalSummarySchema) });
export type ProposalsView = z.infer<typeof proposalsViewSchema>;

export const proposalViewSchema = proposalSummarySchema.omit({ versions: true, notes: true, stops: true }).extend({
  versions: z.array(proposalVersionSchema),
  notes: z.array(proposalNoteSchema),
  findings: z.array(findingSchema),
  overrides: z.array(overrideSchema),
  /** From the published page (nothing, for a new one) to the newest version. */
  difference: differenceSchema,
  /** From the base to what was published meanwhile; null where it has not fallen behind. */
  meanwhile: differenceSchema.nullable(),
  /** The published text now, for whoever has fallen behind; null for a new page. */
  publishedMarkdown: z.string().nullable(),
  html: z.string(),
  decidedBy: memberNameSchema.nullable(),
  publishedAs: z.number().int().nullable(),
  may: z.object({
    revise: z.boolean(),
    send: z.boolean(),
    withdraw: z.boolean(),
    note: z.boolean(),
    decide: z.boolean(),
  }),
});
export type ProposalView = z.infer<typeof proposalViewSchema>;

/** What the editor starts from: the published text, an old revision to go back to, or a template for a new page. */
export const startViewSchema = z.object({
  shelf: shelfSchema,
  subject: z.string().nullable(),
  subjectTitle: z.string().nullable(),
  page: z.string().nullable(),
  baseRevision: z.number().int().nullable(),
  markdown: z.string(),
  summary: z.string(),
  /** The reader's own proposal of this page that is still open, where there is one. */
  openProposal: z.string().nullable(),
});
export type StartView = z.infer<typeof startViewSchema>;
