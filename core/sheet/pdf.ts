import type { jsPDF } from 'jspdf';
import { contentOf } from './content.ts';
import { type CutFaces, cutFaces, type Used } from './cutFaces.ts';
import type { Mark } from './pen.ts';
import type { Face } from './trueType.ts';

/** What the file says of itself; no clock is read. */
export interface About {
  /** mm */
  readonly paper: readonly [width: number, height: number];
  readonly title: string;
  readonly subject: string;
  readonly keywords: string;
  readonly creator: string;
  /** yyyy-mm-dd, or absent. */
  readonly date?: string;
  /** Hex digits from which the file's identity is made. */
  readonly fingerprint: string;
}

const FONT = 'Cw';
const EPOCH = '20000101';

/** A date as PDF writes it; the years that the library accepts, else a constant. */
const stampOf = (date: string | undefined): string => {
  const digits = /^(20[0-2]\d|203[0-7]|19[7-9]\d)-(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/.test(date ?? '')
    ? date!.replaceAll('-', '')
    : EPOCH;
  return `D:${digits}000000+00'00'`;
};

const binaryOf = (bytes: Uint8Array): string => {
  let text = '';
  for (let from = 0; from < bytes.length; from += 4096)
    text += String.fromCharCode(...bytes.subarray(from, from + 4096));
  return text;
};

const BLANK = 32;

/** The characters that the pages write in each face; the first face has a blank too. */
const charactersOf = (pages: readonly (readonly Mark[])[]): Map<Face, Used> => {
  const used = new Map<Face, Used>();
  for (const page of pages) {
    for (const mark of page) {
      if (mark.kind !== 'text') continue;
      const { face, text } = mark;
      const characters = used.get(face) ?? new Uint8Array(face.codes);
      if (used.size === 0) characters[BLANK] = 1;
      used.set(face, characters);
      for (let i = 0; i < text.length; i += 1) characters[text.charCodeAt(i)] = 1;
    }
  }
  return used;
};

/** Fonts of the blank alone, as the library takes them: it reads each in full, and needs no more to tell what a font is. */
const blanks = new Map<Face, string>();

const blankOf = (face: Face): string => {
  const known = blanks.get(face);
  if (known !== undefined) return known;
  const used = new Uint8Array(face.codes);
  used[BLANK] = 1;
  const text = binaryOf(cutFaces(FONT, new Map([[face, used]])).file);
  blanks.set(face, text);
  return text;
};

/** What the library knows of a font, as far as this file tells it. */
interface FontData {
  toUnicode: Record<number, number>;
  readonly subset: { encode: () => Uint8Array };
  readonly Unicode: { widths: [first: number, widths: readonly number[]] };
}

/**
 * Puts the faces into the document as one font. The pages name its glyphs themselves, so the library is told how wide they are and what
 * they mean; the blank that it sets on the first page makes it keep the font. Returns the font's name on the pages.
 */
const embed = (doc: jsPDF, first: Face, cut: CutFaces): string => {
  doc.addFileToVFS(`${FONT}.ttf`, blankOf(first));
  doc.addFont(`${FONT}.ttf`, FONT, 'normal');
  doc.setFont(FONT, 'normal').text(' ', 25, 25);
  const font = doc.getFont();
  const data = font.metadata as FontData;
  // The file is cut already: as it is, it goes into the document.
  data.subset.encode = () => cut.file;
  data.Unicode.widths = [1, cut.widths];
  data.toUnicode = Object.fromEntries(cut.codes.map((code, i) => [i + 1, code]));
  return String(font.id);
};

/** The part of the library that takes drawing operators as they are. */
interface Raw {
  write(operators: string): void;
}

/** Writes the pages as a PDF. Same pages and same `about`: same bytes. */
export const writePdf = async (pages: readonly (readonly Mark[])[], about: About): Promise<Uint8Array> => {
  const { jsPDF } = await import('jspdf');
  const doc = new jsPDF({ unit: 'mm', format: [...about.paper], compress: true, putOnlyUsedFonts: true, precision: 2 });
  const { title, subject, keywords, creator } = about;
  doc.setProperties({ title, subject, keywords, creator });
  doc.setCreationDate(stampOf(about.date) as unknown as Date);
  doc.setFileId(about.fingerprint.padEnd(32, '0').slice(0, 32).toUpperCase());
  const used = charactersOf(pages);
  const [first] = used.keys();
  const cut = first ? cutFaces(FONT, used) : null;
  const font = first && cut ? embed(doc, first, cut) : '';
  pages.forEach((marks, i) => {
    if (i > 0) doc.addPage([...about.paper]);
    (doc.internal as unknown as Raw).write(contentOf(marks, about.paper[1], font, cut?.numbers ?? new Map()));
  });
  return new Uint8Array(doc.output('arraybuffer'));
};
