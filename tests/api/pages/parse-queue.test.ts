import { describe, expect, it } from 'vitest';
import { createParseQueue } from '../../../server/pages/parse-queue.ts';

function takeAll(queue: ReturnType<typeof createParseQueue<string>>): string[] {
  const taken: string[] = [];
  for (let next = queue.take(); next !== null; next = queue.take()) taken.push(next.task);
  return taken;
}

describe('the queue of texts to read', () => {
  it('takes turns between askers, each in their own order', () => {
    const queue = createParseQueue<string>({ each: 8, all: 64 });
    for (const task of ['a1', 'a2', 'a3']) queue.add('a', task);
    for (const task of ['b1', 'b2']) queue.add('b', task);
    queue.add(null, 'own');
    expect(takeAll(queue)).toEqual(['a1', 'b1', 'own', 'a2', 'b2', 'a3']);
  });

  it('has room for so many of one asker and of all, and always for the book itself', () => {
    const queue = createParseQueue<string>({ each: 2, all: 3 });
    expect([queue.add('a', 'a1'), queue.add('a', 'a2'), queue.add('a', 'a3')]).toEqual([true, true, false]);
    expect([queue.add('b', 'b1'), queue.add('c', 'c1'), queue.add(null, 'own')]).toEqual([true, false, true]);
    expect(takeAll(queue)).toEqual(['a1', 'b1', 'own', 'a2']);
    expect(queue.add('c', 'c1')).toBe(true);
  });
});
