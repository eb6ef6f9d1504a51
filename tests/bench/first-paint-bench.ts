import type { Browser } from '@playwright/test';
import { openClub, prepareDemoBook } from '../browser/club.ts';
import { openBrowser, slowLine, slowProcessor, visit } from './browser.ts';
import { opened } from './opened.ts';
import type { Pace } from './pace.ts';
import { openPlainTwin } from './plain-twin.ts';
import type { BenchRow } from './row.ts';
import { inTurns, milliseconds } from './side-by-side.ts';

const pagePath = '/donors/torimachi-qf550/pinouts-front';

/** Milliseconds until the first text stands, for a visitor who was never here, on a slow phone and line. */
function firstPaint(browser: Browser, url: string): Promise<number> {
  return visit(browser, async ({ page, devtools }) => {
    await devtools.send('Network.enable');
    await devtools.send('Network.emulateNetworkConditions', { offline: false, ...slowLine });
    await devtools.send('Emulation.setCPUThrottlingRate', { rate: slowProcessor });
    await page.goto(url, { waitUntil: 'load' });
    const painted = await page.evaluate(
      () =>
        new Promise<number>((resolve) => {
          const observer = new PerformanceObserver((entries) => {
            const [paint] = entries.getEntriesByName('first-contentful-paint');
            if (paint !== undefined) resolve(paint.startTime);
          });
          observer.observe({ type: 'paint', buffered: true });
        }),
    );
    return painted;
  });
}

/** The first paint of a page with connectors beside that of the same HTML and CSS without any script. */
export async function firstPaintRows(pace: Pace): Promise<BenchRow[]> {
  await prepareDemoBook();
  return opened(async (open) => {
    const club = await open(openClub());
    const twin = await open(openPlainTwin(club.origin, pagePath));
    const browser = await open(openBrowser());
    const [ours, plain] = [club.origin + pagePath, twin.origin + pagePath];
    await firstPaint(browser, ours);
    await firstPaint(browser, plain);
    const times = await inTurns(
      pace.visits,
      () => firstPaint(browser, ours),
      () => firstPaint(browser, plain),
    );
    return [
      {
        what: 'first paint of a connector page: CPU slowed 4 times, 1.6 Mbit/s, 150 ms',
        beside: 'the same HTML with CSS and no script',
        measured: milliseconds(times.ours),
        yardstick: milliseconds(times.yardstick),
        ratio: times.timeRatio,
        budget: { kind: 'at most', ratio: 1.1 },
      },
    ];
  });
}
