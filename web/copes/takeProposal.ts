import { adviceWordsFor } from '../../core/words/adviceWords.ts';
import { openLine } from '../order/goTo.ts';
import { page } from '../shell/address.ts';
import { region, timeline } from '../state/bench.ts';
import { refuse, tell } from '../state/notice.ts';
import { advance } from '../state/timeline.ts';
import { entryWith, proposal, takeable } from './proposal.ts';

const reasons = (): readonly string[] => {
  const it = proposal.value;
  if (!it)
    return [adviceWordsFor(region.value).faults['no-supporting-beam']!, 'Nor while the end has faults elsewhere.'];
  return 'advice' in it ? it.advice.faults.map(({ text }) => text) : it.sentences;
};

/** Puts the proposed copes in place of the end's, as one step; the line that they stand in opens, so that nobody takes what is not seen. */
export const takeProposal = (): void => {
  if (page.value !== 'bench') return;
  const advice = takeable.value;
  if (!advice) {
    refuse('No cut is proposed', reasons());
    return;
  }
  timeline.value = advance(timeline.value, entryWith(advice), () => 'Cut taken from the support');
  openLine.value = 'cut';
  tell('Cut taken from the support. Undo brings back what was there.');
};
