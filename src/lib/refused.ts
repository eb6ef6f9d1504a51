import { data } from 'react-router';
import type { Problem } from '../../shared/lib/problem.ts';

/** What an action answers when the book refuses: why, and everything that was typed, to be shown again. */
export interface Refused<Values> {
  readonly problem: Problem;
  readonly values: Values;
}

/** Answers a form with what the book refuses and what was typed, under the refusal's own status. */
export function refused<Values>(problem: Problem, values: Values) {
  const answer: Refused<Values> = { problem, values };
  return data(answer, { status: problem.status });
}
