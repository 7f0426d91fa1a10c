import { type Face, openFace } from './trueType.ts';

/** `wide` for mark and verdict, always bold; `narrow` for all else. */
export type Family = 'wide' | 'narrow';

/** How a piece of text is set; there is no bold italic: symbols stay italic in a bold line. */
export interface Cut {
  readonly family: Family;
  readonly bold: boolean;
  readonly italic: boolean;
}

export type Faces = (cut: Cut) => Face;

const bytesOf = (base64: string): Uint8Array => {
  const text = atob(base64);
  const bytes = new Uint8Array(text.length);
  for (let i = 0; i < bytes.length; i += 1) bytes[i] = text.charCodeAt(i);
  return bytes;
};

const load = async (): Promise<Faces> => {
  const [wide, narrow, narrowItalic, narrowBold] = await Promise.all([
    import('./fonts/semibold.ts').then((font) => openFace('Cw-SemiBold', bytesOf(font.semibold))),
    import('./fonts/condensed.ts').then((font) => openFace('CwC', bytesOf(font.condensed))),
    import('./fonts/condensedItalic.ts').then((font) => openFace('CwC-Italic', bytesOf(font.condensedItalic))),
    import('./fonts/condensedSemibold.ts').then((font) => openFace('CwC-SemiBold', bytesOf(font.condensedSemibold))),
  ]);
  return ({ family, bold, italic }) => {
    if (family === 'wide') return wide;
    return italic ? narrowItalic : bold ? narrowBold : narrow;
  };
};

let faces: Promise<Faces> | undefined;

/** The four faces, loaded at first use. */
export const loadFaces = (): Promise<Faces> => {
  faces ??= load();
  return faces;
};
