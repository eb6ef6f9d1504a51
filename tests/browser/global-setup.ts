import { prepareDemoBook } from './club.ts';

async function globalSetup(): Promise<void> {
  await prepareDemoBook();
}

// Playwright takes a set-up file's default export.
export default globalSetup;
