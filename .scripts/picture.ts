/**
 * Takes the README's pictures from the running bench: `.pictures/bench.png`, the demo end with one rung open, and with pdftoppm at hand
 * `.pictures/sheet.png`, the first page of its sheet. Needs the built bench (`npm run build`) and a browser.
 */
import { spawnSync } from 'node:child_process';
import { mkdirSync, writeFileSync } from 'node:fs';
import type { Bench } from '../tests/browser/bench.ts';
import { startBench } from '../tests/browser/startBench.ts';

const pictures = new URL('../.pictures/', import.meta.url);
/** A README is read over slow lines too, bytes. */
const MOST = 330_000;
const RESOLUTION = '96';
/** A window that shows the piece and the whole ladder with a working open, px. */
const WINDOW = { width: 1440, height: 1040 };

const keep = (name: string, bytes: Uint8Array): void => {
  if (bytes.length > MOST) throw new Error(`${name} has ${bytes.length} bytes, more than ${MOST}`);
  writeFileSync(new URL(name, pictures), bytes);
  process.stdout.write(`${name}: ${Math.ceil(bytes.length / 1000)} kB\n`);
};

const benchPicture = async (bench: Bench): Promise<Uint8Array> => {
  const { page } = bench;
  await page.getByText('All checks run without a network').waitFor();
  await bench.rung('Block tearing, web').click();
  await page.getByRole('group', { name: /^Block tearing, web/ }).waitFor();
  await page.evaluate(() => {
    (document.activeElement as HTMLElement | null)?.blur();
    return document.fonts.ready.then(() => true);
  });
  return page.screenshot({ animations: 'disabled' });
};

/** First page of a PDF as a picture; undefined where this machine has no pdftoppm. */
const firstPage = (pdf: Uint8Array): Uint8Array | undefined => {
  const drawn = spawnSync('pdftoppm', ['-png', '-r', RESOLUTION, '-f', '1', '-l', '1', '-'], {
    input: pdf,
    maxBuffer: 64 * 1024 * 1024,
  });
  return drawn.status === 0 ? drawn.stdout : undefined;
};

const running = await startBench();
try {
  mkdirSync(pictures, { recursive: true });
  const { faults, tab } = await running.visit({ viewport: WINDOW });
  const bench = await tab();
  const { bytes } = await bench.sheet();
  await bench.page.reload();
  await bench.drawing.waitFor();
  keep('bench.png', await benchPicture(bench));
  const sheet = firstPage(bytes);
  if (sheet) keep('sheet.png', sheet);
  else process.stdout.write('sheet.png is left as it is: there is no pdftoppm on this machine\n');
  if (faults.length > 0) throw new Error(faults.join('\n'));
} finally {
  await running.stop();
}
