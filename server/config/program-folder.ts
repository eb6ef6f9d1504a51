import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The program's own folder, above this file as it is written or as it is built: where `drizzle/` and `content/` stand. */
export function requireProgramFolder(): string {
  let folder = dirname(fileURLToPath(import.meta.url));
  while (!existsSync(join(folder, 'package.json'))) {
    const above = dirname(folder);
    if (above === folder)
      throw new Error('The program does not stand in its own folder: there is no package.json above it.');
    folder = above;
  }
  return folder;
}
