import { json, Router, type NextFunction, type Request, type RequestHandler, type Response } from 'express';
import { problem } from '../../shared/lib/problem.ts';
import { createLocalApi, type LocalApi, type Services } from '../local-api.ts';
import { memberRoutes } from '../members/member-routes.ts';
import { pageRoutes } from '../pages/page-routes.ts';
import { proposalRoutes } from '../proposals/proposal-routes.ts';
import { searchRoutes } from '../search/search-routes.ts';
import { describeApi } from './open-api.ts';
import { nothingHere, problemOf, sendProblem, unexpected, wrongMethod } from './problems.ts';
import { longestForm } from './read-form.ts';
import { namesTag, noCache, privateCache, publicCache, sendRepresentation, tagOf } from './representation.ts';
import type { RawInput, Route } from './route.ts';
import type { SignIn } from './sign-in.ts';

/** Every call of the HTTP door. */
export const apiRoutes: readonly Route[] = [...memberRoutes, ...pageRoutes, ...searchRoutes, ...proposalRoutes];

const jsonType = 'application/json; charset=utf-8';
const descriptionPath = '/api/openapi.json';

interface ApiParts {
  readonly services: Services;
  readonly signIn: SignIn;
  readonly reading: 'open' | 'members';
}

/** The calls of the HTTP door as an Express router; it translates, and decides nothing. */
export function createApiRouter({ services, signIn, reading }: ApiParts): Router {
  const router = Router();
  const description = JSON.stringify(describeApi(apiRoutes));
  router.use('/api', json({ limit: longestForm }), requireJson);

  function answerWith(route: Route): RequestHandler {
    return async (request, response) => {
      const door = signIn.doorOf(request, response);
      const api = createLocalApi(services, door);
      const input: RawInput = { parameters: request.params, query: request.query, body: request.body };
      if (await isBehind(route, api, input, request)) return sendProblem(response, behind);
      const answer = await route.answer(api, input);
      if (!answer.ok) return sendProblem(response, answer.refusal);
      const { value, location } = answer.value;
      if (location !== null) response.location(location);
      if (route.status === 204) {
        response.setHeader('Cache-Control', noCache);
        response.status(204).end();
        return;
      }
      const shared = door.actor === null && reading === 'open';
      await sendRepresentation(request, response, {
        status: route.status,
        contentType: jsonType,
        text: JSON.stringify(value),
        cacheControl: route.method !== 'get' ? noCache : shared ? publicCache : privateCache,
      });
    };
  }

  for (const [path, routes] of byPath(apiRoutes)) {
    const place = router.route(expressPath(path));
    for (const route of routes) place[route.method](answerWith(route));
    place.all(refuseMethod(routes));
  }
  router
    .route(descriptionPath)
    .get(async (request, response) => {
      await sendRepresentation(request, response, {
        status: 200,
        contentType: jsonType,
        text: description,
        cacheControl: publicCache,
      });
    })
    .all(refuseMethod([{ method: 'get' }]));
  router.use('/api', (_, response) => sendProblem(response, nothingHere));
  router.use(answerError);
  return router;
}

const behind = problem(
  'behind-what-was-read',
  'This has changed since you read it',
  'Nothing was changed. Read it again, and see whether what you wanted still holds.',
);

/** True where the request says by `If-Match` what it read, and that has changed since. */
async function isBehind(route: Route, api: LocalApi, input: RawInput, { headers }: Request): Promise<boolean> {
  const read = headers['if-match'];
  if (route.dependsOn === null || read === undefined) return false;
  const now = await route.dependsOn(api, input);
  // What may not be read is refused by the call itself, in its own words.
  return now.ok && !namesTag(read, tagOf(JSON.stringify(now.value)));
}

function byPath(routes: readonly Route[]): Map<string, Route[]> {
  const places = new Map<string, Route[]>();
  for (const route of routes) places.set(route.path, [...(places.get(route.path) ?? []), route]);
  return places;
}

/** `/api/proposals/{id}` as Express writes it. */
function expressPath(path: string): string {
  return path.replaceAll(/\{(\w+)\}/g, ':$1');
}

function refuseMethod(routes: readonly Pick<Route, 'method'>[]): RequestHandler {
  const allowed = routes.flatMap(({ method }) => (method === 'get' ? ['GET', 'HEAD'] : [method.toUpperCase()]));
  return (request, response) => {
    response.setHeader('Allow', [...allowed, 'OPTIONS'].join(', '));
    if (request.method === 'OPTIONS') response.status(204).end();
    else sendProblem(response, wrongMethod(request.method, allowed));
  };
}

const notJson = problem('bad-request', 'Only JSON is read here', 'Nothing was changed. Send it as application/json.');

/** A body of another kind would be passed over in silence. */
function requireJson(request: Request, response: Response, next: NextFunction): void {
  const hasBody =
    request.headers['transfer-encoding'] !== undefined || Number(request.headers['content-length'] ?? 0) > 0;
  if (hasBody && !request.is('json')) sendProblem(response, notJson);
  else next();
}

function answerError(error: unknown, request: Request, response: Response, next: NextFunction): void {
  if (response.headersSent) return next(error);
  const refusal = problemOf(error);
  if (refusal === null) request.log.error({ err: error }, 'A call could not be answered');
  sendProblem(response, refusal ?? unexpected(request));
}
