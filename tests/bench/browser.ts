import { chromium, type Browser, type BrowserContext, type CDPSession, type Page } from '@playwright/test';

/** What a phone on a slow line has (design, section 14). */
export const slowLine = { latency: 150, downloadThroughput: 1_600_000 / 8, uploadThroughput: 750_000 / 8 } as const;
export const slowProcessor = 4;

/** Opens Debian's Chromium without what it does by itself in the background. */
export function openBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export interface Visit {
  readonly page: Page;
  readonly devtools: CDPSession;
}

/** Runs a visit in a context of its own, with nothing kept from another. */
export async function visit<Value>(browser: Browser, act: (visit: Visit) => Promise<Value>): Promise<Value> {
  const context: BrowserContext = await browser.newContext({ viewport: { width: 390, height: 844 } });
  try {
    const page = await context.newPage();
    return await act({ page, devtools: await context.newCDPSession(page) });
  } finally {
    await context.close();
  }
}
