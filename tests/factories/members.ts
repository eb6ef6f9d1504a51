import type { Member, Role } from '../../shared/members/member.ts';
import type { Database } from '../../server/db/client.ts';
import { members } from '../../server/db/schema/members.ts';

/** A member in the store, who has no password that anybody could know. */
export function addMember(database: Database, name: string, role: Role = 'member'): Member {
  const id = name.toLowerCase().replaceAll(' ', '-');
  const email = `${id}@earthstrap.example`;
  const createdAt = '2026-01-01T00:00:00.000Z';
  database.query.insert(members).values({ id, email, name, role, passwordHash: 'none', createdAt }).run();
  return { id, name, email, role, suspended: false };
}
