import { readFileSync } from 'node:fs';
import { sheetTurn } from './sheetTurn.ts';

// Run in a process of its own: how long the first sheet takes, and how many bytes it has.
const end = JSON.parse(readFileSync(process.argv[2]!, 'utf8')) as unknown;
const start = performance.now();
const bytes = await sheetTurn(end);
process.stdout.write(`${performance.now() - start} ${bytes.length}\n`);
