import { data, isRouteErrorResponse } from 'react-router';
import type { Problem } from '../../shared/lib/problem.ts';
import type { Result } from '../../shared/lib/result.ts';

/** Gives the value of an answer; throws a refusal as what the router shows as an error, with its status. */
export async function requireAnswer<Value>(answer: Promise<Result<Value, Problem>>): Promise<Value> {
  const result = await answer;
  if (result.ok) return result.value;
  // The router's own kind of throw: it carries the status, and the error sheet reads the problem from it.
  throw data(result.refusal, { status: result.refusal.status });
}

/** True where a value that was thrown or returned is a problem of the book. */
export function isProblem(value: unknown): value is Problem {
  return (
    typeof value === 'object' &&
    value !== null &&
    'code' in value &&
    'title' in value &&
    'detail' in value &&
    'status' in value &&
    typeof value.code === 'string' &&
    typeof value.title === 'string' &&
    typeof value.detail === 'string'
  );
}

/** True where what was thrown is a refusal of the book, of this kind where one is named. */
export function isProblemThrown(error: unknown, code?: Problem['code']): boolean {
  const refusal = problemThrown(error);
  return refusal !== null && (code === undefined || refusal.code === code);
}

/** The refusal that was thrown; null where it was a surprise. */
export function problemThrown(error: unknown): Problem | null {
  const given = isRouteErrorResponse(error) || hasData(error) ? error.data : error;
  return isProblem(given) ? given : null;
}

/** What `data` makes is thrown as it is inside a loader, and becomes an error response only when it leaves it. */
function hasData(error: unknown): error is { readonly data: unknown } {
  return typeof error === 'object' && error !== null && 'data' in error;
}
