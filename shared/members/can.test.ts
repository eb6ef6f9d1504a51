import { describe, expect, it } from 'vitest';
import type { Action, ActionSubject } from './can.ts';
import { can } from './can.ts';
import type { Member, Role } from './member.ts';

function member(role: Role, id: string = role, suspended = false): Member {
  return { id, name: id, email: `${id}@earthstrap.example`, role, suspended };
}

const actors = {
  visitor: null,
  member: member('member'),
  moderator: member('moderator'),
  admin: member('admin'),
  suspended: member('admin', 'suspended', true),
} as const;

type Who = keyof typeof actors;

/** One row of section 11's table: who may, of those above. */
function row<Name extends Action>(action: Name, subject: ActionSubject<Name>, allowed: readonly Who[]): void {
  it(`${action}: ${allowed.join(', ') || 'nobody'}`, () => {
    const answers = (Object.keys(actors) as Who[]).filter((who) => can(actors[who], action, subject));
    expect(answers).toEqual(allowed);
  });
}

describe('who may do what', () => {
  row('read', { reading: 'open' }, ['visitor', 'member', 'moderator', 'admin', 'suspended']);
  row('read', { reading: 'members' }, ['member', 'moderator', 'admin']);
  row('propose', null, ['member', 'moderator', 'admin']);
  row('decide', null, ['moderator', 'admin']);
  row('retire page', null, ['moderator', 'admin']);
  for (const action of ['invite', 'set roles', 'suspend', 'settings', 'audit', 'backup'] as const) {
    row(action, null, ['admin']);
  }
});

describe('who may do what to a proposal that was sent', () => {
  const proposal = { authorId: 'member', sent: true };
  row('see proposal', proposal, ['member', 'moderator', 'admin']);
  row('note on proposal', proposal, ['member', 'moderator', 'admin']);
  row('change proposal', proposal, ['member']);
  row('decide on proposal', proposal, ['moderator', 'admin']);

  it('keeps it from a member who is not its author, and lets no moderator decide on their own', () => {
    expect(can(member('member', 'another'), 'see proposal', proposal)).toBe(false);
    expect(can(actors.moderator, 'decide on proposal', { authorId: 'moderator', sent: true })).toBe(false);
    expect(can(actors.admin, 'decide on proposal', { authorId: 'admin', sent: true })).toBe(false);
  });
});

describe('who may do what to a draft', () => {
  const draft = { authorId: 'member', sent: false };
  row('see proposal', draft, ['member']);
  row('note on proposal', draft, ['member']);
  row('change proposal', draft, ['member']);
  row('decide on proposal', draft, []);
});
