import { type Face, openFace } from './trueType.ts';

/** `wide` for words to be read first, `narrow` for tables, data and drawings. */
export type Family = 'wide' | 'narrow';

/** How a piece of text is set; there is no bold italic: symbols stay italic in a bold line. */
export interface Cut {
  readonly family: Family;
  readonly bold: boolean;
  readonly italic: boolean;
}

export type Faces = (cut: Cut) => Face;

const bytesOf = (base64: string): Uint8Array => Uint8Array.from(atob(base64), (one) => one.charCodeAt(0));

const load = async (): Promise<Faces> => {
  const [wide, wideItalic, wideBold, narrow, narrowItalic, narrowBold] = await Promise.all([
    import('./fonts/regular.ts').then((font) => openFace('Cw', bytesOf(font.regular))),
    import('./fonts/italic.ts').then((font) => openFace('Cw-Italic', bytesOf(font.italic))),
    import('./fonts/semibold.ts').then((font) => openFace('Cw-SemiBold', bytesOf(font.semibold))),
    import('./fonts/condensed.ts').then((font) => openFace('CwC', bytesOf(font.condensed))),
    import('./fonts/condensedItalic.ts').then((font) => openFace('CwC-Italic', bytesOf(font.condensedItalic))),
    import('./fonts/condensedSemibold.ts').then((font) => openFace('CwC-SemiBold', bytesOf(font.condensedSemibold))),
  ]);
  return ({ family, bold, italic }) => {
    if (family === 'wide') return italic ? wideItalic : bold ? wideBold : wide;
    return italic ? narrowItalic : bold ? narrowBold : narrow;
  };
};

let faces: Promise<Faces> | undefined;

/** The six faces, loaded at first use. */
export const loadFaces = (): Promise<Faces> => {
  faces ??= load();
  return faces;
};
