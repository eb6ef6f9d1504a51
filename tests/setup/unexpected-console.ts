import { afterEach, beforeEach, expect, vi, type MockInstance } from 'vitest';

/** A test that makes the program complain on the console has found something, unless it says that it expects it. */
let spies: MockInstance[] = [];

beforeEach(() => {
  spies = [vi.spyOn(console, 'error'), vi.spyOn(console, 'warn')];
});

afterEach(() => {
  const said = spies.flatMap((spy) => spy.mock.calls);
  for (const spy of spies) spy.mockRestore();
  expect(said, 'unexpected output on the console').toEqual([]);
});
