import '../../core/words/furtherWords.ts';
import type { Standard } from '../../core/standards/standard.ts';

/** How the rules of each standard but the one of the first view are fetched, by its id. */
export const standardFolders: Readonly<Record<string, () => Promise<Standard>>> = {
  'csa-s16': async () => (await import('../../core/standards/csaS16/index.ts')).csaS16,
  'aisc-360-lrfd': async () => (await import('../../core/standards/aisc360/index.ts')).aisc360Lrfd,
  'aisc-360-asd': async () => (await import('../../core/standards/aisc360/index.ts')).aisc360Asd,
  'en-1993': async () => (await import('../../core/standards/en1993/index.ts')).en1993,
  'en-1993-uk': async () => (await import('../../core/standards/en1993/index.ts')).en1993Uk,
  'as-4100': async () => (await import('../../core/standards/as4100/index.ts')).as4100,
  'is-800': async () => (await import('../../core/standards/is800/index.ts')).is800,
};
