#!/usr/bin/env node
// Plain JavaScript: it must be able to say what is missing before anything is installed.
import { fileURLToPath } from 'node:url';

const root = new URL('..', import.meta.url);

const load = async () => {
  const { register } = await import('tsx/esm/api');
  register({ tsconfig: fileURLToPath(new URL('tsconfig.json', root)) });
};

try {
  await load();
} catch (error) {
  if (error?.code !== 'ERR_MODULE_NOT_FOUND') throw error;
  process.stderr.write(`Copewright is not installed yet: run npm ci in ${fileURLToPath(root)}\n`);
  process.exit(2);
}

const { cli } = await import('./cli.ts');
await cli(process.argv.slice(2));
