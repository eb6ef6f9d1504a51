import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Site } from '../../server/http/ssr-site.ts';
import { render } from '../../src/entry-server.tsx';

const template = readFileSync(fileURLToPath(new URL('../../index.html', import.meta.url)), 'utf8');

/** The site itself, in index.html as it is written: nothing is built, and nothing is fetched. */
export const realSite: Site = {
  render,
  template: async () => template,
  middleware: null,
  nonce: null,
  close: async () => {},
};
