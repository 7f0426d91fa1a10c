// npm test: every test. --check adds format, lint, types and generated files before them. --bench runs the benchmarks instead.
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { install, root, run } from './setup.js';

const wanted = process.argv.slice(2);
const tool = (name) => `${root}node_modules/.bin/${name}`;

const must = (title, command, args) => {
  process.stdout.write(`${title}\n`);
  const status = run(command, args);
  if (status === 0) return;
  process.stdout.write(`${title}: failed\n`);
  process.exit(status);
};

const test = () => {
  const folder = `${root}node_modules/.cache/copewright`;
  const results = `${folder}/tests.json`;
  mkdirSync(folder, { recursive: true });
  rmSync(results, { force: true });
  const args = ['run', '--config', 'tests/vitest.config.ts', '--reporter=default', '--reporter=json'];
  const status = run(tool('vitest'), [...args, `--outputFile.json=${results}`]);
  if (!existsSync(results)) process.exit(status || 1);
  const { numPassedTests, numFailedTests, numFailedTestSuites } = JSON.parse(readFileSync(results, 'utf8'));
  // A file that does not even load has no failed test of its own.
  const failed = numFailedTests || (status === 0 ? 0 : Math.max(1, numFailedTestSuites));
  process.stdout.write(`${numPassedTests} passed, ${failed} failed\n`);
  process.exit(status);
};

install();
if (wanted.includes('--bench')) {
  process.exit(run(tool('tsx'), ['tests/bench/run.ts', ...wanted.filter((one) => one !== '--bench')]));
}
if (wanted.includes('--check')) {
  must('Format and lint', tool('biome'), ['ci', '--error-on-warnings']);
  must('Types', tool('tsc'), ['--noEmit', '-p', '.']);
}
must('Build of the bench', tool('vite'), ['build', '--config', 'web/vite.config.ts', '--logLevel', 'warn']);
if (wanted.includes('--check')) must('Generated files', tool('tsx'), ['.scripts/generate.ts', '--check']);
test();
