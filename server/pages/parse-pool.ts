import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { Worker } from 'node:worker_threads';
import type { TextRefusal } from '../../shared/dialect/page-text.ts';
import type { Result } from '../../shared/lib/result.ts';
import { accept, refuse } from '../../shared/lib/result.ts';
import { createParseQueue } from './parse-queue.ts';
import type {
  FromParseWorker,
  ParseAsker,
  ParsedPage,
  ParsePool,
  ParseRefusal,
  ParseRequest,
} from './parse-pool-types.ts';
import { createParsingRation } from './parsing-ration.ts';

/** After this time a text is given up and its worker ended. An honest page takes some tens of milliseconds. */
const defaultDeadlineMilliseconds = 2000;
/** On a machine that is busy with other things the worker has its time later, but not for ever. */
const mostDeadlines = 5;
/** Memory of one worker; a text that wants more is given up. */
const defaultWorkerMegabytes = 256;
const room = { each: 8, all: 64 } as const;

export interface ParsePoolDependencies {
  /** How many texts are read at once. */
  readonly workers: number;
  /** Milliseconds of a clock that never goes back, such as `performance.now`. */
  readonly now: () => number;
  /** Milliseconds of processor time of this process, all its threads together. */
  readonly processorTime?: () => number;
  readonly deadlineMilliseconds?: number;
  readonly workerMegabytes?: number;
  /** The worker's file; the book's own where it is absent. */
  readonly workerEntry?: URL;
}

interface Task {
  readonly request: ParseRequest;
  readonly resolve: (outcome: Result<ParsedPage, ParseRefusal>) => void;
  readonly reject: (failure: Error) => void;
}

interface Running {
  readonly asker: ParseAsker;
  readonly task: Task;
  startedAt: number;
  /** Processor time of the process when the text was begun. */
  processorAt: number;
  timer: NodeJS.Timeout | null;
}

const takesTooLong: TextRefusal = {
  limit: 'deadline',
  message:
    'This text takes too long to read. Long runs of signs, deep nesting and tables with missing cells are slow: make it simpler, or divide it into two pages.',
  line: null,
};

function processorTimeOfProcess(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

/** The worker's file: JavaScript beside the built server, TypeScript beside this file everywhere else. */
function bookWorkerEntry(): URL {
  if (import.meta.url.endsWith('.ts')) return new URL('./parse-worker.ts', import.meta.url);
  // The build puts what several entries share one folder deeper than the entries themselves.
  const places = ['./parse-worker.js', '../parse-worker.js'].map((path) => new URL(path, import.meta.url));
  return places.find((place) => existsSync(fileURLToPath(place))) ?? new URL('./parse-worker.js', import.meta.url);
}

/**
 * What makes a worker read TypeScript: tsx registers itself in it. Its own `--import tsx` does nothing in a worker, where
 * it takes the main thread's registration for granted.
 */
function typeScriptArguments(): string[] {
  // `resolve` finds the CommonJS twin, which cannot register from here; the module stands beside it.
  const tsx = new URL('index.mjs', pathToFileURL(createRequire(import.meta.url).resolve('tsx/esm/api')));
  const register = `import { register } from ${JSON.stringify(tsx.href)}; register();`;
  return ['--import', `data:text/javascript,${encodeURIComponent(register)}`];
}

function startWorker(entry: URL, megabytes: number): Worker {
  const execArgv = entry.pathname.endsWith('.ts') ? typeScriptArguments() : [];
  return new Worker(entry, { execArgv, resourceLimits: { maxOldGenerationSizeMb: megabytes } });
}

/**
 * Reads texts of members and visitors away from the server's own thread. A text that is slow beyond the deadline costs
 * its worker, never the server; askers wait in turns and have a ration of time each.
 */
export function createParsePool(dependencies: ParsePoolDependencies): ParsePool {
  const { workers, now, deadlineMilliseconds = defaultDeadlineMilliseconds } = dependencies;
  const { processorTime = processorTimeOfProcess } = dependencies;
  const entry = dependencies.workerEntry ?? bookWorkerEntry();
  const ration = createParsingRation(now);
  const queue = createParseQueue<Task>(room);
  const idle: Worker[] = [];
  const running = new Map<Worker, Running>();
  let closed = false;

  function settle(worker: Worker): Running | null {
    const current = running.get(worker) ?? null;
    running.delete(worker);
    if (current?.timer) clearTimeout(current.timer);
    if (current !== null && current.asker !== null) ration.charge(current.asker, now() - current.startedAt);
    return current;
  }

  function giveUp(worker: Worker, refusal: TextRefusal): void {
    const current = settle(worker);
    void worker.terminate();
    current?.task.resolve(refuse({ kind: 'text', refusal }));
    next();
  }

  /**
   * Ends a worker that has had its time. What the whole process used of the processor is the most that the worker can
   * have used: where that is less than the deadline, the machine was busy, and an honest text must not be refused for it.
   */
  function watch(worker: Worker, current: Running, deadlines: number): void {
    current.timer = setTimeout(() => {
      const left = deadlineMilliseconds - (processorTime() - current.processorAt);
      if (left <= 0 || deadlines >= mostDeadlines) giveUp(worker, takesTooLong);
      else watch(worker, current, deadlines + 1);
    }, deadlineMilliseconds);
  }

  function open(): Worker {
    const worker = startWorker(entry, dependencies.workerMegabytes ?? defaultWorkerMegabytes);
    worker.on('message', (message: FromParseWorker) => {
      const current = running.get(worker);
      if (current === undefined) return;
      if (message.kind === 'reading') {
        // Only now: loading the parser itself is not the text's fault.
        current.startedAt = now();
        current.processorAt = processorTime();
        watch(worker, current, 1);
        return;
      }
      settle(worker);
      worker.unref();
      idle.push(worker);
      if (message.kind === 'read') current.task.resolve(accept(message.page));
      else if (message.kind === 'refused') current.task.resolve(refuse({ kind: 'text', refusal: message.refusal }));
      else current.task.reject(new Error(`The parser failed: ${message.stack}`));
      next();
    });
    worker.on('error', (failure: Error & { code?: string }) => {
      const at = idle.indexOf(worker);
      if (at >= 0) idle.splice(at, 1);
      if (failure.code === 'ERR_WORKER_OUT_OF_MEMORY') giveUp(worker, takesTooLong);
      else {
        settle(worker)?.task.reject(failure);
        next();
      }
    });
    return worker;
  }

  function next(): void {
    while (!closed && (idle.length > 0 || running.size < workers)) {
      const taken = queue.take();
      if (taken === null) return;
      const worker = idle.pop() ?? open();
      worker.ref();
      running.set(worker, { ...taken, startedAt: now(), processorAt: processorTime(), timer: null });
      worker.postMessage(taken.task.request);
    }
  }

  return {
    parse(request, asker) {
      const retryAfterSeconds = asker === null ? 0 : ration.secondsToWait(asker);
      if (retryAfterSeconds > 0) return Promise.resolve(refuse({ kind: 'rationed', retryAfterSeconds }));
      return new Promise((resolve, reject) => {
        if (closed || !queue.add(asker, { request, resolve, reject })) resolve(refuse({ kind: 'busy' }));
        else next();
      });
    },
    async close() {
      closed = true;
      const open = [...idle, ...running.keys()];
      for (const worker of running.keys()) settle(worker)?.task.resolve(refuse({ kind: 'busy' }));
      for (const task of queue.empty()) task.resolve(refuse({ kind: 'busy' }));
      idle.length = 0;
      await Promise.all(open.map((worker) => worker.terminate()));
    },
  };
}
