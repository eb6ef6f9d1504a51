import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { Worker } from 'node:worker_threads';

/** The thread's file: JavaScript beside the built server, TypeScript beside this file everywhere else. */
function workerEntry(): URL {
  if (import.meta.url.endsWith('.ts')) return new URL('./search-worker.ts', import.meta.url);
  // The build puts what several entries share one folder deeper than the entries themselves.
  const places = ['./search-worker.js', '../search-worker.js'].map((path) => new URL(path, import.meta.url));
  return places.find((place) => existsSync(fileURLToPath(place))) ?? new URL('./search-worker.js', import.meta.url);
}

/** What makes a thread read TypeScript: tsx registers itself in it. */
function typeScriptArguments(): string[] {
  const tsx = new URL('index.mjs', pathToFileURL(createRequire(import.meta.url).resolve('tsx/esm/api')));
  const register = `import { register } from ${JSON.stringify(tsx.href)}; register();`;
  return ['--import', `data:text/javascript,${encodeURIComponent(register)}`];
}

/** Starts the thread that searches. It keeps no process alive by itself. */
export function startSearchWorker(): Worker {
  const entry = workerEntry();
  const worker = new Worker(entry, { execArgv: entry.pathname.endsWith('.ts') ? typeScriptArguments() : [] });
  worker.unref();
  return worker;
}
