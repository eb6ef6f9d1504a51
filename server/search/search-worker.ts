import { parentPort } from 'node:worker_threads';
import { createSearchBook } from './search-book.ts';
import { makeFile } from './search-files.ts';
import type { FromSearchWorker, ToSearchWorker } from './search-messages.ts';

const book = createSearchBook();

function say(message: FromSearchWorker): void {
  parentPort?.postMessage(message);
}

async function take(message: ToSearchWorker): Promise<void> {
  switch (message.kind) {
    case 'put':
      for (const page of message.pages) book.put(page);
      return;
    case 'remove':
      book.remove(message.address);
      return;
    case 'make files': {
      const { lines, prose } = book.files();
      say({ kind: 'files', lines: await makeFile(lines), prose: await makeFile(prose) });
      return;
    }
    case 'ask':
      try {
        say({ kind: 'answer', id: message.id, view: book.search(message.query, message.bench, message.variant) });
      } catch (failure) {
        say({
          kind: 'failed',
          id: message.id,
          stack: failure instanceof Error ? (failure.stack ?? failure.message) : String(failure),
        });
      }
  }
}

parentPort?.on('message', (message: ToSearchWorker) => void take(message));
