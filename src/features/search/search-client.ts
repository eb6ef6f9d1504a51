import type { SearchView } from '../../../shared/contracts/views.ts';
import type { FromSearchThread, IndexFiles, Question, ToSearchThread } from './worker-messages.ts';

/** How the search in this browser stands. */
export interface SearchStatus {
  /** The files that answer now; null for none yet. A change of either means that answers may have changed. */
  readonly lines: string | null;
  readonly prose: string | null;
  /** `unreachable` while the server does not answer: what is held still does. */
  readonly network: 'reached' | 'unreachable';
}

/** The search in this browser: a thread that holds the index, kept up to date. */
export interface SearchClient {
  /** Starts the thread and the asking for news; while they go on further calls do nothing. */
  start(): void;
  status(): SearchStatus;
  subscribe(listener: () => void): () => void;
  /**
   * Asks the index. Null where it is not there yet, and where a newer question has overtaken this one before it was asked.
   */
  ask(question: Question): Promise<SearchView | null>;
}

/** The thread that searches, as the client sees it. */
export interface SearchThread {
  say(message: ToSearchThread): void;
  listen(listener: (message: FromSearchThread) => void): void;
}

/** What the client needs of the page that it lives in. */
export interface ClientSurroundings {
  startThread(): SearchThread;
  fetcher: typeof fetch;
  /** Calls back after so many milliseconds. */
  later(callback: () => void, milliseconds: number): void;
}

const manifestPath = '/search/manifest.json';
/** A published change is to be found within a minute. */
const pollMilliseconds = 30_000;
const nothingYet: SearchStatus = { lines: null, prose: null, network: 'reached' };

/** Makes a client that has not started. */
export function createSearchClient({ startThread, fetcher, later }: ClientSurroundings): SearchClient {
  let thread: SearchThread | null = null;
  let current = nothingYet;
  let tag: string | null = null;
  let looking = false;
  let asked = 0;
  let inFlight: { readonly id: number; readonly resolve: (view: SearchView | null) => void } | null = null;
  let next: { readonly question: Question; readonly resolve: (view: SearchView | null) => void } | null = null;
  const listeners = new Set<() => void>();

  function become(change: Partial<SearchStatus>): void {
    const changed = { ...current, ...change };
    if (changed.lines === current.lines && changed.prose === current.prose && changed.network === current.network)
      return;
    current = changed;
    for (const listener of [...listeners]) listener();
  }

  function hear(data: FromSearchThread): void {
    if (data.kind === 'holds') become({ lines: data.lines, prose: data.prose });
    // Without its tag the manifest is read anew next time, and the files are tried again.
    else if (data.kind === 'trouble') tag = null;
    else if (inFlight?.id === data.id) {
      const { resolve } = inFlight;
      inFlight = null;
      resolve(data.view);
      askNext();
    }
  }

  function askNext(): void {
    if (inFlight !== null || next === null || thread === null) return;
    asked += 1;
    inFlight = { id: asked, resolve: next.resolve };
    thread.say({ kind: 'ask', id: asked, question: next.question });
    next = null;
  }

  async function lookForNews(): Promise<void> {
    looking = true;
    try {
      const response = await fetcher(manifestPath, {
        // Asked by hand, so that an unchanged manifest costs its headers and nothing else.
        cache: 'no-store',
        headers: { accept: 'application/json', ...(tag === null ? {} : { 'if-none-match': tag }) },
      });
      become({ network: 'reached' });
      // Not for whoever is here now: it is asked for again when somebody next turns to the search.
      if (response.status === 401 || response.status === 403) {
        looking = false;
        return;
      }
      if (response.status === 200) {
        const files = readFiles(await response.json());
        tag = response.headers.get('etag');
        if (files !== null) thread?.say({ kind: 'load', files });
      }
    } catch {
      become({ network: 'unreachable' });
    }
    later(() => void lookForNews(), pollMilliseconds);
  }

  return {
    start() {
      if (thread === null) {
        thread = startThread();
        thread.listen(hear);
      }
      if (!looking) void lookForNews();
    },
    status: () => current,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    ask(question) {
      if (current.lines === null) return Promise.resolve(null);
      return new Promise((resolve) => {
        next?.resolve(null);
        next = { question, resolve };
        askNext();
      });
    },
  };
}

/** The names of the files in a manifest; null where it is not one that this page knows. */
function readFiles(manifest: unknown): IndexFiles | null {
  if (typeof manifest !== 'object' || manifest === null || !('lines' in manifest) || !('prose' in manifest))
    return null;
  const lines = nameIn(manifest.lines);
  const prose = nameIn(manifest.prose);
  return lines === null || prose === null ? null : { lines, prose };
}

function nameIn(file: unknown): string | null {
  return typeof file === 'object' && file !== null && 'name' in file && typeof file.name === 'string'
    ? file.name
    : null;
}

let ofThisPage: SearchClient | null = null;

/** The one client of this page. Only in a browser. */
export function pageSearchClient(): SearchClient {
  ofThisPage ??= createSearchClient({
    startThread: startSearchThread,
    fetcher: (...request) => fetch(...request),
    later: (callback, milliseconds) => void setTimeout(callback, milliseconds),
  });
  return ofThisPage;
}

function startSearchThread(): SearchThread {
  const worker = new Worker(new URL('./search-worker.ts', import.meta.url), { type: 'module', name: 'search' });
  return {
    say: (message) => worker.postMessage(message),
    listen: (listener) =>
      worker.addEventListener('message', ({ data }: MessageEvent<FromSearchThread>) => listener(data)),
  };
}
