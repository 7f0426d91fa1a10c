// Brings a clean clone to the point where its tools run. Plain JavaScript: nothing is installed yet when it starts.
import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('..', import.meta.url));

/** Runs a command in the project's folder with its output shown; the exit status. */
export const run = (command, args, shell = false) =>
  spawnSync(command, args, { cwd: root, stdio: 'inherit', shell }).status ?? 1;

/** When a file was last written, ms; 0 where there is none. */
const written = (path) => (existsSync(`${root}${path}`) ? statSync(`${root}${path}`).mtimeMs : 0);

/** When the newest file of a folder was last written, ms. */
const newest = (folder) =>
  readdirSync(`${root}${folder}`, { recursive: true }).reduce(
    (last, name) => Math.max(last, written(`${folder}/${name}`)),
    0,
  );

/** Runs a command under its name and stops the process where it fails. */
export const must = (said, command, args, shell) => {
  process.stdout.write(`${said}\n`);
  const status = run(command, args, shell);
  if (status !== 0) process.exit(status);
};

/** Installs what the lock file names, unless that is already done. */
export const install = () => {
  if (written('node_modules/.package-lock.json') >= written('package-lock.json')) return;
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  must('Installing what the project needs (npm ci).', 'npm', args, process.platform === 'win32');
};

const parts = [
  { said: 'Building the bench.', made: 'dist/web/index.html', sources: 'web' },
  { said: 'Building API and command line.', made: 'dist/api/cli.js', sources: 'api' },
];

const isNew = ({ made, sources }) => {
  const at = written(made);
  return at > 0 && at >= Math.max(newest('core'), newest(sources), written('package-lock.json'));
};

/** True where the command line is built, and from the sources as they are. */
export const programIsBuilt = () => isNew(parts[1]);

/** Builds the bench and the program behind it, unless what is built is newer than its sources. */
export const build = () => {
  const vite = `${root}node_modules/vite/bin/vite.js`;
  for (const part of parts.filter((one) => !isNew(one))) {
    const config = `${part.sources}/vite.config.ts`;
    must(part.said, process.execPath, [vite, 'build', '--config', config, '--logLevel', 'warn']);
  }
};
