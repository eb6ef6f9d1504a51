/**
 * Keeps cookies whichever side an action runs on: the server's answer carries them, and in the browser, where no answer
 * arrives, the document takes them.
 */
export function keepCookies(cookies: readonly string[]): Headers {
  const headers = new Headers();
  for (const cookie of cookies) {
    headers.append('set-cookie', cookie);
    if (typeof document !== 'undefined') document.cookie = cookie;
  }
  return headers;
}
