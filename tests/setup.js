// Brings a clean clone to the point where its tools run. Plain JavaScript: nothing is installed yet when it starts.
import { spawnSync } from 'node:child_process';
import { existsSync, statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('..', import.meta.url));

/** Runs a command in the project's folder with its output shown; the exit status. */
export const run = (command, args) =>
  spawnSync(command, args, { cwd: root, stdio: 'inherit', shell: process.platform === 'win32' }).status ?? 1;

const changed = (path) => (existsSync(`${root}${path}`) ? statSync(`${root}${path}`).mtimeMs : 0);

/** Installs what the lock file names, unless that is already done. */
export const install = () => {
  if (changed('node_modules/.package-lock.json') >= changed('package-lock.json')) return;
  process.stdout.write('Installing what the project needs (npm ci).\n');
  const status = run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error']);
  if (status !== 0) process.exit(status);
};
