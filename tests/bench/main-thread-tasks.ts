import { z } from 'zod';

const eventSchema = z.object({
  name: z.string(),
  ph: z.string(),
  pid: z.number(),
  tid: z.number(),
  /** Microseconds in which the thread had a processor: a phone's slowness is in it, other programs of this machine not. */
  tdur: z.number().optional(),
  args: z.object({ name: z.unknown().optional() }).loose().optional(),
});
const traceSchema = z.object({ traceEvents: z.array(z.unknown()) });

/** Names under which Chromium's trace has one task of a thread, from its start to its end. */
const taskNames: readonly string[] = ['RunTask', 'ThreadControllerImpl::RunTask'];

/**
 * Milliseconds of the longest task that a page's own thread ran while a trace was taken; workers are not counted. What
 * slows the processor down does so by keeping it busy, and is counted.
 */
export function longestMainThreadTask(trace: Buffer): number {
  const { traceEvents } = traceSchema.parse(JSON.parse(trace.toString()));
  const events = traceEvents.flatMap((event) => {
    const read = eventSchema.safeParse(event);
    return read.success ? [read.data] : [];
  });
  const threadOf = ({ pid, tid }: { pid: number; tid: number }): string => `${String(pid)} ${String(tid)}`;
  const mainThreads = new Set(
    events.filter(({ name, args }) => name === 'thread_name' && args?.name === 'CrRendererMain').map(threadOf),
  );
  const tasks = events.filter((event) => taskNames.includes(event.name) && mainThreads.has(threadOf(event)));
  if (tasks.length === 0) throw new Error('the trace has no task of a page');
  return Math.max(...tasks.map(({ tdur = 0 }) => tdur)) / 1000;
}
