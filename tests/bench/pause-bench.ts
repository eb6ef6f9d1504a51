import { slowInputs } from '../fixtures/slow-inputs.ts';
import { honestPage } from './honest-page.ts';
import { opened } from './opened.ts';
import type { Pace } from './pace.ts';
import { median, type BenchRow } from './row.ts';
import { milliseconds } from './side-by-side.ts';
import { openWatchedClub } from './watched-club.ts';

const mostMilliseconds = 100;
/** As many as one asker may have waiting. */
const atOnce = 8;
const readPaths = ['/healthz', '/donors/torimachi-qf550/pinouts-front', '/api/pages/donors/torimachi-qf550/quirks'];

/** Sends a text to be looked at; every answer is fine but a failure of the server. */
async function preview(origin: string, markdown: string): Promise<number> {
  const response = await fetch(`${origin}/api/preview`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin },
    body: JSON.stringify({ markdown }),
  });
  await response.arrayBuffer();
  if (response.status >= 500) throw new Error(`the preview of a slow text failed: ${String(response.status)}`);
  return response.status;
}

/** Sends every slow text, and honest ones of the longest kind between them, so many at a time. */
async function sendAll(origin: string): Promise<void> {
  const honest = honestPage(30);
  const texts = slowInputs.flatMap(({ text }, at) => (at % 10 === 0 ? [honest, text] : [text]));
  const next = texts.values();
  await Promise.all(
    Array.from({ length: atOnce }, async () => {
      for (const text of next) await preview(origin, text);
    }),
  );
}

/** Reads the book all the while, as others do. */
async function readUntil(origin: string, isOver: () => boolean): Promise<void> {
  for (let at = 0; !isOver(); at += 1) {
    const path = readPaths[at % readPaths.length] ?? '/healthz';
    const response = await fetch(`${origin}${path}`);
    await response.arrayBuffer();
    if (!response.ok) throw new Error(`${path} was not answered while slow texts were refused`);
  }
}

/** How long the server stands still while it refuses the texts that are slow to parse. */
export function pauseRows({ visits }: Pace): Promise<BenchRow[]> {
  return opened(async (open) => {
    const club = await open(openWatchedClub());
    const act = async (): Promise<void> => {
      let over = false;
      const sending = sendAll(club.origin).finally(() => {
        over = true;
      });
      await Promise.all([sending, readUntil(club.origin, () => over)]);
    };
    await act();
    const pauses: number[] = [];
    for (let round = 0; round < visits; round += 1) pauses.push(await club.longestPauseDuring(act));
    return [
      {
        what: `longest pause of the server while ${String(slowInputs.length)} slow texts are refused and others read`,
        beside: `${String(mostMilliseconds)} ms`,
        measured: milliseconds(median(pauses)),
        yardstick: milliseconds(mostMilliseconds),
        ratio: median(pauses) / mostMilliseconds,
        budget: { kind: 'at most', ratio: 1 },
      },
    ];
  });
}
