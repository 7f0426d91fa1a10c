import { mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));

/** Where a script of this folder lies in the form in which the program ships: bundled, not transpiled on the way. */
export type Script = (name: string) => string;

/** Builds scripts of this folder for as long as `use` takes. As far below the project's top as they were, so that they find its files. */
export const shipped = async (names: readonly string[], use: (script: Script) => Promise<void>): Promise<void> => {
  const outDir = mkdtempSync(here('../../node_modules/.bench-'));
  try {
    await build({
      configFile: false,
      logLevel: 'silent',
      build: {
        ssr: true,
        outDir,
        emptyOutDir: true,
        target: 'node20.19',
        rollupOptions: {
          input: names.map((name) => here(`./${name}.ts`)),
          output: { entryFileNames: '[name].js', chunkFileNames: '[name]-[hash].js' },
        },
      },
    });
    await use((name) => join(outDir, `${name}.js`));
  } finally {
    rmSync(outDir, { recursive: true, force: true });
  }
};
