/* Starts the club's book: installs and builds what is missing or has changed, then serves. The second time it only serves. */
import { pathToFileURL } from 'node:url';
import { join } from 'node:path';
import { ensureBuild, ensurePackages, root } from './ensure.mjs';

ensurePackages();
ensureBuild();
// In this process, so that whoever stops the command stops the server.
process.env.NODE_ENV = 'production';
process.chdir(root);
process.setSourceMapsEnabled(true);
await import(pathToFileURL(join(root, 'dist', 'server', 'main.js')).href);
