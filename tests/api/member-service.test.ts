import { beforeEach, describe, expect, test, vi } from 'vitest';
import { createMemberService } from '../../server/members/member-service.ts';
import * as passwords from '../../server/members/passwords.ts';
import { accepted, refused } from '../factories/book.ts';
import { openTestDatabase } from '../setup/database.ts';

vi.mock('../../server/members/passwords.ts', { spy: true });

function openMembers() {
  let ids = 0;
  return createMemberService({ database: openTestDatabase(), now: () => 0, newId: () => `id-${String((ids += 1))}` });
}

const someone = { email: 'Someone@Earthstrap.example', name: 'Someone', role: 'member', password: 'a long enough one' };

describe('a password', () => {
  test('is kept as an Argon2id hash with the least costs that OWASP gives, and its own salt', async () => {
    // https://cheatsheetseries.owasp.org/cheatsheets/Password_Storage_Cheat_Sheet.html: 19 MiB, two passes, one lane.
    const [one, other] = [await passwords.hashPassword('the same'), await passwords.hashPassword('the same')];
    expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(other).not.toBe(one);
    expect(await passwords.verifyPassword(one, 'the same')).toBe(true);
    expect(await passwords.verifyPassword(one, 'The same')).toBe(false);
  });

  test('typed with composed or with combining letters is one password', async () => {
    const hash = await passwords.hashPassword('ki\u00e9sel'.normalize('NFC'));
    expect(await passwords.verifyPassword(hash, 'ki\u00e9sel'.normalize('NFD'))).toBe(true);
  });
});

describe('signing in', () => {
  beforeEach(() => {
    vi.mocked(passwords.verifyPassword).mockClear();
  });

  test('does the same work for an unknown e-mail address as for a wrong password', async () => {
    const members = openMembers();
    accepted(await members.addMember(someone));
    refused(await members.signIn({ email: someone.email, password: 'a wrong one' }, '192.0.2.1'));
    refused(await members.signIn({ email: 'nobody@earthstrap.example', password: 'a wrong one' }, '192.0.2.1'));
    const hashes = vi
      .mocked(passwords.verifyPassword)
      .mock.calls.map(([hash]) => hash.split('$').slice(0, 4).join('$'));
    expect(hashes).toEqual(['$argon2id$v=19$m=19456,t=2,p=1', '$argon2id$v=19$m=19456,t=2,p=1']);
  });

  test('does no work while it is paused', async () => {
    const members = openMembers();
    accepted(await members.addMember(someone));
    for (let time = 0; time < 9; time += 1) {
      refused(await members.signIn({ email: someone.email, password: 'a wrong one' }, '192.0.2.1'));
    }
    expect(passwords.verifyPassword).toHaveBeenCalledTimes(5);
  });

  test('of many members from one address is slowed as well', async () => {
    const members = openMembers();
    vi.mocked(passwords.verifyPassword).mockResolvedValue(false);
    const codes = new Map<string, number>();
    for (let time = 0; time < 50; time += 1) {
      const credentials = { email: `member-${String(time)}@earthstrap.example`, password: 'a wrong one' };
      const { code } = refused(await members.signIn(credentials, '192.0.2.1'));
      codes.set(code, (codes.get(code) ?? 0) + 1);
    }
    vi.mocked(passwords.verifyPassword).mockReset();
    expect(Object.fromEntries(codes)).toEqual({ 'sign-in-failed': 40, 'too-many-requests': 10 });
  });
});

describe('a new member', () => {
  test('is known by their e-mail address in any case', async () => {
    const members = openMembers();
    const member = accepted(await members.addMember(someone));
    expect(member).toEqual({
      id: 'id-1',
      email: 'someone@earthstrap.example',
      name: 'Someone',
      role: 'member',
      suspended: false,
    });
    expect(members.getSignedIn('id-1')).toEqual(member);
    expect(members.hasMember('SOMEONE@earthstrap.example')).toBe(true);
  });

  test('is refused where there is one already, and nothing is changed', async () => {
    const members = openMembers();
    accepted(await members.addMember(someone));
    const again = { ...someone, email: someone.email.toLowerCase(), role: 'admin', password: 'another long one' };
    expect(refused(await members.addMember(again)).code).toBe('already-there');
    expect(accepted(await members.signIn({ email: someone.email, password: someone.password }, '192.0.2.1')).role).toBe(
      'member',
    );
  });

  test('is refused field by field', async () => {
    const wrong = { email: 'no address', name: ' ', role: 'member', password: 'short' };
    expect(Object.keys(refused(await openMembers().addMember(wrong)).fields ?? {})).toEqual([
      'email',
      'name',
      'password',
    ]);
  });
});
