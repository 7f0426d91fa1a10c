import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));

/** Layers from the ground up; a file may import from its own layer's folder and from layers before it. */
const layers: readonly (readonly string[])[] = [
  ['core/units', 'core/words'],
  ['core/formula'],
  ['core/shape', 'core/steel'],
  ['core/end'],
  ['core/standards'],
  ['core/joints'],
  ['core/check'],
  ['core/advice'],
  ['core/drawing', 'core/card'],
  ['core/sheet', 'core/exchange'],
  ['api', 'web'],
];

/** Packages that each part of core may lean on; api and web are free. */
const packages: Readonly<Record<string, readonly string[]>> = {
  'core/end': ['zod/mini'],
  'core/check': ['@noble/hashes/sha2.js', '@noble/hashes/utils.js'],
  'core/sheet': ['jspdf', 'uqr'],
  'core/exchange': ['fflate'],
};

const filesIn = (folder: string): string[] =>
  readdirSync(join(root, folder), { withFileTypes: true, recursive: true })
    .filter((one) => one.isFile() && /\.tsx?$/.test(one.name))
    .map((one) => relative(root, join(one.parentPath, one.name)).replaceAll('\\', '/'));

const importsOf = (file: string): string[] =>
  [...readFileSync(join(root, file), 'utf8').matchAll(/(?:from|import)\s*\(?\s*'([^']+)'/g)].map(([, name]) => name!);

const folderOf = (file: string): string =>
  file
    .split('/')
    .slice(0, file.startsWith('core/') ? 2 : 1)
    .join('/');
const levelOf = (file: string): number => layers.findIndex((folders) => folders.includes(folderOf(file)));
const target = (file: string, name: string): string => join(dirname(file), name).replaceAll('\\', '/');

const files = ['core', 'api', 'web'].flatMap(filesIn);

describe('imports run one way', () => {
  test('every folder has its layer', () => {
    expect(files.filter((file) => levelOf(file) < 0)).toEqual([]);
  });

  test('no file imports from a layer above its own, or from a neighbour folder of its layer except steel from shape', () => {
    const wrong: string[] = [];
    for (const file of files) {
      for (const name of importsOf(file).filter((one) => one.startsWith('.'))) {
        const to = target(file, name);
        if (!/\.tsx?$/.test(to)) continue;
        const sideways = levelOf(to) === levelOf(file) && folderOf(to) !== folderOf(file);
        const allowed = folderOf(file) === 'core/steel' && folderOf(to) === 'core/shape';
        if (levelOf(to) > levelOf(file) || (sideways && !allowed)) wrong.push(`${file} -> ${to}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  test('there is no cycle among files', () => {
    const edges = new Map(
      files.map((file) => [
        file,
        importsOf(file)
          .filter((n) => n.startsWith('.'))
          .map((n) => target(file, n)),
      ]),
    );
    const state = new Map<string, 'open' | 'done'>();
    const cycles: string[] = [];
    const visit = (file: string, trail: readonly string[]) => {
      if (state.get(file) === 'done') return;
      if (state.get(file) === 'open') {
        cycles.push([...trail.slice(trail.indexOf(file)), file].join(' -> '));
        return;
      }
      state.set(file, 'open');
      for (const to of edges.get(file) ?? []) visit(to, [...trail, file]);
      state.set(file, 'done');
    };
    for (const file of files) visit(file, []);
    expect(cycles).toEqual([]);
  });

  test('core leans on no package but those named, and never on Node or the page', () => {
    const wrong: string[] = [];
    for (const file of files.filter((one) => one.startsWith('core/'))) {
      for (const name of importsOf(file).filter((one) => !one.startsWith('.'))) {
        if (!(packages[folderOf(file)] ?? []).includes(name)) wrong.push(`${file} -> ${name}`);
      }
      const text = readFileSync(join(root, file), 'utf8').replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, '');
      if (/\b(document|globalThis|process|localStorage|navigator)\.|Date\.now|new Date\(\)|Math\.random/.test(text))
        wrong.push(`${file}: not pure`);
    }
    expect(wrong).toEqual([]);
  });

  test('shared code never asks which standard it serves', () => {
    const asked = files
      .filter((file) => /^core\/(formula|shape|steel|end|joints|check|advice|drawing|card)\//.test(file))
      .filter((file) =>
        /sans-10162|csa-s16|aisc-360|en-1993|as-4100|is-800/.test(readFileSync(join(root, file), 'utf8')),
      );
    expect(asked).toEqual([]);
  });
});

describe('the project says one version', () => {
  test('in package.json and on the sheet', async () => {
    const { VERSION } = await import('../../core/check/version.ts');
    expect(JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')).version).toBe(VERSION);
  });
});
