import { spawnSync } from 'node:child_process';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { describe, expect, it } from 'vitest';
import { openDatabase } from '../../../server/db/client.ts';
import { createMemberService } from '../../../server/members/member-service.ts';
import { accepted } from '../../factories/book.ts';
import { temporaryFolder } from '../../setup/database.ts';

const root = fileURLToPath(new URL('../../..', import.meta.url));
const script = join(root, 'server/scripts/create-admin.ts');
const tsx = pathToFileURL(createRequire(import.meta.url).resolve('tsx')).href;

function createAdmin(
  dataFolder: string,
  words: readonly string[],
  environment: Readonly<Record<string, string>>,
  typed = '',
) {
  const { status, stdout, stderr } = spawnSync(process.execPath, ['--import', tsx, script, ...words], {
    cwd: root,
    encoding: 'utf8',
    input: typed,
    env: { PATH: process.env['PATH'], DATA_DIR: dataFolder, ...environment },
  });
  return { status, stdout, stderr };
}

// Each run of the script compiles it first.
describe('taking an administrator into the club', { timeout: 120_000 }, () => {
  it('works on an empty folder, from arguments and the environment, and again for another person', async () => {
    const folder = temporaryFolder();
    const password = { ADMIN_PASSWORD: 'a long enough word' };
    const first = createAdmin(folder, ['--email', 'Chair@Earthstrap.example', '--name', 'Chair'], password);
    expect(first).toMatchObject({
      status: 0,
      stdout: 'Chair <chair@earthstrap.example> is now an administrator.\n',
      stderr: '',
    });
    const twice = createAdmin(folder, ['--email', 'chair@earthstrap.example', '--name', 'Other'], password);
    expect(twice.status).toBe(1);
    expect(twice.stderr).not.toBe('');

    const database = openDatabase(join(folder, 'book.sqlite'));
    const members = createMemberService({ database, now: Date.now, newId: () => 'unused' });
    const member = accepted(
      await members.signIn({ email: 'chair@earthstrap.example', password: password.ADMIN_PASSWORD }, '192.0.2.1'),
    );
    expect([member.name, member.role]).toEqual(['Chair', 'admin']);
    database.close();
  });

  it('asks for what it was not told, and never shows the password', () => {
    const asked = createAdmin(temporaryFolder(), [], {}, 'chair@earthstrap.example\nChair\na long enough word\n');
    expect(asked).toMatchObject({ status: 0, stderr: '' });
    expect(asked.stdout).toBe(
      'E-mail address: Name: Password: \nChair <chair@earthstrap.example> is now an administrator.\n',
    );
  });

  it('says what is wrong with what it was told', () => {
    const short = createAdmin(temporaryFolder(), ['--name', 'Chair'], { ADMIN_PASSWORD: 'short' }, 'not an address\n');
    expect(short.status).toBe(1);
    expect(short.stderr).toContain('email: ');
    expect(short.stderr).toContain('password: ');
    const silent = createAdmin(temporaryFolder(), ['--name', 'Chair'], { ADMIN_PASSWORD: 'a long enough word' });
    expect(silent).toMatchObject({ status: 1, stderr: 'Nothing was answered.\n' });
  });
});
