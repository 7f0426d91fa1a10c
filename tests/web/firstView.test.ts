import { fileURLToPath } from 'node:url';
import { brotliCompressSync } from 'node:zlib';
import { build, type Rollup } from 'vite';
import { afterAll, beforeAll, describe, expect, test, vi } from 'vitest';

type File = Rollup.OutputChunk | Rollup.OutputAsset;

const config = fileURLToPath(new URL('../../web/vite.config.ts', import.meta.url));
const files = new Map<string, File>();

beforeAll(async () => {
  // As it is built for people, not for tests.
  vi.stubEnv('NODE_ENV', 'production');
  const built = await build({ configFile: config, logLevel: 'silent', build: { write: false } });
  for (const file of (built as Rollup.RollupOutput).output) files.set(file.fileName, file);
}, 60_000);

afterAll(() => {
  vi.unstubAllEnvs();
});

const contentOf = (file: File): string | Uint8Array => (file.type === 'chunk' ? file.code : file.source);

/** Files that a page names, and those that they need before they run. */
const withImports = (names: readonly string[], seen = new Set<string>()): Set<string> => {
  for (const name of names) {
    if (seen.has(name)) continue;
    seen.add(name);
    const file = files.get(name);
    if (file?.type === 'chunk') withImports(file.imports, seen);
  }
  return seen;
};

/** What a browser fetches before the bench stands drawn: the page, its styles and its program; the faces come beside it. */
const firstView = (): File[] => {
  const page = String(contentOf(files.get('index.html')!));
  const named = [...page.matchAll(/(?:src|href)="\.\/(assets\/[^"]+\.(?:js|css))"/g)].map(([, name]) => name!);
  return [...withImports(['index.html', ...named])].map((name) => files.get(name)!);
};

describe('the first view of the bench', () => {
  test('comes in less than 80 kB as it is sent', () => {
    const sizes = firstView().map((file) => brotliCompressSync(contentOf(file)).length);
    expect(sizes.length).toBeGreaterThan(2);
    expect(sizes.reduce((sum, one) => sum + one, 0)).toBeLessThan(80_000);
  });

  test("holds everything that is drawn, and no part of what comes later: other standards and sections, the reader of ends, the order's fields, the writers of workings, links and PDF files", () => {
    const modules = firstView().flatMap((file) => (file.type === 'chunk' ? file.moduleIds : []));
    const holds = (part: string): boolean => modules.some((id) => id.includes(part));
    const standards = modules.flatMap((id) => /core\/standards\/(\w+)\//.exec(id)?.[1] ?? []);
    expect([...new Set(standards)].sort()).toEqual(['methods', 'sans10162']);
    for (const part of ['core/drawing/drawEnd.ts', 'web/ladder/Ladder.tsx', 'web/stress/Stress.tsx']) {
      expect([part, holds(part)]).toEqual([part, true]);
    }
    const others = [
      'core/standards/index.ts',
      'core/steel/findSection.ts',
      'core/steel/sections/',
      'core/end/readEnd.ts',
      'core/end/schema.ts',
      'core/words/faults.ts',
      'core/check/besideOf.ts',
      'core/advice/copeFromSupport.ts',
      'core/card/cardOf.ts',
      'web/state/proposals.ts',
      'web/order/lineFields.ts',
    ];
    for (const part of [
      ...others,
      'zod',
      'jspdf',
      'uqr',
      'fflate',
      'noble',
      'core/sheet/pdf.ts',
      'core/formula/working.ts',
    ]) {
      expect([part, holds(part)]).toEqual([part, false]);
    }
  });

  test('leaves nothing that checks ends of its own without what reads them', () => {
    const checking = /core\/(?:check\/examine|card\/cellOf|advice\/\w+)\.ts$/;
    const parts = [...files.values()].filter((file) => file.type === 'chunk' && file.isDynamicEntry);
    const modulesOf = (part: File): string[] =>
      [...withImports([part.fileName])].flatMap((name) => {
        const file = files.get(name);
        return file?.type === 'chunk' ? file.moduleIds : [];
      });
    const [readers, others] = [true, false].map((reads) =>
      parts.filter((part) => {
        const modules = modulesOf(part);
        return (
          modules.some((id) => checking.test(id)) && modules.some((id) => id.endsWith('web/state/reader.ts')) === reads
        );
      }),
    );
    expect(others!.map(({ fileName }) => fileName)).toEqual([]);
    expect(readers!.length).toBeGreaterThan(2);
  });
});
