import { mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { requireSessionSecret } from '../../server/config/session-secret.ts';
import { isLoopback, readSettings } from '../../server/config/settings.ts';

describe('settings', () => {
  test('run without any', () => {
    expect(readSettings({}, '/club')).toEqual({
      port: 3000,
      host: '127.0.0.1',
      dataDir: '/club/data',
      baseUrl: new URL('http://127.0.0.1:3000'),
      sessionSecret: null,
      reading: 'open',
      seed: 'demo',
      logLevel: 'warn',
    });
  });

  test('take an empty variable as absent', () => {
    expect(readSettings({ PORT: '', READING: ' ' }, '/club')).toEqual(readSettings({}, '/club'));
  });

  test('leave a relative data folder beside the program and an absolute one where it is', () => {
    expect(readSettings({ DATA_DIR: './book' }, '/club').dataDir).toBe('/club/book');
    expect(readSettings({ DATA_DIR: '/var/book' }, '/club').dataDir).toBe('/var/book');
  });

  test.each([
    [{}, 'demo'],
    [{ SEED: 'none' }, 'none'],
    [{ BASE_URL: 'http://localhost:8080' }, 'demo'],
    [{ BASE_URL: 'https://book.example' }, 'none'],
    [{ BASE_URL: 'https://book.example', SEED: 'demo' }, 'demo'],
    [{ HOST: '0.0.0.0' }, 'none'],
    [{ HOST: '0.0.0.0', BASE_URL: 'http://localhost:3000' }, 'demo'],
  ])('with %j an empty book is filled with: %s', (environment, seed) => {
    expect(readSettings(environment, '/club').seed).toBe(seed);
  });

  test('name every variable that cannot be read, and what to write', () => {
    const wrong = {
      PORT: 'many',
      BASE_URL: 'ftp://book.example',
      READING: 'all',
      SEED: 'yes',
      SESSION_SECRET: 'short',
    };
    expect(() => readSettings(wrong, '/club')).toThrow(
      [
        'PORT: write a number from 0 to 65535.',
        'BASE_URL: write an address such as https://book.example.',
        'SESSION_SECRET: write at least 32 characters that nobody can guess.',
        'READING: write open or members.',
        'SEED: write demo or none.',
      ].join('\n'),
    );
  });

  test('refuse a base address with a path', () => {
    expect(() => readSettings({ BASE_URL: 'https://book.example/club' }, '/club')).toThrow('without a path');
  });
});

test.each([
  ['http://localhost:3000', true],
  ['http://127.0.0.1', true],
  ['http://127.3.2.1:99', true],
  ['http://[::1]:3000', true],
  ['http://club.localhost', true],
  ['http://0.0.0.0:3000', false],
  ['http://192.168.1.4', false],
  ['https://localhost.example', false],
  ['https://127.0.0.1.example', false],
])('%s leads to this machine alone: %s', (address, expected) => {
  expect(isLoopback(new URL(address))).toBe(expected);
});

describe('the session secret', () => {
  let folder: string;
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'earthstrap-secret-'));
  });
  afterEach(() => {
    rmSync(folder, { recursive: true });
  });

  test('is made once and kept, for nobody else to read', () => {
    const secret = requireSessionSecret(folder);
    expect(secret).toMatch(/^[\w-]{43}$/);
    expect(requireSessionSecret(folder)).toBe(secret);
    expect(statSync(join(folder, 'session-secret')).mode & 0o077).toBe(0);
  });
});
