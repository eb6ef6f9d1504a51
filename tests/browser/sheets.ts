import type { Page } from '@playwright/test';
import { demoPassword, type Club } from './club.ts';

/** Who looks at a sheet: a visitor, or one of the demo's people. */
export type Looker = 'visitor' | 'hobbyist' | 'writer' | 'moderator' | 'admin';

/** A sheet of the site by a name, its address and who may see it. */
export interface Sheet {
  readonly name: string;
  readonly path: string;
  readonly looker: Looker;
}

/** Every kind of sheet that the site has, each with an address where the demo shows it at work. */
export const sheets: readonly Sheet[] = [
  { name: 'home', path: '/', looker: 'visitor' },
  { name: 'donors shelf', path: '/donors', looker: 'visitor' },
  { name: 'parts shelf', path: '/parts', looker: 'visitor' },
  { name: 'reference shelf', path: '/reference', looker: 'visitor' },
  { name: 'donor', path: '/donors/torimachi-qf550', looker: 'visitor' },
  { name: 'donor with a positive earth', path: '/donors/aldermoor-fenman-350', looker: 'visitor' },
  { name: 'part', path: '/parts/quietbox-m', looker: 'visitor' },
  { name: 'reference', path: '/reference/colour-systems', looker: 'visitor' },
  { name: 'pinouts', path: '/donors/torimachi-qf550/pinouts-front', looker: 'visitor' },
  { name: 'pinouts for one bike', path: '/donors/torimachi-qf550/pinouts-front?year=1980&market=UK', looker: 'visitor' },
  { name: 'quirks', path: '/donors/kestova-360/quirks', looker: 'visitor' },
  { name: 'safe modifications', path: '/donors/kestova-360/safe-mods', looker: 'visitor' },
  { name: 'checks', path: '/donors/torimachi-qf550/checks', looker: 'visitor' },
  { name: 'notes', path: '/donors/kestova-360/notes', looker: 'visitor' },
  { name: 'revisions', path: '/donors/torimachi-qf550/pinouts-front/revisions', looker: 'visitor' },
  { name: 'an old revision', path: '/donors/torimachi-qf550/pinouts-front/revisions/1', looker: 'visitor' },
  { name: 'compare', path: '/donors/torimachi-qf550/pinouts-front/compare?from=1&to=2', looker: 'visitor' },
  { name: 'search', path: '/search?q=yellow+red+headlight', looker: 'visitor' },
  { name: 'search without a question', path: '/search', looker: 'visitor' },
  { name: 'search that finds nothing', path: '/search?q=zzzz', looker: 'visitor' },
  { name: 'sign-in', path: '/sign-in', looker: 'visitor' },
  { name: 'not found', path: '/donors/no-such-bike', looker: 'visitor' },
  { name: 'account', path: '/account', looker: 'writer' },
  { name: 'propose a change', path: '/donors/torimachi-qf550/pinouts-front/propose', looker: 'writer' },
  { name: 'new donor', path: '/donors/new', looker: 'writer' },
  { name: 'own proposals', path: '/proposals', looker: 'writer' },
  { name: 'what waits', path: '/proposals', looker: 'moderator' },
];

/** Signs in through the form, as a person does. */
export async function signIn(page: Page, club: Club, who: Exclude<Looker, 'visitor'> | 'second-moderator'): Promise<void> {
  await page.goto(`${club.origin}/sign-in`);
  await page.getByLabel(/e-mail/i).fill(`${who}@earthstrap.example`);
  await page.getByLabel(/password/i).fill(demoPassword);
  await page.locator('main').getByRole('button', { name: /sign in/i }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}
