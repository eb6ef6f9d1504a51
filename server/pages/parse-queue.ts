/** Texts that wait to be read, in turns: each asker's oldest, one after another, so that nobody waits behind a crowd of one. */
export interface ParseQueue<Task> {
  /** False where the asker has too many waiting, or everybody together has; the book's own work always has room. */
  add(asker: string | null, task: Task): boolean;
  take(): { readonly asker: string | null; readonly task: Task } | null;
  /** Takes whatever waits. */
  empty(): Task[];
}

/** Makes an empty queue with room for so many of one asker, and of all together. */
export function createParseQueue<Task>(room: { readonly each: number; readonly all: number }): ParseQueue<Task> {
  // A map keeps the order of its keys: taking an asker out and putting them back at the end is their turn.
  const waiting = new Map<string | null, Task[]>();
  let count = 0;
  return {
    add(asker, task) {
      const own = waiting.get(asker) ?? [];
      if (asker !== null && (own.length >= room.each || count >= room.all)) return false;
      waiting.set(asker, [...own, task]);
      count += 1;
      return true;
    },
    take() {
      for (const [asker, [task, ...others]] of waiting) {
        waiting.delete(asker);
        if (task === undefined) continue;
        if (others.length > 0) waiting.set(asker, others);
        count -= 1;
        return { asker, task };
      }
      return null;
    },
    empty() {
      const tasks = [...waiting.values()].flat();
      waiting.clear();
      count = 0;
      return tasks;
    },
  };
}
