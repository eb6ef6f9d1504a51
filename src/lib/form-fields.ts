/** A text field of a form as it was sent; empty where it is absent or is a file. */
export function readText(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}

/** Where a form says that its reader came from: a path of this site, or else the one given. */
export function readWayBack(form: FormData, otherwise: string): string {
  return ownPath(readText(form, 'next')) ?? otherwise;
}

/** The path, query and fragment of an address of this site; null for any other, so that no link can lead away by it. */
export function ownPath(address: string): string | null {
  if (!address.startsWith('/')) return null;
  const base = 'https://site.invalid';
  if (!URL.canParse(address, base)) return null;
  const url = new URL(address, base);
  return url.origin === base ? url.pathname + url.search + url.hash : null;
}
