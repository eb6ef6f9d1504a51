import { createHash } from 'node:crypto';
import type { PageText } from '../../shared/dialect/page-text.ts';
import type { ProposalView } from '../../shared/contracts/views.ts';
import { createRecent } from '../../shared/lib/recent.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import type { PagePublication } from '../pages/page-publication.ts';
import { findingView } from '../pages/page-views.ts';
import type { ParsePool, ParseRefusal } from '../pages/parse-pool-types.ts';
import { parseProblem } from '../pages/parse-problem.ts';

const textsKept = 100;

type FindingView = ProposalView['findings'][number];

/** A proposed text as the book would show it; one that cannot be read is shown as it was written, and says why. */
export interface ProposedText {
  readonly html: string;
  readonly findings: readonly FindingView[];
  /** How many of the findings stop it. */
  readonly stops: number;
  /** Null where it could not be read. */
  readonly text: PageText | null;
  readonly refusal: ParseRefusal | null;
}

export interface ProposedTexts {
  /** `memberId` is whose reading time it takes; null for what the book itself has to know. */
  read(address: PageAddress, markdown: string, memberId: string | null): Promise<ProposedText>;
}

function escapeHtml(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
}

function unread(markdown: string, refusal: ParseRefusal): ProposedText {
  const { title, detail } = parseProblem(refusal, 'The text is kept as it was written.');
  const line = refusal.kind === 'text' ? (refusal.refusal.line ?? 1) : 1;
  const finding: FindingView = { code: 'text-unread', severity: 'stop', message: `${title}. ${detail}`, line };
  return { html: `<pre>${escapeHtml(markdown)}</pre>`, findings: [finding], stops: 1, text: null, refusal };
}

/**
 * Reads proposed texts, each once for as long as the subject's other pages say the same of themselves: that is part of
 * what is found.
 */
export function createProposedTexts(publication: PagePublication, parsePool: ParsePool): ProposedTexts {
  const kept = createRecent<string, ProposedText>(textsKept);
  return {
    async read(address, markdown, memberId) {
      const { shelf, subject, page } = address;
      const version = publication.standing(address).subject?.version ?? null;
      const key = createHash('sha256')
        .update(JSON.stringify([shelf, subject, page, version, markdown]))
        .digest('hex');
      const known = kept.get(key);
      if (known !== undefined) return known;
      const request = { markdown, context: publication.context(address), address, variant: anyVariant };
      const parsed = await parsePool.parse(request, memberId === null ? null : `member:${memberId}`);
      if (!parsed.ok) {
        const proposed = unread(markdown, parsed.refusal);
        // Being busy passes; what is wrong with the text itself does not, and must not be tried at every look.
        if (parsed.refusal.kind === 'text') kept.set(key, proposed);
        return proposed;
      }
      const { text, html } = parsed.value;
      const findings = text.findings.map(findingView);
      const stops = findings.filter(({ severity }) => severity === 'stop').length;
      const proposed = { html, findings, stops, text, refusal: null };
      kept.set(key, proposed);
      return proposed;
    },
  };
}
