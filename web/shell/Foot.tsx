import { Sign } from '../ladder/Sign.tsx';
import { words } from '../state/bench.ts';
import { canKeep, keptAt } from '../state/keep.ts';
import { isOffline, isStored } from '../state/network.ts';

const legend = [
  ['holds', 'holds'],
  ['close', 'holds, close (0.95 to 1.00)'],
  ['fails', 'fails'],
  ['refer', 'refer'],
  ['incomplete', 'incomplete'],
] as const;

const clock = (at: Date): string =>
  `${String(at.getHours()).padStart(2, '0')}:${String(at.getMinutes()).padStart(2, '0')}`;

const network = (): string => {
  if (isOffline.value) return 'No network: all checks still work';
  return isStored.value ? 'All checks run without a network' : 'Checks run in this page';
};

const kept = (): string => {
  if (!canKeep.value) return 'This browser keeps nothing: save a file';
  return keptAt.value ? `Kept on this device ${clock(keptAt.value)}` : '';
};

/** Whether the work is kept, and whether there is a network. */
export const Standing = () => (
  <p class="standing">
    <span>{kept()}</span>
    <span class={isOffline.value ? 'offline' : undefined}>{network()}</span>
  </p>
);

/** The signs' legend, what is kept, and the cautions. */
export const Foot = () => (
  <footer class="foot">
    <ul class="legend" aria-label="Signs">
      {legend.map(([mark, text]) => (
        <li key={mark}>
          <Sign mark={mark} /> {text}
        </li>
      ))}
    </ul>
    <Standing />
    <p class="cautions">{words.value.cautions.join(' ')}</p>
  </footer>
);
