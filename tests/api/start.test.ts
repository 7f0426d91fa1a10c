import { spawnSync } from 'node:child_process';
import { chmodSync, copyFileSync, mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { delimiter, dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';

let root: string;

/** Writes a file of the trial project, so many seconds ago. */
const put = (path: string, text: string, ago = 100): void => {
  const at = join(root, path);
  mkdirSync(dirname(at), { recursive: true });
  writeFileSync(at, text);
  const when = Date.now() / 1000 - ago;
  utimesSync(at, when, when);
};

/** A project like this one in which installing, building and serving only say that they ran. */
beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), 'copewright-'));
  put('package.json', '{ "type": "module" }');
  put('package-lock.json', '{}');
  put('core/check.ts', '');
  put('web/main.ts', '');
  for (const name of ['setup.js', 'start.js']) {
    copyFileSync(fileURLToPath(new URL(`../../api/${name}`, import.meta.url)), join(mkdirAt('api'), name));
  }
  put('api/copewright.js', "console.log('serving', process.argv.slice(2).join(' '));");
  put('api/cli.ts', '');
  put(
    'built-by.js',
    `import fs from 'node:fs';
    const [part] = process.argv.find((one) => one.endsWith('vite.config.ts')).split('/');
    fs.mkdirSync('dist/' + part, { recursive: true });
    fs.writeFileSync('dist/' + part + (part === 'web' ? '/index.html' : '/cli.js'), '');`,
  );
  put(
    'bin/npm',
    '#!/bin/sh\n[ "$1" = ci ] || exit 9\nmkdir -p node_modules/vite/bin\ncp built-by.js node_modules/vite/bin/vite.js\necho {} > node_modules/.package-lock.json\n',
  );
  chmodSync(join(root, 'bin/npm'), 0o755);
});

afterEach(() => rmSync(root, { recursive: true }));

const mkdirAt = (path: string): string => {
  mkdirSync(join(root, path), { recursive: true });
  return join(root, path);
};

const start = (...args: readonly string[]): { status: number | null; lines: string[] } => {
  const env = { ...process.env, PATH: `${join(root, 'bin')}${delimiter}${process.env.PATH}` };
  const { status, stdout } = spawnSync(process.execPath, [join(root, 'api/start.js'), ...args], { cwd: tmpdir(), env });
  return { status, lines: stdout.toString().trim().split('\n') };
};

const INSTALLS = 'Installing what the project needs (npm ci).';
const BUILDS = 'Building the bench.';
const BUILDS_PROGRAM = 'Building API and command line.';
const SERVES = 'serving serve';

describe.skipIf(process.platform === 'win32')('npm start', () => {
  test('on a clean clone installs, builds and serves, in any folder, and hands its arguments on', () => {
    const { status, lines } = start('--port', '0', '--host', '::1');
    expect([status, lines]).toEqual([0, [INSTALLS, BUILDS, BUILDS_PROGRAM, `${SERVES} --port 0 --host ::1`]]);
  });

  test('a second time only serves', () => {
    start();
    expect(start().lines).toEqual([SERVES]);
  });

  test('builds again what has a source newer than what was built', () => {
    start();
    put('core/new.ts', '', -5);
    expect(start().lines).toEqual([BUILDS, BUILDS_PROGRAM, SERVES]);
  });

  test('builds the bench alone when only its own sources are newer, and the program alone when only its own are', () => {
    start();
    put('web/main.ts', '', -5);
    expect(start().lines).toEqual([BUILDS, SERVES]);
    put('web/main.ts', '');
    put('api/cli.ts', '', -5);
    expect(start().lines).toEqual([BUILDS_PROGRAM, SERVES]);
  });

  test('installs and builds again when the lock file is newer', () => {
    start();
    put('package-lock.json', '{}', -5);
    expect(start().lines).toEqual([INSTALLS, BUILDS, BUILDS_PROGRAM, SERVES]);
  });

  test('ends where installing fails, with its status', () => {
    put('bin/npm', '#!/bin/sh\nexit 7\n');
    chmodSync(join(root, 'bin/npm'), 0o755);
    expect(start()).toEqual({ status: 7, lines: [INSTALLS] });
  });

  test('ends where building fails, with its status', () => {
    put('built-by.js', 'process.exit(3);');
    expect(start()).toEqual({ status: 3, lines: [INSTALLS, BUILDS] });
  });
});
