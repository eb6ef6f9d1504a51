import { createIndexHolder } from './index-holder.ts';
import type { FromSearchThread, ToSearchThread } from './worker-messages.ts';

/** The part of a worker's own surroundings that is used here; the site is compiled with those of a page. */
interface WorkerSurroundings {
  postMessage(message: FromSearchThread): void;
  addEventListener(kind: 'message', listener: (event: MessageEvent<ToSearchThread>) => void): void;
}
const surroundings = globalThis as unknown as WorkerSurroundings;

function say(message: FromSearchThread): void {
  surroundings.postMessage(message);
}

const holder = createIndexHolder({
  async fetchFile(name) {
    const response = await fetch(`/search/${encodeURIComponent(name)}`);
    if (!response.ok) throw new Error(`The server answered ${response.status}`);
    const file: unknown = await response.json();
    return file;
  },
  breathe: () => new Promise((resolve) => setTimeout(resolve, 0)),
  onHeld: (lines, prose) => say({ kind: 'holds', lines, prose }),
});

surroundings.addEventListener('message', ({ data }) => {
  if (data.kind === 'load') {
    holder.load(data.files).catch((failure: unknown) => {
      say({ kind: 'trouble', message: failure instanceof Error ? failure.message : String(failure) });
    });
    return;
  }
  const view = holder.ask(data.question);
  if (view !== null) say({ kind: 'answer', id: data.id, view });
});
