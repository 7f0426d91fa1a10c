import { inflateSync } from 'node:zlib';
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

const MM = 25.4 / 72;

/** A piece of text as a reader of PDF finds it; mm from the upper left corner of the page, `y` of the base line, size in pt. */
export interface FoundText {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly size: number;
  readonly turned: boolean;
}

/** The texts of every page, as a reader that is not ours finds them. Blanks are left out. */
export const textsOf = async (pdf: Uint8Array): Promise<FoundText[][]> => {
  const task = getDocument({ data: pdf.slice(), verbosity: 0, useSystemFonts: false, disableFontFace: true });
  const document = await task.promise;
  const pages: FoundText[][] = [];
  for (let n = 1; n <= document.numPages; n += 1) {
    const page = await document.getPage(n);
    const height = page.view[3]!;
    const { items } = await page.getTextContent();
    const found: FoundText[] = [];
    for (const item of items) {
      if (!('str' in item) || !item.str.trim()) continue;
      const [a, b, , , x, y] = item.transform as [number, number, number, number, number, number];
      found.push({
        text: item.str,
        x: x * MM,
        y: (height - y) * MM,
        width: item.width * MM,
        size: Math.hypot(a, b),
        turned: Math.abs(b) > Math.abs(a),
      });
    }
    pages.push(found);
  }
  await task.destroy();
  return pages;
};

/** All text of a page in one line, in the order in which it was written. */
export const wholeText = (texts: readonly FoundText[]): string =>
  texts
    .map(({ text }) => text)
    .join(' ')
    .replace(/\s+/g, ' ');

/** mm from the upper left corner of the page. */
export interface FoundBox {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Room that a text takes: from a little above its lower-case letters' base to the height of its capitals. */
export const boxOf = ({ x, y, width, size, turned }: FoundText): FoundBox => {
  const up = 0.7 * size * MM;
  return turned
    ? { left: x - up, right: x, top: y - width, bottom: y }
    : { left: x, right: x + width, top: y - up, bottom: y };
};

/** A path as the page draws it. */
export interface FoundPath {
  readonly points: readonly { readonly x: number; readonly y: number }[];
  readonly curved: boolean;
  readonly filled: boolean;
  /** Line width, mm; of a filled path none is used. */
  readonly width: number;
}

/** The streams of drawing operators, one a page, unpacked. */
const contents = (pdf: Uint8Array): string[] => {
  const file = Buffer.from(pdf);
  const found: string[] = [];
  for (let at = file.indexOf('stream\n'); at >= 0; at = file.indexOf('stream\n', at + 1)) {
    if (file.toString('latin1', at - 3, at) === 'end') continue;
    const text = inflateSync(file.subarray(at + 7, file.indexOf('\nendstream', at))).toString('latin1');
    if (/^[\d.]+ w\b/.test(text)) found.push(text);
  }
  return found;
};

/** The paths of one page: reads the operators of lines, curves, widths and scale, and nothing else. */
export const pathsOf = (pdf: Uint8Array, page: number, height: number): FoundPath[] => {
  const found: FoundPath[] = [];
  let scale = 1;
  let width = 0;
  let open: { points: { x: number; y: number }[]; curved: boolean }[] = [];
  const numbers: number[] = [];
  const close = (filled: boolean): void => {
    for (const one of open) found.push({ ...one, filled, width });
    open = [];
  };
  const at = (x: number, y: number) => ({ x: x * scale * MM, y: height - y * scale * MM });
  for (const token of contents(pdf)
    [page]!.replace(/\((?:\\.|[^\\)])*\)|<[0-9a-f\s]*>|\[[^\]]*\]/gs, ' ')
    .split(/\s+/)) {
    const value = Number(token);
    if (token !== '' && Number.isFinite(value)) {
      numbers.push(value);
      continue;
    }
    const [a = 0, b = 0, , , e = 0, f = 0] = numbers;
    if (token === 'cm' && scale === 1) scale = a;
    if (token === 'w') width = a * scale * MM;
    if (token === 'm') open.push({ points: [at(a, b)], curved: false });
    if (token === 'l') open.at(-1)!.points.push(at(a, b));
    if (token === 'c') {
      open.at(-1)!.points.push(at(e, f));
      open.at(-1)!.curved = true;
    }
    if (token === 'S') close(false);
    if (token === 'f' || token === 'B') close(true);
    numbers.length = 0;
  }
  return found;
};
