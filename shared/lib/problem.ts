/**
 * What the service answers when it refuses: an RFC 9457 problem.
 * `code` is the last part of `type`, for programs; `title` and `detail` are for people: what happened, and what to do.
 */
export interface Problem {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly code: ProblemCode;
  readonly instance?: string;
  /** What is wrong with each named field of a form, in a sentence each. */
  readonly fields?: Readonly<Record<string, string>>;
  /** What a publication still needs, where that is why it was refused. */
  readonly missing?: readonly { readonly code: string; readonly address: string | null; readonly message: string }[];
  /** Seconds to wait before the same request may succeed. */
  readonly retryAfterSeconds?: number;
}

/** Every refusal that the club's book knows, with its HTTP status. */
export const problemStatuses = {
  'bad-request': 400,
  'sign-in-needed': 401,
  'sign-in-failed': 401,
  'not-allowed': 403,
  'cross-site': 403,
  'not-found': 404,
  'method-not-allowed': 405,
  conflict: 409,
  'fallen-behind': 409,
  'wrong-state': 409,
  'override-needed': 409,
  'already-there': 409,
  'behind-what-was-read': 412,
  'too-large': 413,
  'not-acceptable-text': 422,
  'takes-too-long': 422,
  'fields-invalid': 422,
  'too-many-requests': 429,
  unexpected: 500,
  busy: 503,
} as const;

/** The name of a refusal. */
export type ProblemCode = keyof typeof problemStatuses;

/**
 * Makes a problem of a known kind.
 * @param code which refusal
 * @param title what happened, in a few words
 * @param detail what was kept and what to do, in a sentence or two
 */
export function problem(
  code: ProblemCode,
  title: string,
  detail: string,
  more: Pick<Problem, 'fields' | 'missing' | 'retryAfterSeconds'> = {},
): Problem {
  return { type: `/problems/${code}`, title, status: problemStatuses[code], detail, code, ...more };
}
