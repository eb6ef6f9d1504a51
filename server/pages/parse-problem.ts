import type { Problem } from '../../shared/lib/problem.ts';
import { problem } from '../../shared/lib/problem.ts';
import type { ParseRefusal } from './parse-pool-types.ts';

/**
 * Says to whoever wrote a text why it was not read.
 * @param kept what became of the text, in a sentence: nothing that somebody wrote is ever just gone
 */
export function parseProblem(refusal: ParseRefusal, kept: string): Problem {
  switch (refusal.kind) {
    case 'busy':
      return problem('busy', 'Too many texts are being read at once', `${kept} Try again in a few seconds.`, {
        retryAfterSeconds: 5,
      });
    case 'rationed': {
      const { retryAfterSeconds } = refusal;
      const wait = `${kept} Try again in ${String(retryAfterSeconds)} seconds.`;
      return problem('too-many-requests', 'This address has used up its reading time', wait, { retryAfterSeconds });
    }
    case 'text': {
      const { limit, message, line } = refusal.refusal;
      const code = limit === 'length' ? 'too-large' : limit === 'deadline' ? 'takes-too-long' : 'not-acceptable-text';
      const title = line === null ? 'The text cannot be read' : `The text cannot be read: line ${String(line)}`;
      return problem(code, title, `${message} ${kept}`);
    }
  }
}
