import { createLocalApi, type Door } from '../../server/local-api.ts';
import type { Api } from '../../shared/contracts/api.ts';
import type { Member } from '../../shared/members/member.ts';
import { createHttpApi } from '../../src/app/http-api.ts';
import { openHttpClub, testPassword, type HttpClub } from '../factories/http-club.ts';
import { accepted } from '../factories/book.ts';

/** Somebody at a door. Each request goes through it anew, since who is signed in may have changed. */
export type Asker = () => Api;

/** A club, and how people come in by one of its doors. */
export interface DoorOfClub {
  readonly club: HttpClub;
  visitor(): Asker;
  signedIn(person: Member): Promise<Asker>;
}

/** Both doors to the book, by the names that the tests report. */
export const doors: Readonly<Record<string, () => Promise<DoorOfClub>>> = {
  "the server's own door": openLocalDoor,
  'the HTTP door': openHttpDoor,
};

async function openLocalDoor(): Promise<DoorOfClub> {
  const club = await openHttpClub();
  const { services } = club.context;

  function visitor(): Asker {
    let memberId: string | null = null;
    return () => {
      const door: Door = {
        actor: memberId === null ? null : services.members.getSignedIn(memberId),
        address: '192.0.2.1',
        prove: (credentials) => services.members.signIn(credentials, '192.0.2.1'),
        async signIn(member) {
          memberId = member.id;
        },
        async signOut() {
          memberId = null;
        },
      };
      return createLocalApi(services, door);
    };
  }
  return { club, visitor, signedIn: (person) => signedIn(visitor(), person) };
}

async function openHttpDoor(): Promise<DoorOfClub> {
  const club = await openHttpClub();
  function visitor(): Asker {
    const browser = club.openBrowser();
    const api = createHttpApi((address, init) => browser(String(address), init));
    return () => api;
  }
  return { club, visitor, signedIn: (person) => signedIn(visitor(), person) };
}

async function signedIn(asker: Asker, person: Member): Promise<Asker> {
  accepted(await asker().signIn({ email: person.email, password: testPassword }));
  return asker;
}
