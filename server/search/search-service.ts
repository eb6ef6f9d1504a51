import type { Worker } from 'node:worker_threads';
import type { Answer } from '../../shared/contracts/api.ts';
import type { SearchView } from '../../shared/contracts/views.ts';
import { problem } from '../../shared/lib/problem.ts';
import { accept, refuse, type Result } from '../../shared/lib/result.ts';
import { can } from '../../shared/members/can.ts';
import type { Actor } from '../../shared/members/member.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import type { Problem } from '../../shared/lib/problem.ts';
import type { BookEvents } from '../pages/book-events.ts';
import type { PageService } from '../pages/page-service-types.ts';
import { manifestOf, type SearchManifest } from './search-files.ts';
import type { FromSearchWorker, SearchFile, ToSearchWorker } from './search-messages.ts';
import { startSearchWorker } from './start-search-worker.ts';

export interface SearchServiceDependencies {
  readonly pages: Pick<PageService, 'publishedDocuments' | 'publishedDocument'>;
  readonly events: BookEvents;
  /** Whether visitors may read, and so search, or members only. */
  readonly reading: 'open' | 'members';
  /** What to do with a thread that failed: it is started again when it is next needed. */
  readonly onFailure?: (failure: unknown) => void;
}

/** Searching the book, in a thread of its own: neither a query nor a publication keeps the server's own thread busy. */
export interface SearchService {
  /** Never asks for more than the reader may read. */
  search(actor: Actor, query: string, bench: string | null, variant: Variant): Answer<SearchView>;
  /** Which files make up the index now; waits for the first ones. */
  manifest(actor: Actor): Promise<Result<SearchManifest, Problem>>;
  /** A file of the index by its name, also one that has been superseded lately; null where there is none. */
  file(actor: Actor, name: string): Promise<Result<SearchFile | null, Problem>>;
  /** Settles once every page that is published now can be found. Starts the thread where it does not run. */
  ready(): Promise<void>;
  close(): Promise<void>;
}

/** Pages handed over in one message, so that the server's own thread draws breath between. */
const pagesAMessage = 20;
/** Publications in quick succession make new files once. */
const settleMilliseconds = 200;
/** Generations of files that are kept for browsers that have just read an older manifest. */
const generationsKept = 4;
/** More queries than this at once are turned away. */
const mostWaiting = 200;
const longestQuery = 300;

interface Asker {
  readonly resolve: (result: Result<SearchView, Problem>) => void;
  readonly reject: (failure: Error) => void;
}

interface Thread {
  readonly worker: Worker;
  readonly loaded: Promise<void>;
  readonly files: Promise<void>;
}

const busy = problem('busy', 'The search is busy', 'Many people are asking at once. Try again in a moment.', {
  retryAfterSeconds: 2,
});

/** Makes the service. The thread starts when it is first needed, or with `ready()`. */
export function createSearchService(dependencies: SearchServiceDependencies): SearchService {
  const { pages, events, reading, onFailure = () => undefined } = dependencies;
  const askers = new Map<number, Asker>();
  const generations: { readonly manifest: SearchManifest; readonly files: readonly SearchFile[] }[] = [];
  let thread: Thread | null = null;
  let asked = 0;
  let settling: NodeJS.Timeout | null = null;
  let closed = false;

  function refusal(actor: Actor): Problem | null {
    if (can(actor, 'read', { reading })) return null;
    return actor === null
      ? problem(
          'sign-in-needed',
          'This book is for members',
          'The club keeps its book to its members: sign in to search it.',
        )
      : problem(
          'not-allowed',
          'You may not search this book',
          'Your membership is suspended. Ask an administrator of the club.',
        );
  }

  function tell(worker: Worker, message: ToSearchWorker): void {
    worker.postMessage(message);
  }

  function open(): Thread {
    if (thread !== null) return thread;
    const worker = startSearchWorker();
    let haveFiles: () => void = () => undefined;
    const files = new Promise<void>((resolve) => {
      haveFiles = resolve;
    });
    worker.on('message', (message: FromSearchWorker) => {
      if (message.kind === 'files') {
        keepFiles(message.lines, message.prose);
        haveFiles();
        return;
      }
      const asker = askers.get(message.id);
      askers.delete(message.id);
      if (message.kind === 'answer') asker?.resolve(accept(message.view));
      else asker?.reject(new Error(`The search failed: ${message.stack}`));
    });
    worker.on('error', (failure) => {
      if (thread?.worker === worker) thread = null;
      haveFiles();
      for (const asker of askers.values()) asker.resolve(refuse(busy));
      askers.clear();
      onFailure(failure);
    });
    thread = { worker, loaded: load(worker), files };
    return thread;
  }

  async function load(worker: Worker): Promise<void> {
    let batch = [];
    for (const page of pages.publishedDocuments()) {
      batch.push(page);
      if (batch.length < pagesAMessage) continue;
      tell(worker, { kind: 'put', pages: batch });
      batch = [];
      await new Promise((resolve) => setImmediate(resolve));
    }
    if (batch.length > 0) tell(worker, { kind: 'put', pages: batch });
    tell(worker, { kind: 'make files' });
  }

  function keepFiles(lines: SearchFile, prose: SearchFile): void {
    generations.unshift({ manifest: manifestOf(lines, prose), files: [lines, prose] });
    generations.length = Math.min(generations.length, generationsKept);
  }

  function ask(worker: Worker, query: string, bench: string | null, variant: Variant): Answer<SearchView> {
    asked += 1;
    const id = asked;
    return new Promise((resolve, reject) => {
      askers.set(id, { resolve, reject });
      tell(worker, { kind: 'ask', id, query, bench, variant });
    });
  }

  const stopListening = events.listen(({ address }) => {
    // A thread that does not run yet will read what is published then.
    if (thread === null || closed) return;
    const { worker, loaded } = thread;
    const page = pages.publishedDocument(address);
    void loaded.then(() => tell(worker, page === null ? { kind: 'remove', address } : { kind: 'put', pages: [page] }));
    if (settling !== null) clearTimeout(settling);
    settling = setTimeout(() => {
      settling = null;
      void loaded.then(() => tell(worker, { kind: 'make files' }));
    }, settleMilliseconds);
    settling.unref();
  });

  return {
    async search(actor, query, bench, variant) {
      const refused = refusal(actor);
      if (refused !== null) return refuse(refused);
      if (closed || askers.size >= mostWaiting) return refuse(busy);
      const { worker, loaded } = open();
      await loaded;
      return ask(worker, query.slice(0, longestQuery), bench, variant);
    },
    async manifest(actor) {
      const refused = refusal(actor);
      if (refused !== null) return refuse(refused);
      if (!closed && generations.length === 0) await open().files;
      const newest = generations[0];
      return newest === undefined ? refuse(busy) : accept(newest.manifest);
    },
    async file(actor, name) {
      const refused = refusal(actor);
      if (refused !== null) return refuse(refused);
      if (!closed && generations.length === 0) await open().files;
      return accept(generations.flatMap(({ files }) => files).find((file) => file.name === name) ?? null);
    },
    async ready() {
      const { loaded, files } = open();
      await loaded;
      await files;
    },
    async close() {
      closed = true;
      stopListening();
      if (settling !== null) clearTimeout(settling);
      for (const asker of askers.values()) asker.resolve(refuse(busy));
      askers.clear();
      await thread?.worker.terminate();
      thread = null;
    },
  };
}
