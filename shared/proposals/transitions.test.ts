import { describe, expect, it } from 'vitest';
import type { ProposalState } from './proposal.ts';
import { proposalStates } from './proposal.ts';
import type { ProposalAction } from './transitions.ts';
import { afterAction, isClosed, proposalActions } from './transitions.ts';

/** The whole table, written out by hand from the design's section 8: rows are states, `–` is refused. */
const table: Readonly<Record<ProposalState, Readonly<Record<ProposalAction, ProposalState | '–'>>>> = {
  draft: {
    revise: 'draft',
    note: 'draft',
    send: 'waiting',
    'send back': '–',
    decline: '–',
    withdraw: 'withdrawn',
    publish: '–',
  },
  waiting: {
    revise: 'waiting',
    note: 'waiting',
    send: '–',
    'send back': 'sent-back',
    decline: 'declined',
    withdraw: 'withdrawn',
    publish: 'published',
  },
  'sent-back': {
    revise: 'sent-back',
    note: 'sent-back',
    send: 'waiting',
    'send back': '–',
    decline: '–',
    withdraw: 'withdrawn',
    publish: '–',
  },
  published: { revise: '–', note: '–', send: '–', 'send back': '–', decline: '–', withdraw: '–', publish: '–' },
  declined: { revise: '–', note: '–', send: '–', 'send back': '–', decline: '–', withdraw: '–', publish: '–' },
  withdrawn: { revise: '–', note: '–', send: '–', 'send back': '–', decline: '–', withdraw: '–', publish: '–' },
};

describe('where a proposal stands after an action', () => {
  for (const state of proposalStates) {
    for (const action of proposalActions) {
      const expected = table[state][action];
      it(`${state}, ${action}: ${expected}`, () => {
        const after = afterAction(state, action);
        expect(after.ok ? after.value : '–').toBe(expected);
      });
    }
  }

  it('names the states in which a refused action would be possible', () => {
    const after = afterAction('declined', 'send');
    expect(after).toEqual({ ok: false, refusal: { state: 'declined', allowed: ['draft', 'sent-back'] } });
  });

  it('is closed only when nothing more can become of it', () => {
    expect(proposalStates.filter(isClosed)).toEqual(['published', 'declined', 'withdrawn']);
  });
});
