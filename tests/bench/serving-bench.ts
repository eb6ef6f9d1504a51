import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import autocannon from 'autocannon';
import { openClub, prepareDemoBook } from '../browser/club.ts';
import { opened } from './opened.ts';
import type { Pace } from './pace.ts';
import { settledGet } from './raw-get.ts';
import { median, type BenchRow } from './row.ts';

const pagePath = '/donors/torimachi-qf550/pinouts-front';

/** Requests a second that an address answers, each answer read whole. */
async function requestsPerSecond(url: string, seconds: number): Promise<number> {
  const result = await autocannon({
    url,
    connections: 16,
    duration: seconds,
    headers: { 'accept-encoding': 'br' },
  });
  if (result.non2xx > 0 || result.errors > 0) throw new Error(`${url} answered with errors`);
  return result.requests.average;
}

async function untilAnswers(url: string): Promise<void> {
  for (let attempt = 0; attempt < 100; attempt += 1) {
    const up = await fetch(url).then(
      (response) => response.ok,
      () => false,
    );
    if (up) return;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error(`${url} did not answer`);
}

const expressSource = (file: string, port: number): string => `
import express from 'express';
import { readFileSync } from 'node:fs';
const bytes = readFileSync(${JSON.stringify(file)});
const app = express();
app.get(${JSON.stringify(pagePath)}, (request, response) => {
  response.set({ 'content-type': 'text/html; charset=utf-8', 'content-encoding': 'br' });
  response.end(bytes);
});
app.listen(${String(port)}, '127.0.0.1');
`;

const nginxSource = (folder: string, port: number): string => `
worker_processes 1; daemon off; pid ${folder}/nginx.pid; error_log ${folder}/error.log;
events { worker_connections 256; }
http {
  access_log off; client_body_temp_path ${folder}; proxy_temp_path ${folder}; fastcgi_temp_path ${folder};
  uwsgi_temp_path ${folder}; scgi_temp_path ${folder};
  server {
    listen 127.0.0.1:${String(port)};
    location / { root ${folder}; default_type 'text/html; charset=utf-8'; add_header content-encoding br; try_files /page.br =404; }
  }
}
`;

function startServer(command: string, args: readonly string[]): { close(): Promise<void> } {
  const server = spawn(command, args, { stdio: 'inherit' });
  const ended = new Promise<void>((resolve) => server.once('exit', () => resolve()));
  return {
    async close() {
      server.kill();
      await ended;
    },
  };
}

/** A published page for a visitor, beside Express and nginx sending the same bytes. */
export async function servingRows({ loadRounds, loadSeconds }: Pace): Promise<BenchRow[]> {
  await prepareDemoBook();
  const folder = mkdtempSync(join(tmpdir(), 'earthstrap-bench-'));
  return opened(async (open) => {
    await open({ close: () => rmSync(folder, { recursive: true, force: true }) });
    const club = await open(openClub());
    const file = join(folder, 'page.br');
    writeFileSync(file, (await settledGet(club.origin + pagePath)).bytes);
    const expressPort = 41_731;
    const nginxPort = 41_732;
    const expressFile = join(process.cwd(), '.cache', 'bench-express.mjs');
    writeFileSync(expressFile, expressSource(file, expressPort));
    writeFileSync(join(folder, 'nginx.conf'), nginxSource(folder, nginxPort));
    await open(startServer(process.execPath, [expressFile]));
    await open(startServer('/usr/sbin/nginx', ['-c', join(folder, 'nginx.conf')]));
    const expressUrl = `http://127.0.0.1:${String(expressPort)}${pagePath}`;
    const nginxUrl = `http://127.0.0.1:${String(nginxPort)}${pagePath}`;
    await untilAnswers(expressUrl);
    await untilAnswers(nginxUrl);
    const ours: number[] = [];
    const express: number[] = [];
    const nginx: number[] = [];
    for (let round = 0; round < loadRounds; round += 1) {
      ours.push(await requestsPerSecond(club.origin + pagePath, loadSeconds));
      express.push(await requestsPerSecond(expressUrl, loadSeconds));
      nginx.push(await requestsPerSecond(nginxUrl, loadSeconds));
    }
    // Round by round, so that a slow moment of the machine touches both.
    const ratioTo = (others: readonly number[]): number =>
      median(ours.map((own, round) => own / (others[round] ?? Number.NaN)));
    const perSecond = (values: readonly number[]): string => `${Math.round(median(values)).toLocaleString('en')} /s`;
    return [
      {
        what: 'a published page for a visitor',
        beside: 'Express sending the same bytes',
        measured: perSecond(ours),
        yardstick: perSecond(express),
        ratio: ratioTo(express),
        budget: { kind: 'at least', ratio: 0.9 },
      },
      {
        what: 'a published page for a visitor',
        beside: 'nginx sending the same file',
        measured: perSecond(ours),
        yardstick: perSecond(nginx),
        ratio: ratioTo(nginx),
        budget: { kind: 'at least', ratio: 0.35 },
      },
    ];
  });
}
