import type { ReactElement } from 'react';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import { dayOf } from '../../lib/dates.ts';
import { paths } from '../../lib/paths.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';

/** What became of a proposal, where something has; else what it waits for, where that needs saying. */
export function WhatBecame({ proposal }: { readonly proposal: ProposalView }): ReactElement | null {
  const { state, decidedBy, publishedAs, updatedAt, fallenBehind } = proposal;
  const who = decidedBy?.name ?? 'A moderator';
  const day = dayOf(updatedAt);
  switch (state) {
    case 'published':
      return (
        <Notice look="good" title={`${who} published it on ${day}`}>
          <p>It is revision {publishedAs ?? ''} of its page.</p>
          <p className="button-row">
            <ButtonLink to={paths.page(proposal)}>Open the page</ButtonLink>
          </p>
        </Notice>
      );
    case 'declined':
      return (
        <Notice look="stop" title={`${who} declined it on ${day}`}>
          <LastWords proposal={proposal} kind="declined" />
        </Notice>
      );
    case 'withdrawn':
      return <Notice look="warn" title={`Its author withdrew it on ${day}`} />;
    case 'sent-back':
      return (
        <Notice look="warn" title="It was sent back to its author">
          <LastWords proposal={proposal} kind="sent-back" />
        </Notice>
      );
    case 'draft':
      return (
        <Notice look="hint" title="A draft">
          <p>Nobody else sees it until it is sent.</p>
        </Notice>
      );
    case 'waiting':
      return fallenBehind ? (
        <Notice look="warn" title="It has fallen behind: its page was published anew meanwhile" />
      ) : null;
  }
}

interface LastWordsProps {
  readonly proposal: ProposalView;
  readonly kind: ProposalView['notes'][number]['kind'];
}

function LastWords({ proposal, kind }: LastWordsProps): ReactElement | null {
  const note = proposal.notes.findLast((one) => one.kind === kind);
  return note === undefined ? null : (
    <p className="note-text">
      {note.author.name}: {note.text}
    </p>
  );
}
