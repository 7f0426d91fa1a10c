declare module 'subset-font' {
  export default function subsetFont(
    font: Uint8Array,
    text: string | undefined,
    options: {
      readonly targetFormat: 'sfnt' | 'woff' | 'woff2';
      readonly keepAllGlyphs?: boolean;
      readonly preserveNameIds?: readonly number[];
    },
  ): Promise<Uint8Array>;
}
