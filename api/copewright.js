#!/usr/bin/env node
// Plain JavaScript: it must be able to say what is missing before anything is installed.
import { fileURLToPath } from 'node:url';
import { programIsBuilt, root } from './setup.js';

const fromSources = async () => {
  const { register } = await import('tsx/esm/api');
  register({ tsconfig: fileURLToPath(new URL('../tsconfig.json', import.meta.url)) });
  return import('./cli.ts');
};

const load = async () => {
  try {
    return await (programIsBuilt() ? import('../dist/api/cli.js') : fromSources());
  } catch (error) {
    if (error?.code !== 'ERR_MODULE_NOT_FOUND') throw error;
    process.stderr.write(`Copewright is not installed yet: run npm ci in ${root}\n`);
    process.exit(2);
  }
};

const { cli } = await load();
await cli(process.argv.slice(2));
