import { createHash } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import preact from '@preact/preset-vite';
import { defineConfig, type Plugin } from 'vite';

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));

/** What the page may load: its own files and nothing else; no code and no styles from text. */
const POLICY = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self'",
  "font-src 'self'",
  "img-src 'self' data:",
  "connect-src 'self'",
  "worker-src 'self'",
  "manifest-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
].join('; ');

const policy = (): Plugin => ({
  name: 'policy',
  apply: 'build',
  transformIndexHtml: () => [
    { tag: 'meta', attrs: { 'http-equiv': 'Content-Security-Policy', content: POLICY }, injectTo: 'head-prepend' },
  ],
});

/** Parts of the PDF writer that no sheet uses: they turn web pages into pictures. */
const UNUSED = ['html2canvas', 'canvg', 'dompurify'];

/** Fetches styles and further chunks ahead of a part that is loaded later; no part here has any. */
const PRELOAD = '\0vite/preload-helper.js';

/** The core's checks read every end, find its faults and say them; on the bench what does so comes after the first view. */
const comesLater = (id: string, importer = ''): boolean =>
  /\/(?:end\/(?:readEnd|geometryFaults|holeFaults)|words\/faults)\.ts$/.test(id) &&
  /\/core\/check\/(?:examineNumbers|resolver?)\.ts$/.test(importer);

/** Leaves the first two out of the build; the writer asks for the former only when such a page is given to it. */
const lean = (): Plugin => ({
  name: 'lean',
  apply: 'build',
  enforce: 'pre',
  resolveId: (id, importer) => {
    if (comesLater(id, importer)) return here('state/readEnd.ts');
    return UNUSED.includes(id) ? `\0unused:${id}` : null;
  },
  load: (id) => {
    if (id === PRELOAD) return 'export const __vitePreload = (load) => load();';
    return id.startsWith('\0unused:') ? 'export default undefined;' : null;
  },
});

/** Tells the service worker which files the build has, and names the version by what is in them. */
const stored = (): Plugin => ({
  name: 'stored',
  apply: 'build',
  enforce: 'post',
  generateBundle(_, bundle) {
    const worker = bundle['sw.js'];
    if (worker?.type !== 'chunk') throw new Error('The build has no service worker.');
    const hash = createHash('sha256');
    const files = Object.values(bundle).filter((one) => one !== worker);
    for (const one of files) hash.update(one.fileName).update(one.type === 'chunk' ? one.code : one.source);
    const names = files.map(({ fileName }) => `./${fileName}`).filter((name) => name !== './index.html');
    hash.update(worker.code);
    const version = hash.digest('hex').slice(0, 12);
    worker.code = `const FILES = ${JSON.stringify(names.sort())};\nconst VERSION = '${version}';\n${worker.code}`;
  },
});

export default defineConfig({
  root: here('.'),
  base: './',
  plugins: [lean(), preact(), policy(), stored()],
  build: {
    outDir: here('../dist/web'),
    emptyOutDir: true,
    target: 'es2022',
    assetsInlineLimit: 0,
    modulePreload: false,
    // Two files of styles: the page's, and that of what opens later (`style/laterPart.ts`).
    cssCodeSplit: false,
    rollupOptions: {
      input: { index: here('index.html'), sw: here('sw.ts') },
      output: {
        entryFileNames: ({ name }) => (name === 'sw' ? 'sw.js' : 'assets/[name]-[hash].js'),
        // All of the first view in one file: it packs tighter, and nothing waits for a second round.
        codeSplitting: { groups: [{ name: 'bench', tags: ['$initial'], test: (id) => !id.endsWith('/sw.ts') }] },
      },
    },
  },
});
