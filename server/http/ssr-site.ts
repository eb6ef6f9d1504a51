import { readFileSync } from 'node:fs';
import type { ServerResponse } from 'node:http';
import { join } from 'node:path';
import type { RequestHandler } from 'express';
import type { Rendered, RenderOptions } from '../../src/entry-server.tsx';

/** The site as the server sees it: what makes its pages, and what they are put into. */
export interface Site {
  render(request: Request, options: RenderOptions): Promise<Rendered>;
  /** index.html with its markers, for this address. */
  template(url: string, response: ServerResponse): Promise<string>;
  /** What serves the site's files in development; null where they are built. */
  readonly middleware: RequestHandler | null;
  /** The nonce of a response whose page carries inline scripts and styles; null where pages have none. */
  readonly nonce: ((response: ServerResponse) => string) | null;
  close(): Promise<void>;
}

/**
 * The built site.
 * @param clientFolder `dist/client`
 */
export async function openBuiltSite(clientFolder: string): Promise<Site> {
  const { render } = await import('../../src/entry-server.tsx');
  const template = readFileSync(join(clientFolder, 'index.html'), 'utf8');
  return {
    render,
    template: async () => template,
    middleware: null,
    nonce: null,
    close: async () => {},
  };
}
