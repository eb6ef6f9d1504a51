import type { Request, Response } from 'express';
import { z } from 'zod';
import { problem, type Problem } from '../../shared/lib/problem.ts';

/** Sends a refusal as RFC 9457 has it, with the request's id as its instance. */
export function sendProblem(response: Response, refusal: Problem): void {
  putProblemHeaders(response, refusal);
  response.status(refusal.status).type('application/problem+json');
  response.send(JSON.stringify({ ...refusal, instance: `urn:uuid:${String(response.req.id)}` }));
}

/** What a refusal says in headers, whatever its body. */
export function putProblemHeaders(response: Response, { retryAfterSeconds }: Problem): void {
  response.setHeader('Cache-Control', 'no-store');
  if (retryAfterSeconds !== undefined) response.setHeader('Retry-After', retryAfterSeconds);
}

/** Nothing answers at this address. */
export const nothingHere = problem(
  'not-found',
  'There is nothing at this address',
  'Check the address, or search for what you were looking for.',
);

/** Another site could have made this request. */
export const notFromHere = problem(
  'cross-site',
  'This did not come from our own pages',
  'Nothing was changed. Open the page again on this site and repeat it; a program must send our address as its Origin.',
);

/** The text is longer than anything the book takes. */
export const tooLong = problem(
  'too-large',
  'This is too long',
  'Nothing was changed. A page may be 64 kB at most: divide it into two pages.',
);

const busy = problem('busy', 'The book is busy', 'Nothing was changed. Try again in a few seconds.', {
  retryAfterSeconds: 5,
});

/** The method is not one that the address knows. */
export function wrongMethod(method: string, allowed: readonly string[]): Problem {
  return problem('method-not-allowed', `This address does not take ${method}`, `It takes ${allowed.join(', ')}.`);
}

/** Our own fault; the id finds it in the log. */
export function unexpected(request: Request): Problem {
  return problem(
    'unexpected',
    'Something went wrong on our side',
    `Nothing that was saved is lost. Try again; if it happens again, tell whoever looks after the site this number: ${String(request.id)}.`,
  );
}

/** What Express and its parsers throw. */
const thrownByParsers = z.object({ status: z.number(), type: z.string().optional() });
const thrownByStore = z.object({ code: z.string().startsWith('SQLITE_BUSY') });

/** The refusal that an error stands for; null where it is our own fault. */
export function problemOf(error: unknown): Problem | null {
  if (thrownByStore.safeParse(error).success) return busy;
  const thrown = thrownByParsers.safeParse(error);
  if (!thrown.success) return null;
  const { status, type } = thrown.data;
  if (status === 413) return tooLong;
  if (type === 'entity.parse.failed') {
    return problem('bad-request', 'The JSON cannot be read', 'Nothing was changed. Check commas, quotes and brackets.');
  }
  if (status >= 400 && status < 500) {
    return problem(
      'bad-request',
      'The request cannot be read',
      'Nothing was changed. Send JSON in UTF-8, and a well-formed address.',
    );
  }
  return null;
}
