import { describe, expect, it } from 'vitest';
import { createHttpApi } from './http-api.ts';

interface Call {
  readonly method: string | undefined;
  readonly url: string;
  readonly body: unknown;
}

function doorTo(answer: () => Response | Promise<Response>) {
  const calls: Call[] = [];
  const api = createHttpApi(async (url, init) => {
    calls.push({ method: init?.method, url: String(url), body: init?.body });
    return answer();
  });
  return { api, calls };
}

const qf550 = { shelf: 'donors', subject: 'qf550', page: 'pinouts' } as const;

describe('the browser’s door to the book', () => {
  it('asks for a page with the variant in its address', async () => {
    const { api, calls } = doorTo(() => Response.json({ title: 'Pinouts' }));
    expect(await api.page(qf550, { year: 1980, market: 'UK', frame: null })).toEqual({
      ok: true,
      value: { title: 'Pinouts' },
    });
    expect(calls).toEqual([
      { method: 'GET', url: '/api/pages/donors/qf550/pinouts/view?year=1980&market=UK', body: undefined },
    ]);
  });

  it('sends what was typed as JSON', async () => {
    const { api, calls } = doorTo(() => Response.json({}, { status: 201 }));
    await api.addNote('p/1', { text: 'Measured with the plug off.' });
    expect(calls).toEqual([
      { method: 'POST', url: '/api/proposals/p%2F1/notes', body: '{"text":"Measured with the plug off."}' },
    ]);
  });

  it('asks only for what is chosen', async () => {
    const { api, calls } = doorTo(() => Response.json({}));
    await api.search('Y/R 3', null, { year: null, market: null, frame: null });
    await api.proposals('waiting', false);
    await api.start({ shelf: 'donors', subject: null, page: null, revision: null });
    expect(calls.map(({ url }) => url)).toEqual([
      '/api/search?q=Y%2FR+3',
      '/api/proposals?state=waiting',
      '/api/start?shelf=donors',
    ]);
  });

  it('gives null where there is nothing to give', async () => {
    const { api } = doorTo(() => new Response(null, { status: 204 }));
    expect(await api.signOut()).toEqual({ ok: true, value: null });
  });

  it('hands on a problem as the book wrote it', async () => {
    const refusal = {
      type: '/problems/conflict',
      title: 'Somebody was first',
      detail: 'Your text is kept.',
      status: 409,
      code: 'conflict',
    };
    const { api } = doorTo(() => Response.json(refusal, { status: 409 }));
    expect(await api.send('p1')).toEqual({ ok: false, refusal });
  });

  it.each([
    ['no connection', () => Promise.reject(new TypeError('network'))],
    ['an answer that is no JSON', () => new Response('<h1>Bad gateway</h1>', { status: 502 })],
    ['an error that is no problem', () => Response.json({ message: 'x' }, { status: 502 })],
  ])('says that the book did not answer, and that what was typed is kept, on %s', async (_, answer) => {
    const { api } = doorTo(answer);
    const outcome = await api.home();
    expect(outcome).toMatchObject({ ok: false, refusal: { code: 'busy' } });
  });
});
