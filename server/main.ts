import { createServer, type Server } from 'node:http';
import { join } from 'node:path';
import { createApp } from './app.ts';
import { requireProgramFolder } from './config/program-folder.ts';
import { readSettings, SettingsError } from './config/settings.ts';
import { openContext, type Context } from './context.ts';
import { openDevSite } from './http/ssr-dev-site.ts';
import { openBuiltSite, type Site } from './http/ssr-site.ts';
import { demoPassword, isBookEmpty, seedDemo } from './scripts/seed.ts';

/** How long requests that were begun may take to end when the server is stopped. */
const lastMilliseconds = 10_000;

async function main(): Promise<void> {
  const folder = requireProgramFolder();
  const context = await openContext(readSettings(process.env, folder), folder);
  if (context.settings.seed === 'demo' && isBookEmpty(context.database)) {
    console.log('Filling the empty book with the demo …');
    await seedDemo(context, join(folder, 'content'));
  }

  // The first question of all should not wait until the whole book is read.
  context.services.search.ready().catch((failure: unknown) => {
    context.logger.error({ err: failure }, 'The search could not be made ready');
  });

  const server = createServer();
  const develops = process.env['NODE_ENV'] === 'development';
  const clientFolder = develops ? null : join(folder, 'dist', 'client');
  const site = clientFolder === null ? await openDevSite(folder, server) : await openBuiltSite(clientFolder);
  server.on('request', createApp(context, { site, clientFolder }));
  await listen(server, context);
  console.log(greeting(server, context));
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.once(signal, () => void stop(server, site, context));
}

function listen(server: Server, { settings }: Context): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(settings.port, settings.host, resolve);
  });
}

function greeting(server: Server, { settings, services }: Context): string {
  const open = `Earthstrap is open at ${settings.port === 0 ? originOf(server) : settings.baseUrl.origin}`;
  if (!services.members.hasMember('hobbyist@earthstrap.example')) return open;
  return `${open} (sign in as hobbyist@, writer@, moderator@, second-moderator@ or admin@earthstrap.example with the password ${demoPassword})`;
}

/** Where the server listens, if it was left to choose its port. */
function originOf(server: Server): string {
  const address = server.address();
  return typeof address === 'object' && address !== null
    ? `http://${address.address}:${address.port}`
    : String(address);
}

/** Takes no more requests, lets those that were begun end, and closes the store. */
async function stop(server: Server, site: Site, context: Context): Promise<void> {
  const ended = new Promise((resolve) => server.close(resolve));
  server.closeIdleConnections();
  const last = setTimeout(() => server.closeAllConnections(), lastMilliseconds);
  await ended;
  clearTimeout(last);
  await site.close();
  await context.close();
  process.exit(0);
}

/** What kept the server from starting, for whoever started it. */
function startFailure(failure: unknown): string {
  if (failure instanceof SettingsError) return `These settings cannot be read:\n${failure.message}`;
  if (failure instanceof Error && 'code' in failure && failure.code === 'EADDRINUSE') {
    return 'Something else uses this port already. Stop it, or start with another: PORT=3001 npm start';
  }
  return failure instanceof Error ? (failure.stack ?? failure.message) : String(failure);
}

try {
  await main();
} catch (failure) {
  console.error(startFailure(failure));
  process.exit(1);
}
