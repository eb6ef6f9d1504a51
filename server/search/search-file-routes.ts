import { Router, type Request, type Response } from 'express';
import { nothingHere, sendProblem } from '../http/problems.ts';
import { chooseEncoding, entityTag, isReading, sendRepresentation } from '../http/representation.ts';
import type { SignIn } from '../http/sign-in.ts';
import type { SearchFile } from './search-messages.ts';
import type { SearchService } from './search-service.ts';

interface SearchFileParts {
  readonly search: SearchService;
  readonly signIn: SignIn;
  readonly reading: 'open' | 'members';
}

const jsonType = 'application/json; charset=utf-8';
const aYear = 'max-age=31536000, immutable';

/**
 * What the search in a browser fetches: the manifest, asked for again and again with `If-None-Match`, and the files that
 * it names, which never change. Where only members may read, nobody in between may keep them.
 */
export function createSearchFileRouter({ search, signIn, reading }: SearchFileParts): Router {
  const router = Router();
  const scope = reading === 'open' ? 'public' : 'private';

  router.get('/search/manifest.json', async (request, response) => {
    const { actor } = signIn.doorOf(request, response);
    const answer = await search.manifest(actor);
    if (!answer.ok) return sendProblem(response, answer.refusal);
    await sendRepresentation(request, response, {
      status: 200,
      contentType: jsonType,
      text: JSON.stringify(answer.value),
      cacheControl: `${scope}, no-cache`,
    });
  });

  router.get('/search/:name', async (request, response) => {
    const { actor } = signIn.doorOf(request, response);
    const answer = await search.file(actor, request.params.name);
    if (!answer.ok) return sendProblem(response, answer.refusal);
    if (answer.value === null) return sendProblem(response, nothingHere);
    sendFile(request, response, answer.value, `${scope}, ${aYear}`);
  });
  return router;
}

function sendFile(request: Request, response: Response, file: SearchFile, cacheControl: string): void {
  const encoding = chooseEncoding(request.headers['accept-encoding']);
  const body = file[encoding];
  response.setHeader('Cache-Control', cacheControl);
  response.setHeader('Vary', 'Accept-Encoding');
  response.setHeader('ETag', entityTag(file.name.replace(/\.json$/, ''), encoding));
  if (encoding !== 'identity') response.setHeader('Content-Encoding', encoding);
  response.setHeader('Content-Type', jsonType);
  response.setHeader('Content-Length', body.byteLength);
  response
    .status(200)
    .end(
      isReading(request) && request.method !== 'HEAD'
        ? Buffer.from(body.buffer, body.byteOffset, body.byteLength)
        : undefined,
    );
}
