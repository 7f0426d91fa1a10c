// npm test: every test. --check adds format, lint, types and generated files before them. --bench runs the benchmarks instead.
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { build, install, must, root, run } from '../api/setup.js';

const wanted = process.argv.slice(2);

/** Runs a tool of the project's own dependencies by its script, so that it starts the same way on every system. */
const tools = {
  biome: 'node_modules/@biomejs/biome/bin/biome',
  tsc: 'node_modules/typescript/bin/tsc',
  tsx: 'node_modules/tsx/dist/cli.mjs',
  vitest: 'node_modules/vitest/vitest.mjs',
};
const tool = (name, ...args) => [process.execPath, [`${root}${tools[name]}`, ...args]];

const test = () => {
  const folder = `${root}node_modules/.cache/copewright`;
  const results = `${folder}/tests.json`;
  mkdirSync(folder, { recursive: true });
  rmSync(results, { force: true });
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${results}`];
  const status = run(...tool('vitest', 'run', '--config', 'tests/vitest.config.ts', ...reporters));
  if (!existsSync(results)) process.exit(status || 1);
  const { numPassedTests, numFailedTests, numFailedTestSuites } = JSON.parse(readFileSync(results, 'utf8'));
  // A file that does not even load has no failed test of its own.
  const failed = numFailedTests || (status === 0 ? 0 : Math.max(1, numFailedTestSuites));
  process.stdout.write(`${numPassedTests} passed, ${failed} failed\n`);
  process.exit(status);
};

install();
if (wanted.includes('--bench')) {
  build();
  process.exit(run(...tool('tsx', 'tests/bench/run.ts')));
}
if (wanted.includes('--check')) {
  must('Format and lint', ...tool('biome', 'ci', '--error-on-warnings'));
  must('Types', ...tool('tsc', '--noEmit', '-p', '.'));
  must('Generated files', ...tool('tsx', '.scripts/generate.ts', '--check'));
}
build();
test();
