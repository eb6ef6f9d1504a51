import type { Request, RequestHandler, Response } from 'express';
import { Passport } from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import type { Problem } from '../../shared/lib/problem.ts';
import { accept, refuse, type Result } from '../../shared/lib/result.ts';
import type { Member } from '../../shared/members/member.ts';
import type { Door } from '../local-api.ts';
import type { Credentials, MemberService } from '../members/member-service.ts';
import { sessionCookie } from './sessions.ts';

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- how Passport's types are told what a user is
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type -- the same
    interface User extends Member {}
  }
}

/** Signing in and out over HTTP. */
export interface SignIn {
  /** Reads the member of the request's session again from the store; who is suspended comes in as a visitor. */
  readonly middleware: RequestHandler;
  /** The door by which a request comes in. */
  doorOf(request: Request, response: Response): Door;
}

/**
 * Passport with e-mail address and password, over the sessions that stand before it.
 * @param cookie the name of the session's cookie, and whether it needs TLS
 */
export function createSignIn(members: MemberService, cookie: { name: string; secure: boolean }): SignIn {
  const passport = new Passport();
  const refusals = new WeakMap<Request, Problem>();

  passport.use(
    new LocalStrategy({ usernameField: 'email', passReqToCallback: true }, (request, email, password, done) => {
      members.signIn({ email, password }, addressOf(request)).then(
        (outcome) => {
          if (!outcome.ok) refusals.set(request, outcome.refusal);
          done(null, outcome.ok ? outcome.value : false);
        },
        (error: unknown) => done(error),
      );
    }),
  );
  passport.serializeUser((member, done) => done(null, member.id));
  passport.deserializeUser((id, done) => done(null, typeof id === 'string' ? members.getSignedIn(id) : null));

  /** Asks the strategy, wherever the credentials came from: JSON, or a form that the router read. */
  function prove(request: Request, response: Response, credentials: Credentials) {
    return new Promise<Result<Member, Problem>>((resolve, reject) => {
      request.body = credentials;
      const answered = (error: unknown, member?: Member | false | null): void => {
        if (error !== null && error !== undefined) return reject(error);
        if (member) return resolve(accept(member));
        const refusal = refusals.get(request);
        if (refusal === undefined) reject(new Error('The strategy refused without a reason'));
        else resolve(refuse(refusal));
      };
      passport.authenticate('local', answered)(request, response, reject);
    });
  }

  return {
    middleware: passport.session(),
    doorOf: (request, response) => ({
      actor: request.user ?? null,
      address: addressOf(request),
      prove: (credentials) => prove(request, response, credentials),
      // Passport gives the browser a new session at sign-in, so that nobody can have laid out the old one.
      signIn: (member) => settled((done) => request.logIn(member, done)),
      async signOut() {
        await settled((done) => request.session.destroy(done));
        response.clearCookie(cookie.name, { ...sessionCookie, secure: cookie.secure });
      },
    }),
  };
}

function addressOf(request: Request): string {
  return request.ip ?? '';
}

function settled(act: (done: (error: unknown) => void) => void): Promise<void> {
  return new Promise((resolve, reject) => {
    act((error) => {
      if (error === null || error === undefined) resolve();
      else reject(error instanceof Error ? error : new Error(String(error)));
    });
  });
}
