import type { Actor, Member } from './member.ts';

/** A proposal as far as permission goes: whose it is, and whether it was ever sent (a draft is its author's alone). */
export interface ProposalOwnership {
  readonly authorId: string;
  readonly sent: boolean;
}

/** Every action that the book asks about, and what it is done to. */
interface ActionSubjects {
  /** Read, search and reckon; a club may keep reading to its members. */
  read: { readonly reading: 'open' | 'members' };
  propose: null;
  'see proposal': ProposalOwnership;
  /** Change it, send it, withdraw it. */
  'change proposal': ProposalOwnership;
  'note on proposal': ProposalOwnership;
  /** Publish it, send it back, decline it. */
  'decide on proposal': ProposalOwnership;
  /** Decide on proposals at all: whether a ledger of what waits is one's own business. */
  decide: null;
  'retire page': null;
  invite: null;
  'set roles': null;
  suspend: null;
  settings: null;
  audit: null;
  backup: null;
}

/** What somebody may want to do, in the design's words. */
export type Action = keyof ActionSubjects;

/** What an action is done to; null where it is done to nothing in particular. */
export type ActionSubject<Name extends Action> = ActionSubjects[Name];

type Rule<Name extends Action> = (member: Member, subject: ActionSubjects[Name]) => boolean;

const everyMember = (): boolean => true;
const moderators = (member: Member): boolean => member.role !== 'member';
const admins = (member: Member): boolean => member.role === 'admin';
const author = (member: Member, { authorId }: ProposalOwnership): boolean => member.id === authorId;
const authorOrModerators = (member: Member, proposal: ProposalOwnership): boolean =>
  author(member, proposal) || (proposal.sent && moderators(member));

const rules: { readonly [Name in Action]: Rule<Name> } = {
  read: everyMember,
  propose: everyMember,
  'see proposal': authorOrModerators,
  'change proposal': author,
  'note on proposal': authorOrModerators,
  // Nobody decides on their own proposal, whatever their role.
  'decide on proposal': (member, proposal) => authorOrModerators(member, proposal) && !author(member, proposal),
  decide: moderators,
  'retire page': moderators,
  invite: admins,
  'set roles': admins,
  suspend: admins,
  settings: admins,
  audit: admins,
  backup: admins,
};

/**
 * The one function that decides who may do what, for the service and for the pages (section 11 of the design).
 * A suspended member may do what a visitor may.
 * @param actor who asks; null is a visitor
 * @param action what they want to do
 * @param subject what they want to do it to
 */
export function can<Name extends Action>(actor: Actor, action: Name, subject: ActionSubject<Name>): boolean {
  if (actor !== null && !actor.suspended) return rules[action](actor, subject);
  return action === 'read' && (subject as ActionSubjects['read']).reading === 'open';
}
