interface Closable {
  close(): unknown;
}

/** Takes what is being opened and sees to it that it is closed. */
export type Open = <Opened extends Closable>(opening: Opened | Promise<Opened>) => Promise<Opened>;

/** Runs something with what it opens, and closes all of it afterwards in the opposite order, whatever happened. */
export async function opened<Value>(act: (open: Open) => Promise<Value>): Promise<Value> {
  const open: Closable[] = [];
  try {
    return await act(async (opening) => {
      const one = await opening;
      open.push(one);
      return one;
    });
  } finally {
    for (const one of open.reverse()) await one.close();
  }
}
