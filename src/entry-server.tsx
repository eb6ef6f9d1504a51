import type { QueryClient } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { renderToString } from 'react-dom/server';
import {
  createStaticHandler,
  createStaticRouter,
  RouterContextProvider,
  StaticRouterProvider,
  type StaticHandlerContext,
} from 'react-router';
import type { Api } from '../shared/contracts/api.ts';
import type { Variant } from '../shared/pages/applicability.ts';
import { isKeepable } from './app/keepable.ts';
import { splitHead } from './app/document-head.ts';
import { LastResort } from './app/last-resort.tsx';
import { writePageState } from './app/page-state.ts';
import { createQueryClient, Providers } from './app/providers.tsx';
import { routes } from './app/routes.tsx';
import { apiContext, benchContext, queryClientContext } from './lib/api-context.ts';

export interface RenderOptions {
  /** The door of whoever asks. */
  readonly api: Api;
  /** The variant on the reader's bench: of the cookie, or of the address. */
  readonly variant: Variant;
  /** The donor on the reader's bench. */
  readonly bench: string | null;
  /** Told of what was thrown and is no refusal; the reader is told only that something was. */
  readonly onError?: (error: unknown) => void;
}

/** What a request is answered with: a redirect or the like as it is, or the parts of a page for the template. */
export type Rendered =
  | { readonly kind: 'response'; readonly response: Response }
  | {
      readonly kind: 'page';
      readonly status: number;
      readonly headers: Headers;
      /** Title, description, canonical address and robots, for `<!--head-->`. */
      readonly head: string;
      /** The markup of the root, for `<!--page-->`. */
      readonly body: string;
      /** The state that the browser goes on from, for `<!--state-->`: no script that runs. */
      readonly state: string;
      /**
       * True where every visitor with this bench gets the same at this address until something is published. False for
       * members, for refusals, and for what answers a form.
       */
      readonly keepable: boolean;
    };

const handler = createStaticHandler(routes);

/** A sheet with everything loaded: nothing is left but to make markup of its element. */
interface LoadedSheet {
  readonly context: StaticHandlerContext;
  readonly queryClient: QueryClient;
  readonly element: ReactElement;
}

/** Loads what a request's sheet shows. Exported for the bench, which measures the markup alone beside `render`. */
export async function loadSheet(request: Request, options: RenderOptions): Promise<Response | LoadedSheet> {
  const queryClient = createQueryClient();
  const bench = { donor: options.bench, variant: options.variant };
  const requestContext = new RouterContextProvider();
  requestContext.set(apiContext, options.api);
  requestContext.set(queryClientContext, queryClient);
  requestContext.set(benchContext, bench);

  const context = await handler.query(request, { requestContext });
  if (context instanceof Response) return context;
  const element = (
    <Providers api={options.api} queryClient={queryClient}>
      <StaticRouterProvider
        router={createStaticRouter(handler.dataRoutes, context)}
        context={context}
        hydrate={false}
      />
    </Providers>
  );
  return { context, queryClient, element };
}

/** Answers a request for a page or a form's post with the sheet that belongs to it. */
export async function render(request: Request, options: RenderOptions): Promise<Rendered> {
  const loaded = await loadSheet(request, options);
  if (loaded instanceof Response) return { kind: 'response', response: loaded };
  const { context, queryClient, element } = loaded;
  for (const error of surprises(context)) options.onError?.(error);

  try {
    const markup = renderToString(element);
    const { head, body } = splitHead(markup);
    const { loaderData, actionData, errors } = context;
    const state = writePageState({ loaderData, actionData, errors }, queryClient, body);
    return {
      kind: 'page',
      status: context.statusCode,
      headers: headersOf(context),
      head,
      body,
      state: `<script type="application/json" id="state">${state}</script>`,
      keepable: request.method === 'GET' && isKeepable(context, queryClient, options.api),
    };
  } catch (error) {
    options.onError?.(error);
    const { head, body } = splitHead(renderToString(<LastResort />));
    return { kind: 'page', status: 500, headers: new Headers(), head, body, state: '', keepable: false };
  } finally {
    queryClient.clear();
  }
}

/** What loaders and actions threw that is no refusal of the book. */
function surprises({ errors }: StaticHandlerContext): unknown[] {
  return Object.values(errors ?? {}).filter((error) => error instanceof Error);
}

/** The headers that loaders and actions gave; each cookie stays a header of its own. */
function headersOf({ loaderHeaders, actionHeaders }: StaticHandlerContext): Headers {
  const headers = new Headers();
  for (const given of [...Object.values(loaderHeaders), ...Object.values(actionHeaders)]) {
    for (const [name, value] of given) {
      if (name === 'set-cookie') headers.append(name, value);
      else headers.set(name, value);
    }
  }
  headers.delete('content-type');
  return headers;
}
