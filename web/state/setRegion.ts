import type { Region } from '../../core/words/regions.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import { entry, marketRegion, timeline, words } from './bench.ts';
import { withText } from './entry.ts';
import { advance } from './timeline.ts';

/** Speaks the trade words of a region; nothing is kept in the end where these are those of the standard's own market. */
export const setRegion = (wanted: Region): void => {
  const from = words.value.cope;
  const after = withText(entry.value, 'sheet.words', wanted === marketRegion.value ? '' : wanted);
  timeline.value = advance(timeline.value, after, () => `Words ${from} → ${wordsFor(wanted).cope}`);
};
