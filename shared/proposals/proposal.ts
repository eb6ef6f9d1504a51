/** The states of a proposal (design: from change to publication). */
export const proposalStates = ['draft', 'waiting', 'sent-back', 'published', 'declined', 'withdrawn'] as const;

/** Where a proposal stands on its way to publication. */
export type ProposalState = (typeof proposalStates)[number];
