import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { Writable } from 'node:stream';
import { parseArgs } from 'node:util';
import { requireProgramFolder } from '../config/program-folder.ts';
import { readSettings } from '../config/settings.ts';
import { openDatabase } from '../db/client.ts';
import { migrate } from '../db/migrate.ts';
import { randomId } from '../db/new-id.ts';
import { createMemberService } from '../members/member-service.ts';

/*
 * Takes an administrator into the club: npm run create-admin -- --email … --name …
 * What is not said so is taken from ADMIN_EMAIL, ADMIN_NAME and ADMIN_PASSWORD, and otherwise asked for. The password is
 * no argument, since everybody on the machine may read those.
 */

/** Somebody at a terminal, or a file of answers, a line each. */
interface Terminal {
  /** What is secret is not shown while it is typed. */
  ask(question: string, secret: boolean): Promise<string>;
  close(): void;
}

function openTerminal(): Terminal {
  let isHidden = false;
  const output = new Writable({
    write(chunk: Buffer, _encoding, done) {
      if (!isHidden) process.stdout.write(chunk);
      done();
    },
  });
  const lines = createInterface({ input: process.stdin, output, terminal: process.stdin.isTTY });
  const answers = lines[Symbol.asyncIterator]();
  return {
    async ask(question, secret) {
      process.stdout.write(question);
      isHidden = secret;
      const answer = await answers.next();
      isHidden = false;
      if (secret) process.stdout.write('\n');
      if (answer.done === true) throw new Error('Nothing was answered.');
      return answer.value;
    },
    close: () => lines.close(),
  };
}

async function createAdmin(): Promise<string> {
  const { values } = parseArgs({ options: { email: { type: 'string' }, name: { type: 'string' } } });
  const folder = requireProgramFolder();
  const { ADMIN_EMAIL, ADMIN_NAME, ADMIN_PASSWORD } = process.env;
  const terminal = openTerminal();
  const email = values.email ?? ADMIN_EMAIL ?? (await terminal.ask('E-mail address: ', false));
  const name = values.name ?? ADMIN_NAME ?? (await terminal.ask('Name: ', false));
  const password = ADMIN_PASSWORD ?? (await terminal.ask('Password: ', true));
  terminal.close();

  const { dataDir } = readSettings(process.env, folder);
  mkdirSync(dataDir, { recursive: true });
  const database = openDatabase(join(dataDir, 'book.sqlite'));
  try {
    migrate(database, join(folder, 'drizzle'));
    const members = createMemberService({ database, now: Date.now, newId: randomId });
    const outcome = await members.addMember({ email, name, password, role: 'admin' });
    if (outcome.ok) return `${outcome.value.name} <${outcome.value.email}> is now an administrator.`;
    const { title, detail, fields = {} } = outcome.refusal;
    const wrong = Object.entries(fields).map(([field, words]) => `  ${field}: ${words}`);
    throw new Error([`${title}. ${detail}`, ...wrong].join('\n'));
  } finally {
    database.close();
  }
}

try {
  console.log(await createAdmin());
} catch (failure) {
  console.error(failure instanceof Error ? failure.message : failure);
  process.exitCode = 1;
}
