import { afterEach, describe, expect, it } from 'vitest';
import { createParsePool, type ParsePoolDependencies } from '../../../server/pages/parse-pool.ts';
import type { ParseAsker, ParsePool } from '../../../server/pages/parse-pool-types.ts';
import { anyVariant } from '../../../shared/pages/applicability.ts';

const scripted = new URL('../../fixtures/parse-pool/scripted-worker.ts', import.meta.url);
const open: ParsePool[] = [];

function scriptedPool(dependencies: Partial<ParsePoolDependencies> = {}): ParsePool {
  const pool = createParsePool({ workers: 1, now: () => performance.now(), workerEntry: scripted, ...dependencies });
  open.push(pool);
  return pool;
}

afterEach(async () => {
  await Promise.all(open.splice(0).map((pool) => pool.close()));
});

/** What became of a text: its HTML, or why it was refused. */
async function outcome(pool: ParsePool, markdown: string, asker: ParseAsker = null): Promise<string> {
  const parsed = await pool.parse(
    { markdown, context: { idsElsewhere: [] }, address: null, variant: anyVariant },
    asker,
  );
  if (parsed.ok) return parsed.value.html;
  const { refusal } = parsed;
  return refusal.kind === 'text' ? `${refusal.kind}: ${refusal.refusal.limit}` : refusal.kind;
}

describe('the pool that reads texts', () => {
  it('reads one text after another in one worker', async () => {
    const pool = scriptedPool();
    const outcomes = await Promise.all([outcome(pool, 'one'), outcome(pool, 'two'), outcome(pool, 'refuse')]);
    expect(outcomes).toEqual(['<p>one</p>', '<p>two</p>', 'text: columns']);
  });

  it('gives up a text at its deadline, and reads the next one', async () => {
    const pool = scriptedPool({ deadlineMilliseconds: 50 });
    const outcomes = await Promise.all([outcome(pool, 'read for ever'), outcome(pool, 'after it')]);
    expect(outcomes).toEqual(['text: deadline', '<p>after it</p>']);
  });

  it('lets a text have its time later where the machine is busy, but not for ever', async () => {
    let asked = 0;
    // A process that gets nothing of the processor.
    const starving = scriptedPool({
      deadlineMilliseconds: 20,
      processorTime: () => {
        asked += 1;
        return 0;
      },
    });
    expect(await outcome(starving, 'read for ever')).toBe('text: deadline');
    // Once when it is begun in the pool, once when it is begun in the worker, and at each of five deadlines.
    expect(asked).toBe(7);
  });

  it('gives up a text that fills the memory, and reads the next one', async () => {
    const pool = scriptedPool({ deadlineMilliseconds: 30_000, workerMegabytes: 16 });
    expect(await outcome(pool, 'fill the memory')).toBe('text: deadline');
    expect(await outcome(pool, 'after it')).toBe('<p>after it</p>');
  });

  it('throws what the parser throws, since that is nobody’s text but a fault, and reads the next one', async () => {
    const pool = scriptedPool();
    await expect(outcome(pool, 'throw')).rejects.toThrow('the scripted parser threw');
    await expect(outcome(pool, 'fail')).rejects.toThrow('the scripted parser failed');
    expect(await outcome(pool, 'after it')).toBe('<p>after it</p>');
  });

  it('answers busy when one asker has too many texts waiting, and still reads those of others', async () => {
    const pool = scriptedPool();
    const crowd = Array.from({ length: 12 }, (_, index) => outcome(pool, `crowd ${String(index)}`, 'crowd'));
    const [other, ...outcomes] = await Promise.all([outcome(pool, 'other', 'other'), ...crowd]);
    expect(other).toBe('<p>other</p>');
    // One is being read, eight wait.
    expect(outcomes.filter((one) => one === 'busy')).toHaveLength(3);
  });

  it('rations the time of one asker and not of another', async () => {
    // On this clock the deadline is 24 seconds, which is more than a minute's ration.
    const pool = scriptedPool({ deadlineMilliseconds: 60, now: () => performance.now() * 400 });
    expect(await outcome(pool, 'read for ever', 'greedy')).toBe('text: deadline');
    const outcomes = [outcome(pool, 'again', 'greedy'), outcome(pool, 'text', 'honest'), outcome(pool, 'own', null)];
    expect(await Promise.all(outcomes)).toEqual(['rationed', '<p>text</p>', '<p>own</p>']);
  });

  it('answers what waits when it is closed, and takes nothing more', async () => {
    const pool = scriptedPool();
    const waiting = [outcome(pool, 'read for ever'), outcome(pool, 'waits')];
    await pool.close();
    expect(await Promise.all(waiting)).toEqual(['busy', 'busy']);
    expect(await outcome(pool, 'late')).toBe('busy');
  });
});
