import type { Problem } from '../../shared/lib/problem.ts';
import { problem } from '../../shared/lib/problem.ts';
import type { Actor } from '../../shared/members/member.ts';
import { pagePath, type PageAddress } from '../../shared/pages/address.ts';
import type { ProposalState } from '../../shared/proposals/proposal.ts';
import type { ProposalAction, WrongState } from '../../shared/proposals/transitions.ts';

/* Every refusal of the proposals' service, in words that say what happened, what was kept, and what to do. */

/** States as they stand in a sentence. */
const stateWords: Readonly<Record<ProposalState, string>> = {
  draft: 'still a draft',
  waiting: 'waiting for a moderator',
  'sent-back': 'with its author again',
  published: 'published',
  declined: 'declined',
  withdrawn: 'withdrawn',
};

const actionWords: Readonly<Record<ProposalAction, string>> = {
  revise: 'changed',
  note: 'added to',
  send: 'sent',
  'send back': 'sent back',
  decline: 'declined',
  withdraw: 'withdrawn',
  publish: 'published',
};

/** Why somebody who may not propose may not: they are not signed in, or are suspended. */
export function membersOnly(actor: Actor): Problem {
  return actor === null
    ? problem('sign-in-needed', 'Sign in first', 'Proposals are made, read and decided on by members of the club.')
    : problem('not-allowed', 'You may not propose', 'Your membership is suspended. Ask an administrator of the club.');
}

export const noSuchProposal = problem(
  'not-found',
  'There is no such proposal',
  'Check the address. A draft can be read by its author only, and what was sent by its author and the moderators.',
);

export const notTheAuthor = problem(
  'not-allowed',
  'Only its author may change a proposal',
  'Nothing was changed. Write a note on it, or send it back to its author with one.',
);

export const notADecider = problem(
  'not-allowed',
  'Moderators decide on proposals',
  'Nothing was changed. Nobody decides on their own proposal, whatever their role: another moderator has to.',
);

export function wrongState({ state, allowed }: WrongState, action: ProposalAction): Problem {
  const when = allowed.map((one) => stateWords[one]).join(' or ');
  return problem(
    'wrong-state',
    `The proposal is ${stateWords[state]}`,
    `It can be ${actionWords[action]} only when it is ${when}. Nothing was changed; look at the proposal again.`,
  );
}

export const movedMeanwhile = problem(
  'conflict',
  'The proposal changed while you were at it',
  'Nothing was changed by you. Read the proposal again, then decide again.',
);

export function newerVersion(newest: number): Problem {
  return problem(
    'conflict',
    'A newer version was sent while you read',
    `Nothing was published. Read version ${String(newest)} and decide again.`,
  );
}

export const nothingChanged = problem(
  'conflict',
  'Nothing changed',
  'The text is the same as the one that it would replace, so there is nothing to send. What you wrote is kept: change it, or withdraw the proposal.',
);

export function alreadyThere(address: PageAddress): Problem {
  const what = address.page === 'overview' ? 'subject' : 'page';
  return problem(
    'already-there',
    `There is already a ${what} at ${pagePath(address)}`,
    `Your text is kept. Propose it under another address, or propose a change of the ${what} that is there.`,
  );
}

export const addressIsSettled = problem(
  'wrong-state',
  'Its address is settled',
  'The address of a new page can be changed until it is first sent, and that of a published page never. Nothing was changed: withdraw this proposal and propose the text under the other address.',
);

export function noSuchRevision(base: number, newest: number | null): Problem {
  const there = newest === null ? 'the page has not been published' : `its newest is ${String(newest)}`;
  return problem(
    'conflict',
    `There is no revision ${String(base)} of this page`,
    `A change starts from a published revision, and ${there}. Your text stands where you wrote it: open the page again and start from there.`,
  );
}

export function fallenBehind(base: number | null, newest: number): Problem {
  const from = base === null ? 'a page that did not exist yet' : `revision ${String(base)}`;
  return problem(
    'fallen-behind',
    `Revision ${String(newest)} was published meanwhile`,
    `The proposal starts from ${from}, so publishing it would undo what came after. Both texts are kept: its author has to bring the proposal up to date, so send it back with a note.`,
  );
}

export function overviewFirst({ shelf, subject }: PageAddress): Problem {
  return problem(
    'wrong-state',
    `The overview of ${subject} is not published yet`,
    `A page stands under its overview, and /${shelf}/${subject} has none. The proposal is kept and goes on waiting: publish the overview first.`,
  );
}

export function wrongKind(isOverview: boolean): Problem {
  return isOverview
    ? problem(
        'not-acceptable-text',
        'An overview says kind: overview',
        'The page of this address is its subject’s overview. The text is kept: write kind: overview in its front matter.',
      )
    : problem(
        'not-acceptable-text',
        'Only a subject’s first page says kind: overview',
        'The text is kept: write in its front matter which other kind of page this is.',
      );
}

export function reservedSlug(field: 'subject' | 'page', slug: string): Problem {
  return problem(
    'fields-invalid',
    `“${slug}” cannot be an address`,
    'Your text stands where you wrote it. Choose another address.',
    {
      fields: { [field]: `The site uses “${slug}” itself: choose another word.` },
    },
  );
}

export function overrideNeeded(
  missing: readonly { readonly code: string; readonly address: string | null; readonly message: string }[],
): Problem {
  return problem(
    'override-needed',
    'Something in this text stops its publication',
    'Nothing was published. Send it back with a note, or let each of these through with a reason, which the page will carry.',
    { missing },
  );
}

export const bookKeepsMoving = problem(
  'busy',
  'The book changed while this was being published',
  'Nothing was published. Read the proposal again and publish it again.',
  { retryAfterSeconds: 1 },
);
