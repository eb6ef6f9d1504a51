import { brotliDecompressSync } from 'node:zlib';
import type { Browser } from '@playwright/test';
import { openClub, prepareDemoBook } from '../browser/club.ts';
import { openBrowser, visit } from './browser.ts';
import { opened } from './opened.ts';
import { rawGet, settledGet } from './raw-get.ts';
import type { BenchRow } from './row.ts';
import { kilobytes } from './side-by-side.ts';

const pagePath = '/donors/torimachi-qf550/pinouts-front';
const mostScriptBytes = 120_000;

/** Bytes over the wire of a first visit, by the kind of what was asked for. */
function weightsByKind(browser: Browser, url: string): Promise<Map<string, number>> {
  return visit(browser, async ({ page, devtools }) => {
    const kinds = new Map<string, string>();
    const weights = new Map<string, number>();
    devtools.on('Network.responseReceived', ({ requestId, type }) => kinds.set(requestId, type));
    devtools.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
      const kind = kinds.get(requestId) ?? 'Other';
      weights.set(kind, (weights.get(kind) ?? 0) + encodedDataLength);
    });
    await devtools.send('Network.enable');
    await page.goto(url, { waitUntil: 'networkidle' });
    return weights;
  });
}

/** The scripts that stand before the page's text and hold it up: neither modules nor deferred. */
export function scriptsBeforeText(html: string): string[] {
  const before = html.slice(0, html.indexOf('<div id="root">'));
  return [...before.matchAll(/<script\b([^>]*)>/g)]
    .map(([, attributes = '']) => attributes)
    .filter((attributes) => !/\b(?:async|defer)\b|type="(?:module|application\/json)"/.test(attributes))
    .map((attributes) => /src="([^"]+)"/.exec(attributes)?.[1] ?? '');
}

/** What a visitor's first page with connectors weighs. */
export async function weightRows(): Promise<BenchRow[]> {
  await prepareDemoBook();
  return opened(async (open) => {
    const club = await open(openClub());
    const { bytes } = await settledGet(club.origin + pagePath);
    const html = brotliDecompressSync(bytes).toString();
    const blocking = scriptsBeforeText(html);
    let blockingBytes = 0;
    for (const src of blocking) blockingBytes += src === '' ? 0 : (await rawGet(club.origin + src)).bytes.length;
    const weights = await weightsByKind(await open(openBrowser()), club.origin + pagePath);
    const script = weights.get('Script') ?? 0;
    const known = (what: string, kind: string): BenchRow => ({
      what: `over the wire, a visitor's first connector page: ${what}`,
      beside: 'nothing: to be known',
      measured: kilobytes(weights.get(kind) ?? 0),
      yardstick: '–',
      ratio: Number.NaN,
      budget: null,
    });
    return [
      {
        what: "over the wire, a visitor's first connector page: script",
        beside: '120 kB compressed',
        measured: kilobytes(script),
        yardstick: kilobytes(mostScriptBytes),
        ratio: script / mostScriptBytes,
        budget: { kind: 'at most', ratio: 1 },
      },
      {
        what: 'scripts that hold up the text of a page',
        beside: 'none',
        measured: `${String(blocking.length)} (${kilobytes(blockingBytes)})`,
        yardstick: '0',
        ratio: blocking.length,
        budget: { kind: 'at most', ratio: 0 },
      },
      known('HTML', 'Document'),
      known('CSS', 'Stylesheet'),
      known('fonts', 'Font'),
    ];
  });
}
