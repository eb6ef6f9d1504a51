/** What a member may be in the club, weakest first. */
export const roles = ['member', 'moderator', 'admin'] as const;

/** A member's role. */
export type Role = (typeof roles)[number];

/** A member of the club as other people may see them. */
export interface MemberName {
  readonly id: string;
  readonly name: string;
}

/** A member of the club as the program knows them; never with the password. */
export interface Member extends MemberName {
  readonly email: string;
  readonly role: Role;
  readonly suspended: boolean;
}

/** Whoever asks: a member, or null for a visitor. */
export type Actor = Member | null;
