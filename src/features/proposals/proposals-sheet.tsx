import type { ReactElement } from 'react';
import { Link, useLoaderData } from 'react-router';
import { ProposalLedger } from '../../blocks/proposal-ledger.tsx';
import { decidedProposals, openProposals } from '../../blocks/proposal-words.ts';
import { paths } from '../../lib/paths.ts';
import { proposalsQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { EmptyPlace, Sheet } from '../../ui/sheet.tsx';
import { asked, type proposalsLoader, type Showing } from './proposals-loader.ts';

const titles: Readonly<Record<Showing, string>> = {
  waiting: 'What waits',
  'sent-back': 'What was sent back',
  mine: 'My proposals',
  decided: 'What was decided',
};

/** The ledger of what is on its way to publication. */
export function ProposalsSheet(): ReactElement {
  const { showing, decides, memberId } = useLoaderData<typeof proposalsLoader>();
  const { state, mine } = asked[showing];
  const { proposals } = useAnswer(proposalsQuery(useApi(), state, mine));
  const shown = showing === 'decided' ? decidedProposals(proposals) : openProposals(proposals);
  return (
    <Sheet title={titles[showing]} line={<Choices showing={showing} />} lead={leadOf(showing, decides)}>
      <PageHead title={`${titles[showing]} · Earthstrap`} listed={false} />
      {shown.length === 0 ? (
        <Nothing showing={showing} decides={decides} />
      ) : (
        <ProposalLedger
          proposals={shown}
          memberId={memberId}
          caption={`${titles[showing]}, ${showing === 'decided' ? 'the last first' : 'the oldest first'}`}
          withAuthor={decides && showing !== 'mine'}
        />
      )}
    </Sheet>
  );
}

const choices: readonly { readonly showing: Showing; readonly word: string }[] = [
  { showing: 'waiting', word: 'waiting' },
  { showing: 'sent-back', word: 'sent back' },
  { showing: 'mine', word: 'mine' },
  { showing: 'decided', word: 'decided' },
];

function Choices({ showing }: { readonly showing: Showing }): ReactElement {
  return (
    <nav className="title-line" aria-label="Which proposals">
      <span className="title-line-kind">Proposals</span>
      {choices.map((choice) => (
        <span key={choice.showing}>
          <Link
            to={`${paths.proposals}?state=${choice.showing}`}
            aria-current={choice.showing === showing ? 'page' : undefined}
          >
            {choice.word}
          </Link>
        </span>
      ))}
    </nav>
  );
}

function leadOf(showing: Showing, decides: boolean): string {
  switch (showing) {
    case 'waiting':
      return decides
        ? 'The oldest first. Nobody decides on their own.'
        : 'Your proposals that wait for a moderator, the oldest first.';
    case 'sent-back':
      return decides
        ? 'With their authors again, who were asked for something.'
        : 'A moderator asks you for something.';
    case 'mine':
      return 'Your drafts, and what you sent, until it is decided on.';
    case 'decided':
      return decides
        ? 'What was published, declined or withdrawn.'
        : 'Your proposals that were published, declined or withdrawn.';
  }
}

function Nothing({ showing, decides }: { readonly showing: Showing; readonly decides: boolean }): ReactElement {
  if (showing === 'waiting' && decides) {
    return (
      <EmptyPlace>
        <p>Nothing waits for you. What members propose is laid here until a moderator has decided on it.</p>
        <ButtonLink to={`${paths.proposals}?state=decided`}>See what was decided</ButtonLink>
      </EmptyPlace>
    );
  }
  return (
    <EmptyPlace>
      <p>{nothings[showing]}</p>
      <ButtonLink look={showing === 'mine' ? 'primary' : 'plain'} to={paths.shelf('donors')}>
        Find a page to put right
      </ButtonLink>
    </EmptyPlace>
  );
}

const nothings: Readonly<Record<Showing, string>> = {
  waiting: 'Nothing of yours waits. What you send to the moderators is laid here until one has decided on it.',
  'sent-back': 'Nothing was sent back. What a moderator asks for before a change can be published would stand here.',
  mine: 'Nothing of yours is on its way. Every page has “Propose a change” at its head and at its foot.',
  decided: 'Nothing was decided yet. What is published, declined or withdrawn is kept here, with its notes.',
};
