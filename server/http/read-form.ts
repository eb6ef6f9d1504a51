import type { IncomingMessage } from 'node:http';

/** A page of 64 kB grows threefold in a form, and a form has more fields. */
export const longestForm = 400 * 1024;
/** What is sent beyond a form's length is read this far and thrown away, so that the sender hears the refusal. */
const longestIgnored = 16 * 1024 * 1024;

/**
 * Reads the body of a request, whatever it holds.
 * @returns null where it is longer than a form may be
 */
export async function readForm(request: IncomingMessage): Promise<Uint8Array<ArrayBuffer> | null> {
  const parts: Buffer[] = [];
  let length = 0;
  for await (const part of request) {
    const bytes: Buffer = part;
    length += bytes.length;
    if (length > longestIgnored) break;
    if (length <= longestForm) parts.push(bytes);
  }
  return length > longestForm ? null : Uint8Array.from(Buffer.concat(parts));
}
