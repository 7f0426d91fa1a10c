/** The characters that the product writes. */

const range = (from, to) => Array.from({ length: to - from + 1 }, (_, i) => String.fromCodePoint(from + i)).join('');

/** ASCII and Latin-1. */
export const latin = range(0x20, 0x7e) + range(0xa0, 0xff);
/** Accented letters: seldom on a screen in English, so they load apart there. The slashed O also stands for a diameter. */
export const accented = (range(0xc0, 0xff) + range(0x100, 0x17f)).replace(/[×÷ØÆæß]/g, '');
/** Names of jobs and people in the languages of Latin Extended-A. */
export const latinExtended = range(0x100, 0x17f);
export const greek = range(0x391, 0x3a1) + range(0x3a3, 0x3a9) + range(0x3b1, 0x3c9);
/** Punctuation and signs that the faces bring along. */
export const punctuation = '–—‘’‚“”„…•‹›′″⁄−€™↑↓\u2009';
/** Signs that the script composes or draws. */
export const drawn = '≤≥≠≈√∑∆∞⌀→←✓□⁰⁴⁵⁶⁷⁸⁹₀₁₂₃₄₅₆₇₈₉⅛⅜⅝⅞\u2009\u200a\u202f';
