import type { Api } from '../../shared/contracts/api.ts';
import { problem, type Problem } from '../../shared/lib/problem.ts';
import { accept, refuse, type Result } from '../../shared/lib/result.ts';
import { formatPageAddress, type PageAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import { isProblem } from '../lib/answer.ts';
import { variantQuery } from '../lib/bench.ts';

type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';

/** The browser's door to the book: the same calls over HTTP. A refusal arrives as a problem, and so does silence. */
export function createHttpApi(fetcher: typeof fetch = fetch): Api {
  async function call<Value>(method: Method, path: string, body?: unknown): Promise<Result<Value, Problem>> {
    let response: Response;
    let given: unknown;
    try {
      response = await fetcher(`/api${path}`, {
        method,
        headers: { accept: 'application/json', ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
        ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      });
      given = response.status === 204 ? null : await response.json();
    } catch {
      return refuse(silence());
    }
    if (!response.ok) return refuse(isProblem(given) ? given : silence());
    // Our own server's answer, held to the contract by the suite that runs against both doors; a reader's browser
    // downloads no schema to check it with.
    return accept(given as Value);
  }

  const proposalPath = (id: string): string => `/proposals/${encodeURIComponent(id)}`;

  return {
    viewer: () => call('GET', '/session'),
    signIn: (body) => call('POST', '/session', body),
    signOut: () => call('DELETE', '/session'),
    changePassword: (body) => call('PUT', '/account/password', body),

    home: () => call('GET', '/home'),
    shelf: (shelf) => call('GET', `/shelves/${shelf}`),
    subject: ({ shelf, subject }) => call('GET', `/shelves/${shelf}/${encodeURIComponent(subject)}`),
    page: (address, variant) => call('GET', `${pageCall(address)}/view${variantQuery(variant)}`),
    pageData: (address, variant) => call('GET', `${pageCall(address)}${variantQuery(variant)}`),
    revisions: (address) => call('GET', `${pageCall(address)}/revisions`),
    revision: (address, number, variant) =>
      call('GET', `${pageCall(address)}/revisions/${String(number)}${variantQuery(variant)}`),
    compare: (address, from, to) =>
      call('GET', `${pageCall(address)}/compare${query({ from: String(from), to: String(to) })}`),
    search: (text, bench, variant) => call('GET', `/search${query({ q: text, bench, ...variantText(variant) })}`),

    preview: (body) => call('POST', '/preview', body),
    start: ({ shelf, subject, page, revision, kind = null }) =>
      call(
        'GET',
        `/start${query({ shelf, subject, page, revision: revision === null ? null : String(revision), kind })}`,
      ),
    proposals: (state, mine) => call('GET', `/proposals${query({ state, mine: mine ? 'true' : null })}`),
    proposal: (id) => call('GET', proposalPath(id)),
    propose: (body) => call('POST', '/proposals', body),
    addVersion: (id, body) => call('POST', `${proposalPath(id)}/versions`, body),
    addNote: (id, body) => call('POST', `${proposalPath(id)}/notes`, body),
    send: (id) => call('POST', `${proposalPath(id)}/send`),
    sendBack: (id, body) => call('POST', `${proposalPath(id)}/send-back`, body),
    decline: (id, body) => call('POST', `${proposalPath(id)}/decline`, body),
    withdraw: (id) => call('POST', `${proposalPath(id)}/withdraw`),
    publish: (id, body) => call('POST', `${proposalPath(id)}/publish`, body),
  };
}

function pageCall(address: PageAddress): string {
  return `/pages/${formatPageAddress(address).split('/').map(encodeURIComponent).join('/')}`;
}

function variantText({ year, market, frame }: Variant): Record<string, string | null> {
  return { year: year === null ? null : String(year), market, frame };
}

function query(fields: Readonly<Record<string, string | null>>): string {
  const parameters = new URLSearchParams();
  for (const [name, value] of Object.entries(fields)) if (value !== null) parameters.set(name, value);
  const text = parameters.toString();
  return text === '' ? '' : `?${text}`;
}

function silence(): Problem {
  return problem(
    'busy',
    'The book did not answer',
    'What you have typed is still here. See whether there is a connection, then try again.',
  );
}
