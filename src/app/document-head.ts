const hoisted = /^(?:<title>[^<]*<\/title>|<(?:meta|link)\b(?:"[^"]*"|[^">])*>)/;

/**
 * Parts a sheet's markup: React puts the title, the meta elements and the links that a sheet names before everything
 * else, and they belong in the document's head.
 */
export function splitHead(markup: string): { readonly head: string; readonly body: string } {
  let end = 0;
  for (;;) {
    const found = hoisted.exec(markup.slice(end));
    if (found === null) return { head: markup.slice(0, end), body: markup.slice(end) };
    end += found[0].length;
  }
}
