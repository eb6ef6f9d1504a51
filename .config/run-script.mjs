/* Runs one of the server's own scripts by its name: node .config/run-script.mjs create-admin … */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { ensureBuild, ensurePackages, root } from './ensure.mjs';

const [name, ...rest] = process.argv.slice(2);
if (name === undefined || !existsSync(join(root, 'server', 'scripts', `${name}.ts`))) {
  console.error(`There is no script ${name ?? 'without a name'} in server/scripts.`);
  process.exit(1);
}
ensurePackages();
ensureBuild();
process.env.NODE_ENV = 'production';
process.chdir(root);
process.setSourceMapsEnabled(true);
const script = join(root, 'dist', 'server', `${name}.js`);
process.argv = [process.argv[0], script, ...rest];
await import(pathToFileURL(script).href);
