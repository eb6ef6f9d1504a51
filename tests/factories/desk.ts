import type { Api } from '../../shared/contracts/api.ts';
import type { ProposalSummary, ProposalView, StartView, Viewer } from '../../shared/contracts/views.ts';
import type { Role } from '../../shared/members/member.ts';

/** A door to the book that answers what a test expects to be asked, and fails on everything else. */
export function fakeApi(answers: Partial<Api>): Api {
  return new Proxy(answers, {
    get(given, name) {
      const answer: unknown = Reflect.get(given, name);
      if (answer === undefined) throw new Error(`The book was asked for ${String(name)}`);
      return answer;
    },
  }) as Api;
}

export const writer = { id: 'writer', name: 'Wren' } as const;
export const moderator = { id: 'moderator', name: 'Merle' } as const;

/** Somebody signed in, by their role. */
export function viewer(role: Role, { id, name }: { id: string; name: string } = writer): Viewer {
  return { member: { id, name, email: `${id}@earthstrap.example`, role, suspended: false }, waiting: 0 };
}

const summary: ProposalSummary = {
  id: 'p1',
  shelf: 'donors',
  subject: 'qf550',
  page: 'pinouts',
  title: 'Front connectors',
  summary: 'Cavity 3 is earth',
  state: 'waiting',
  author: writer,
  baseRevision: 3,
  publishedRevision: 3,
  fallenBehind: false,
  versions: 1,
  notes: 0,
  stops: 0,
  createdAt: '2026-05-01T10:00:00.000Z',
  updatedAt: '2026-05-02T10:00:00.000Z',
  sentAt: '2026-05-02T10:00:00.000Z',
};

/** A proposal as a row of a list. */
export function proposalSummary(changes: Partial<ProposalSummary> = {}): ProposalSummary {
  return { ...summary, ...changes };
}

/** A proposal as its sheet shows it: of a moderator's eyes, unless a test says otherwise. */
export function proposalView(changes: Partial<ProposalView> = {}): ProposalView {
  return {
    ...summary,
    versions: [
      {
        number: 1,
        markdown: '---\ntitle: Front connectors\n---\nAs sent.\n',
        summary: summary.summary,
        baseRevision: 3,
        createdAt: summary.createdAt,
        sentAt: summary.sentAt,
      },
    ],
    notes: [],
    findings: [],
    overrides: [],
    difference: { lines: [], coarse: false },
    meanwhile: null,
    publishedMarkdown: null,
    html: '<p>As sent.</p>',
    decidedBy: null,
    publishedAs: null,
    may: { revise: false, send: false, withdraw: false, note: true, decide: true },
    ...changes,
  };
}

/** What the editor of a published page starts from. */
export function startView(changes: Partial<StartView> = {}): StartView {
  return {
    shelf: 'donors',
    subject: 'qf550',
    subjectTitle: 'QF-550',
    page: 'pinouts',
    baseRevision: 3,
    markdown: '---\ntitle: Front connectors\n---\nAs published.\n',
    summary: '',
    openProposal: null,
    ...changes,
  };
}
