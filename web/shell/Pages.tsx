import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import { CARD, PROOF, page, standardAddress } from './address.ts';

const current = (is: boolean): 'page' | undefined => (is ? 'page' : undefined);

/** The pages, and which of them is shown. */
export const Pages = () => {
  const open = page.value;
  const standard = typeof open === 'object' ? open.standard : textOf(entry.value, 'standard');
  return (
    <nav aria-label="Pages">
      <a href="#bench" aria-current={current(open === 'bench')}>
        Bench
      </a>
      <a href={CARD} aria-current={current(open === 'card')}>
        Card
      </a>
      <a href={standardAddress(standard)} aria-current={current(typeof open === 'object')}>
        Standards
      </a>
      <a href={PROOF} aria-current={current(open === 'proof')}>
        Proof
      </a>
    </nav>
  );
};
