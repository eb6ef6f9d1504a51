import type { ReactElement, ReactNode } from 'react';
import { Link, useLoaderData } from 'react-router';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { Difference } from '../../blocks/difference.tsx';
import { Overrides } from '../../blocks/overrides.tsx';
import { stateLabels } from '../../blocks/proposal-words.ts';
import { RenderedPage } from '../../blocks/rendered-page.tsx';
import { dayOf } from '../../lib/dates.ts';
import { paths } from '../../lib/paths.ts';
import { proposalQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { PageHead } from '../../ui/page-head.tsx';
import { Section, Sheet, type SheetSection } from '../../ui/sheet.tsx';
import { AuthorActs } from './author-acts.tsx';
import { DecisionStrip } from './decision-strip.tsx';
import { Decision } from './decision.tsx';
import { ownText } from './editor-start.ts';
import { FallenBehind } from './fallen-behind.tsx';
import { FindingsList } from './findings-list.tsx';
import { leadApart } from './lead-apart.ts';
import { NextWaiting } from './next-waiting.tsx';
import { Notes } from './notes.tsx';
import type { proposalLoader } from './proposal-loader.ts';
import { decisionId, notesId } from './section-ids.ts';
import { Versions } from './versions.tsx';
import { WhatBecame } from './what-became.tsx';

/* Ids of this sheet have an underscore, which no id of a page's blocks or headings can have: both stand here. */
const section = {
  meanwhile: { id: 'published_meanwhile', text: 'What was published meanwhile' },
  findings: { id: 'what_is_found', text: 'What the book finds' },
  difference: { id: 'what_changes', text: 'What changes in the text' },
  page: { id: 'how_it_will_look', text: 'How the page will look' },
  notes: { id: notesId, text: 'Notes' },
} as const satisfies Record<string, SheetSection>;

/** A proposal: what it is, what it does to the page, what was said of it, and the decision at the foot. */
export function ProposalSheet(): ReactElement {
  const { id, decides, memberId } = useLoaderData<typeof proposalLoader>();
  const proposal = useAnswer(proposalQuery(useApi(), id));
  const { title, summary, fallenBehind, may, author } = proposal;
  const isOpen = may.decide || may.revise;
  const decision = { id: decisionId, text: may.decide ? 'Decide' : 'What you can do' };
  const sections = [
    ...(fallenBehind ? [section.meanwhile] : []),
    section.findings,
    section.difference,
    section.page,
    section.notes,
    ...(isOpen ? [decision] : []),
  ];
  return (
    <Sheet
      title={title}
      line={<ProposalLine proposal={proposal} memberId={memberId} />}
      lead={summary}
      sections={sections}
    >
      <PageHead title={`Proposal: ${title} · Earthstrap`} listed={false} />
      <WhatBecame proposal={proposal} />
      {decides && !may.decide ? <NextWaiting after={id} memberId={memberId} /> : null}
      <Overrides overrides={proposal.overrides} />
      {fallenBehind ? (
        <SectionOf section={section.meanwhile}>
          <FallenBehind proposal={proposal} />
        </SectionOf>
      ) : null}
      <SectionOf section={section.findings}>
        <FindingsList findings={proposal.findings} markdown={ownText(proposal)} linked />
      </SectionOf>
      <SectionOf section={section.difference}>
        <WhatChanges proposal={proposal} />
      </SectionOf>
      <SectionOf section={section.page}>
        <div className="proposed-page" onClickCapture={leadApart}>
          <RenderedPage of={id} html={proposal.html} />
        </div>
      </SectionOf>
      <SectionOf section={section.notes}>
        <Notes proposal={proposal} />
        <Versions proposal={proposal} />
      </SectionOf>
      {isOpen ? (
        <>
          <DecisionStrip to={decisionId} word={decision.text} />
          <SectionOf section={decision}>
            {may.decide ? <Decision proposal={proposal} /> : null}
            {author.id === memberId ? <AuthorActs proposal={proposal} /> : null}
          </SectionOf>
        </>
      ) : null}
    </Sheet>
  );
}

interface SectionOfProps {
  readonly section: SheetSection;
  readonly children: ReactNode;
}

function SectionOf({ section: { id, text }, children }: SectionOfProps): ReactElement {
  return (
    <Section id={id} title={text}>
      {children}
    </Section>
  );
}

interface ProposalLineProps {
  readonly proposal: ProposalView;
  readonly memberId: string;
}

/** The title block as one line: where it stands, of which page, by whom, since when. */
function ProposalLine({ proposal, memberId }: ProposalLineProps): ReactElement {
  const { state, author, baseRevision, subject, page, createdAt, sentAt } = proposal;
  return (
    <nav className="title-line" aria-label="What this proposal is">
      <span className="title-line-kind">{stateLabels[state]}</span>
      <span>
        {baseRevision === null ? (
          `New: ${subject} / ${page}`
        ) : (
          <Link to={paths.page(proposal)}>
            {subject} / {page}
          </Link>
        )}
      </span>
      {baseRevision === null ? null : <span>From revision {baseRevision}</span>}
      <span>By {author.id === memberId ? 'you' : author.name}</span>
      <span>{sentAt === null ? `Begun on ${dayOf(createdAt)}` : `Sent on ${dayOf(sentAt)}`}</span>
      <span className="title-line-last unprinted">
        <Link to={paths.proposals}>All proposals</Link>
      </span>
    </nav>
  );
}

function WhatChanges({ proposal }: { readonly proposal: ProposalView }): ReactElement {
  if (proposal.baseRevision !== null) return <Difference difference={proposal.difference} />;
  return (
    <>
      <p>All of it is new.</p>
      <details>
        <summary>Its text as it was written</summary>
        <Difference difference={proposal.difference} />
      </details>
    </>
  );
}
