import { z } from 'zod';
import type { Answer } from '../../shared/contracts/api.ts';
import { problem, type Problem, type ProblemCode } from '../../shared/lib/problem.ts';
import { accept, refuse, type Result } from '../../shared/lib/result.ts';
import type { LocalApi } from '../local-api.ts';

/** A request as it came: strings of the path and the query, and whatever the body held. */
export interface RawInput {
  readonly parameters: unknown;
  readonly query: unknown;
  readonly body: unknown;
}

/** What a call gives, and where what it made can be read (null where it made nothing). */
export interface Given {
  readonly value: unknown;
  readonly location: string | null;
}

/**
 * One call of the HTTP door: how it is asked, what it gives, and which of the `Api`'s methods answers. The router and
 * the OpenAPI document are both made from these, so neither knows a call that the other does not.
 */
export interface Route {
  readonly method: 'get' | 'post' | 'put' | 'delete';
  /** As OpenAPI writes it: `/api/proposals/{id}`. */
  readonly path: string;
  /** The operation's id. */
  readonly name: string;
  readonly summary: string;
  readonly parameters: z.ZodObject;
  readonly query: z.ZodObject;
  /** What the service will read; the route only describes it. */
  readonly body: z.ZodType | null;
  readonly status: 200 | 201 | 204;
  /** What it gives; null for nothing. */
  readonly view: z.ZodType | null;
  /** The refusals that are its own, beside those that any call may meet. */
  readonly problems: readonly ProblemCode[];
  answer(api: LocalApi, input: RawInput): Answer<Given>;
  /** What a write depends on, for `If-Match`; null where it depends on nothing that was read. */
  readonly dependsOn: ((api: LocalApi, input: RawInput) => Answer<unknown>) | null;
}

interface Input<Parameters extends z.ZodObject, Query extends z.ZodObject> {
  readonly parameters: z.output<Parameters>;
  readonly query: z.output<Query>;
  readonly body: unknown;
}

interface RouteDescription<Parameters extends z.ZodObject, Query extends z.ZodObject, Value> extends Pick<
  Route,
  'method' | 'path' | 'name' | 'summary'
> {
  readonly parameters?: Parameters;
  readonly query?: Query;
  readonly body?: z.ZodType;
  readonly status?: Route['status'];
  readonly view: z.ZodType<Value> | null;
  readonly problems?: readonly ProblemCode[];
  answer(api: LocalApi, input: Input<Parameters, Query>): Answer<Value>;
  readonly location?: (value: Value) => string;
  readonly dependsOn?: (api: LocalApi, input: Input<Parameters, Query>) => Answer<unknown>;
}

const nothing = z.object({});

/** Makes a call of the HTTP door: its path and query are parsed here, its body by the service. */
export function defineRoute<
  Value,
  Parameters extends z.ZodObject = typeof nothing,
  Query extends z.ZodObject = typeof nothing,
>(description: RouteDescription<Parameters, Query, Value>): Route {
  const parameters = description.parameters ?? nothing;
  const query = description.query ?? nothing;
  const { dependsOn, location } = description;

  function read(input: RawInput): Result<Input<Parameters, Query>, Problem> {
    const readParameters = parameters.safeParse(input.parameters);
    if (!readParameters.success) {
      return refuse(problem('not-found', 'There is nothing at this address', 'Check the address, or search for it.'));
    }
    const readQuery = query.safeParse(input.query);
    if (!readQuery.success) return refuse(unreadableQuery(readQuery.error));
    return {
      ok: true,
      // What the two schemas gave is what their own types say; the compiler loses that at the defaults above.
      value: { parameters: readParameters.data, query: readQuery.data, body: input.body } as Input<Parameters, Query>,
    };
  }

  return {
    method: description.method,
    path: description.path,
    name: description.name,
    summary: description.summary,
    parameters,
    query,
    body: description.body ?? null,
    status: description.status ?? 200,
    view: description.view,
    problems: description.problems ?? [],
    async answer(api, input) {
      const asked = read(input);
      if (!asked.ok) return asked;
      const answer = await description.answer(api, asked.value);
      return answer.ok ? accept({ value: answer.value, location: location?.(answer.value) ?? null }) : answer;
    },
    dependsOn:
      dependsOn === undefined
        ? null
        : async (api, input) => {
            const asked = read(input);
            return asked.ok ? dependsOn(api, asked.value) : asked;
          },
  };
}

function unreadableQuery(error: z.ZodError): Problem {
  const fields = Object.fromEntries(error.issues.map((issue) => [issue.path.join('.'), issue.message]));
  return problem(
    'bad-request',
    'The address asks for something that cannot be read',
    'Check what stands after the ?.',
    {
      fields,
    },
  );
}
