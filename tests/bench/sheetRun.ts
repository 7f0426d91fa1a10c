import { readFileSync } from 'node:fs';
import { sheetTurn } from './sheetTurn.ts';

// Run in a process of its own, with the file of an end and how many sheets to print of it, each with a reaction of its own. Says when the
// first was there, ms after the process was started, how long each of the later ones took, ms, and how many bytes the first has.
const [, , file, count] = process.argv;
const end = JSON.parse(readFileSync(file!, 'utf8')) as object;
const { length: bytes } = await sheetTurn(end);
const first = performance.now();
const later: number[] = [];
for (let i = 1; i < Number(count); i += 1) {
  const start = performance.now();
  await sheetTurn({ ...end, reaction: 120 + i / 4 });
  later.push(performance.now() - start);
}
process.stdout.write(JSON.stringify({ first, later, bytes }));
