import type { Role } from '../../../shared/members/member.ts';

/** What each role is called, and what it lets somebody do. */
export const roleWords: Readonly<Record<Role, { readonly name: string; readonly may: string }>> = {
  member: { name: 'Member', may: 'You can propose changes and new pages, and follow what becomes of them.' },
  moderator: {
    name: 'Moderator',
    may: 'You can propose, and you decide on what other members propose: publish it, send it back, or decline it. Nobody decides on their own.',
  },
  admin: {
    name: 'Administrator',
    may: 'You can do whatever a moderator can, and you look after the club’s members and its copies of the book.',
  },
};
