import { randomBytes } from 'node:crypto';
import { readFileSync } from 'node:fs';
import type { Server, ServerResponse } from 'node:http';
import { join } from 'node:path';
import type { Site } from './ssr-site.ts';

/** Stands in the page for the nonce of its response; Vite puts it into its own scripts and styles. */
const placeholder = 'NONCE-OF-THIS-RESPONSE';

/**
 * The site as Vite serves it in development. It is loaded apart from the server and imports nothing of it, so that the
 * store is opened once.
 * @param folder the program's folder
 * @param server carries hot reloading as well, so that one port serves all
 */
export async function openDevSite(folder: string, server: Server): Promise<Site> {
  const { createServer } = await import('vite');
  const vite = await createServer({
    root: folder,
    appType: 'custom',
    server: { middlewareMode: true, hmr: { server } },
    html: { cspNonce: placeholder },
  });
  const nonces = new WeakMap<ServerResponse, string>();

  function nonceOf(response: ServerResponse): string {
    const nonce = nonces.get(response) ?? randomBytes(16).toString('base64');
    nonces.set(response, nonce);
    return nonce;
  }

  return {
    async render(request, options) {
      const entry = await vite.ssrLoadModule('/src/entry-server.tsx');
      const render: Site['render'] = entry['render'];
      return render(request, options);
    },
    async template(url, response) {
      const written = readFileSync(join(folder, 'index.html'), 'utf8');
      const transformed = await vite.transformIndexHtml(url, written);
      return transformed.replaceAll(placeholder, nonceOf(response));
    },
    middleware: vite.middlewares,
    nonce: nonceOf,
    close: () => vite.close(),
  };
}
