import { cpSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { renderToString } from 'react-dom/server';
import { readSettings } from '../../server/config/settings.ts';
import { openContext } from '../../server/context.ts';
import { fillTemplate } from '../../server/http/template.ts';
import { createLocalApi, type Door } from '../../server/local-api.ts';
import { createMemberStore } from '../../server/members/member-store.ts';
import type { Member } from '../../shared/members/member.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { prepareDemoBook } from '../browser/club.ts';
import type { Pace } from './pace.ts';
import type { BenchRow } from './row.ts';
import type * as EntryServer from '../../src/entry-server.tsx';
import { milliseconds, sideBySide } from './side-by-side.ts';

const pages = ['/donors/torimachi-qf550/pinouts-front', '/donors/torimachi-qf550/quirks'] as const;

/** The door of somebody who only reads. */
function readersDoor(actor: Member): Door {
  const refuse = (): never => {
    throw new Error('nobody signs in or out while the bench measures');
  };
  return { actor, address: '127.0.0.1', prove: refuse, signIn: refuse, signOut: refuse };
}

/** The site's renderer as it was built. */
async function builtRenderer(): Promise<typeof EntryServer> {
  const file = pathToFileURL(join(process.cwd(), 'dist', 'server', 'entry-server.js')).href;
  // Built from the very file whose type is given.
  return (await import(/* @vite-ignore */ file)) as typeof EntryServer;
}

/**
 * A page for a member, who gets no kept one: loading from a real store, the markup, the state for the browser, the whole
 * document; beside the markup alone of the same tree with everything loaded. Both are made into bytes, since a string
 * that React has only put together is not yet one that can be sent.
 */
export async function renderingRows(pace: Pace): Promise<BenchRow[]> {
  await prepareDemoBook();
  const folder = mkdtempSync(join(tmpdir(), 'earthstrap-bench-'));
  cpSync(join(process.cwd(), '.cache', 'demo-book'), folder, { recursive: true });
  const settings = readSettings({ DATA_DIR: folder, LOG_LEVEL: 'error' }, process.cwd());
  const context = await openContext(settings, process.cwd());
  try {
    const { loadSheet, render } = await builtRenderer();
    const found = createMemberStore(context.database).getByEmail('hobbyist@earthstrap.example');
    if (found === null) throw new Error('the demo has no hobbyist');
    const options = {
      api: createLocalApi(context.services, readersDoor(found.member)),
      variant: anyVariant,
      bench: null,
    };
    const template = readFileSync(join(process.cwd(), 'dist', 'client', 'index.html'), 'utf8');
    const renderToBytes = async (request: Request): Promise<Buffer> => {
      const rendered = await render(request, options);
      if (rendered.kind !== 'page' || rendered.status !== 200) throw new Error(`${request.url} was not rendered`);
      return fillTemplate(template, rendered);
    };
    const rows: BenchRow[] = [];
    for (const path of pages) {
      const request = (): Request => new Request(`http://127.0.0.1${path}`);
      const loaded = await loadSheet(request(), options);
      if (loaded instanceof Response) throw new Error(`${path} is no page`);
      const times = await sideBySide(
        pace,
        'processor',
        () => renderToBytes(request()),
        () => Buffer.from(renderToString(loaded.element)),
      );
      rows.push({
        what: `a page rendered for a member, to the bytes that are sent: ${path}`,
        beside: 'renderToString of the same tree alone to bytes, everything loaded',
        measured: milliseconds(times.ours),
        yardstick: milliseconds(times.yardstick),
        ratio: 1 / times.timeRatio,
        budget: { kind: 'at least', ratio: 0.8 },
      });
    }
    return rows;
  } finally {
    await context.close();
    rmSync(folder, { recursive: true, force: true });
  }
}
