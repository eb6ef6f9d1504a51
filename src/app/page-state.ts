import { dehydrate, hydrate, type DehydratedState, type QueryClient } from '@tanstack/react-query';
import { UNSAFE_ErrorResponseImpl as ErrorResponseImpl, isRouteErrorResponse, type HydrationState } from 'react-router';

/*
 * What the server's render leaves for the browser to go on from. The page's safe HTML is not in it: it stands in the
 * document already, in the element that names its owner, and is read from there.
 */

/** The attribute by which rendered HTML says whose it is: a page's address, or a proposal's id. */
const ownerAttribute = 'data-html-of';

interface RouterState {
  readonly loaderData: Record<string, unknown>;
  readonly actionData: Record<string, unknown> | null;
  readonly errors: Record<string, unknown> | null;
}

interface PageState {
  readonly router: RouterState;
  readonly queries: DehydratedState;
}

/**
 * The state as text for a `<script type="application/json">`.
 * @param body the markup of the sheet, to see which HTML stands in it
 */
export function writePageState(router: RouterState, queryClient: QueryClient, body: string): string {
  const state: PageState = {
    router: { ...router, errors: router.errors === null ? null : writeErrors(router.errors) },
    queries: dehydrate(queryClient),
  };
  const text = JSON.stringify(state, (_, value: unknown) => {
    const owner = ownerOf(value);
    return owner !== null && body.includes(`${ownerAttribute}="${owner}"`) ? { ...Object(value), html: '' } : value;
  });
  // No text of a member may end the script element or open a comment in it.
  return text.replaceAll('<', String.raw`\u003c`);
}

/** Reads the state, fills the cache, and gives the router what it starts from. */
export function readPageState(text: string, queryClient: QueryClient, document: Document): HydrationState {
  const now = Date.now();
  // Written by the function above into a document of our own server.
  const state = JSON.parse(text, (key: string, value: unknown) => {
    // A kept sheet may be old and is still what was published last: it is fresh as of now.
    if (key === 'dataUpdatedAt' && typeof value === 'number') return now;
    const html = htmlLeftOut(value, document);
    return html === null ? value : { ...Object(value), html };
  }) as PageState;
  hydrate(queryClient, state.queries);
  return {
    loaderData: state.router.loaderData,
    actionData: state.router.actionData,
    errors: state.router.errors === null ? null : readErrors(state.router.errors),
  };
}

/** Whose HTML a value carries; null where it carries none. */
function ownerOf(value: unknown): string | null {
  if (typeof value !== 'object' || value === null || !('html' in value) || typeof value.html !== 'string') return null;
  if ('address' in value && typeof value.address === 'string') return value.address;
  return 'id' in value && typeof value.id === 'string' ? value.id : null;
}

/** The HTML that the state left out of a value, from where it stands in the document; null where it left out none. */
function htmlLeftOut(value: unknown, document: Document): string | null {
  const owner = ownerOf(value);
  if (owner === null || Object(value).html !== '') return null;
  const elements = [...document.querySelectorAll(`[${ownerAttribute}]`)];
  return elements.find((element) => element.getAttribute(ownerAttribute) === owner)?.innerHTML ?? null;
}

/** A refusal crosses whole; of a surprise nothing crosses but that there was one. */
function writeErrors(errors: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(errors).map(([route, error]) => [
      route,
      isRouteErrorResponse(error)
        ? { refused: true, status: error.status, statusText: error.statusText, data: error.data as unknown }
        : { refused: false },
    ]),
  );
}

function readErrors(errors: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(Object.entries(errors).map(([route, error]) => [route, readError(error)]));
}

function readError(error: unknown): unknown {
  if (typeof error !== 'object' || error === null || !('refused' in error) || error.refused !== true) {
    return new Error('The server could not make this sheet.');
  }
  const { status, statusText, data } = error as unknown as { status: number; statusText: string; data: unknown };
  return new ErrorResponseImpl(status, statusText, data);
}
