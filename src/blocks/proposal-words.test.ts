import { expect, test } from 'vitest';
import { moderator, proposalSummary, writer } from '../../tests/factories/desk.ts';
import type { ProposalSummary } from '../../shared/contracts/views.ts';
import { decidedProposals, nextStep, openProposals } from './proposal-words.ts';

const steps: [who: string, changes: Partial<ProposalSummary>, verb: string, path: string][] = [
  [writer.id, { state: 'draft' }, 'Go on writing', '/proposals/p1/revise'],
  [writer.id, { state: 'waiting' }, 'Look at it', '/proposals/p1'],
  [writer.id, { state: 'waiting', fallenBehind: true }, 'Bring it up to date', '/proposals/p1'],
  [writer.id, { state: 'sent-back' }, 'Answer it', '/proposals/p1/revise'],
  [writer.id, { state: 'published' }, 'Look at it', '/proposals/p1'],
  [moderator.id, { state: 'waiting' }, 'Decide on it', '/proposals/p1'],
  [moderator.id, { state: 'sent-back' }, 'Look at it', '/proposals/p1'],
  [moderator.id, { state: 'declined' }, 'Look at it', '/proposals/p1'],
];

test.each(steps)('the next thing for the %s, of %j', (who, changes, verb, path) => {
  expect(nextStep(proposalSummary(changes), who)).toEqual({ verb, path });
});

test('what is open stands oldest first, what was decided newest first', () => {
  const proposals = [
    proposalSummary({ id: 'late', sentAt: '2026-05-04T10:00:00.000Z' }),
    proposalSummary({ id: 'declined', state: 'declined', updatedAt: '2026-05-03T10:00:00.000Z' }),
    proposalSummary({ id: 'early', sentAt: '2026-05-02T10:00:00.000Z' }),
    proposalSummary({ id: 'published', state: 'published', updatedAt: '2026-05-05T10:00:00.000Z' }),
    proposalSummary({ id: 'draft', state: 'draft', sentAt: null, createdAt: '2026-05-01T10:00:00.000Z' }),
  ];
  expect(openProposals(proposals).map(({ id }) => id)).toEqual(['draft', 'early', 'late']);
  expect(decidedProposals(proposals).map(({ id }) => id)).toEqual(['published', 'declined']);
});
