import { read, standardAddress } from '../standards/openStandard.ts';
import { entry } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';

/** The pages, and which of them is shown. */
export const Pages = () => {
  const open = read.value;
  return (
    <nav aria-label="Pages">
      <a href="#bench" aria-current={open ? undefined : 'page'}>
        Bench
      </a>
      <a href={standardAddress(open?.id ?? textOf(entry.value, 'standard'))} aria-current={open ? 'page' : undefined}>
        Standards
      </a>
    </nav>
  );
};
