import { describe, expect, test } from 'vitest';
import type { SearchView } from '../../../shared/contracts/views.ts';
import { emptyBench } from '../../lib/bench.ts';
import { createSearchClient } from './search-client.ts';
import type { FromSearchThread, ToSearchThread } from './worker-messages.ts';

function manifest(generation: number): Response {
  const files = {
    version: 1,
    lines: { name: `lines-${generation}`, bytes: 1 },
    prose: { name: `prose-${generation}`, bytes: 1 },
  };
  return new Response(JSON.stringify(files), { status: 200, headers: { etag: `"${generation}"` } });
}

function viewOf(query: string): SearchView {
  return { query, hits: [], remarks: [], bench: null };
}

/** A client with a server that answers as it is told, a thread that is heard and spoken for, and a clock that is turned by hand. */
function openClient(answers: (() => Response)[]) {
  const said: ToSearchThread[] = [];
  const asked: (string | null)[] = [];
  const waiting: (() => void)[] = [];
  let hear: (message: FromSearchThread) => void = () => undefined;
  const client = createSearchClient({
    startThread: () => ({
      say: (message) => said.push(message),
      listen: (listener) => {
        hear = listener;
      },
    }),
    fetcher: (_, init) => {
      asked.push(new Headers(init?.headers).get('if-none-match'));
      const answer = answers.shift();
      return answer === undefined ? Promise.reject(new Error('no network')) : Promise.resolve(answer());
    },
    later: (callback, milliseconds) => {
      expect(milliseconds).toBe(30_000);
      waiting.push(callback);
    },
  });
  /** Lets everything that waits for an answer have it. */
  const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));
  const halfAMinute = async (): Promise<void> => {
    waiting.shift()?.();
    await settle();
  };
  return { client, said, asked, hear: (message: FromSearchThread) => hear(message), settle, halfAMinute };
}

const unchanged = (): Response => new Response(null, { status: 304 });

describe('the search client', () => {
  test('asks for the manifest every half minute, by the tag of the last one, and loads only what is new', async () => {
    const { client, said, asked, settle, halfAMinute } = openClient([() => manifest(1), unchanged, () => manifest(2)]);
    client.start();
    client.start();
    await settle();
    await halfAMinute();
    await halfAMinute();
    expect(asked).toEqual([null, '"1"', '"1"']);
    expect(said).toEqual([
      { kind: 'load', files: { lines: 'lines-1', prose: 'prose-1' } },
      { kind: 'load', files: { lines: 'lines-2', prose: 'prose-2' } },
    ]);
  });

  test('tells its listeners when other files answer, and when the network goes and comes', async () => {
    const { client, hear, settle, halfAMinute } = openClient([() => manifest(1)]);
    const seen: string[] = [];
    client.subscribe(() => {
      const { lines, prose, network } = client.status();
      seen.push(`${lines ?? '–'} ${prose ?? '–'} ${network}`);
    });
    client.start();
    await settle();
    hear({ kind: 'holds', lines: 'lines-1', prose: null });
    hear({ kind: 'holds', lines: 'lines-1', prose: null });
    hear({ kind: 'holds', lines: 'lines-1', prose: 'prose-1' });
    await halfAMinute();
    expect(seen).toEqual(['lines-1 – reached', 'lines-1 prose-1 reached', 'lines-1 prose-1 unreachable']);
  });

  test('reads the manifest anew where a file could not be had', async () => {
    const { client, said, asked, hear, settle, halfAMinute } = openClient([() => manifest(1), () => manifest(1)]);
    client.start();
    await settle();
    hear({ kind: 'trouble', message: 'The server answered 503' });
    await halfAMinute();
    expect(asked).toEqual([null, null]);
    expect(said).toHaveLength(2);
  });

  test('answers null while the index is not there', async () => {
    const { client } = openClient([]);
    expect(await client.ask({ query: 'horn', bench: emptyBench })).toBeNull();
  });

  test('asks one question at a time and drops those that were typed over', async () => {
    const { client, said, hear, settle } = openClient([() => manifest(1)]);
    client.start();
    await settle();
    hear({ kind: 'holds', lines: 'lines-1', prose: null });
    const answers = ['h', 'ho', 'hor', 'horn'].map((query) => client.ask({ query, bench: emptyBench }));
    const questions = (): string[] =>
      said.flatMap((message) => (message.kind === 'ask' ? [message.question.query] : []));
    expect(questions()).toEqual(['h']);
    hear({ kind: 'answer', id: 1, view: viewOf('h') });
    expect(questions()).toEqual(['h', 'horn']);
    hear({ kind: 'answer', id: 2, view: viewOf('horn') });
    expect((await Promise.all(answers)).map((view) => view?.query ?? null)).toEqual(['h', null, null, 'horn']);
  });

  test('stops asking where the book is not for whoever is here, and asks again when it is next started', async () => {
    const { client, said, asked, settle, halfAMinute } = openClient([
      () => new Response(null, { status: 401 }),
      () => manifest(1),
    ]);
    client.start();
    await settle();
    await halfAMinute();
    expect(asked).toHaveLength(1);
    client.start();
    await settle();
    expect(said).toEqual([{ kind: 'load', files: { lines: 'lines-1', prose: 'prose-1' } }]);
  });

  test('takes a manifest that it does not know for no news', async () => {
    const { client, said, settle } = openClient([() => new Response('{"version":7}', { status: 200 })]);
    client.start();
    await settle();
    expect(said).toEqual([]);
    expect(client.status().network).toBe('reached');
  });
});
