import { effect } from '@preact/signals';
import { render } from 'preact';
import { watchPointer } from './field/afterPointer.ts';
import { figure } from './piece/figure.ts';
import { App } from './shell/App.tsx';
import { followAddress } from './shell/address.ts';
import { listenForKeys } from './shell/keys.ts';
import { awaited, entry, lastGood } from './state/bench.ts';
import { carried } from './state/carried.ts';
import { begin } from './state/edits.ts';
import { textOf } from './state/entry.ts';
import { isLink } from './state/isLink.ts';
import { readKept, startKeeping } from './state/keep.ts';
import { loadTheRest, tryAgain } from './state/later.ts';

/** After the piece stands, what the first view does without is fetched, ms. */
const ONCE_IT_STANDS = 500;
/** The page stays empty at most this long for what a kept end asks for, so that it is drawn once and as a whole, ms. */
const PATIENCE = 1000;

/** A link opens as a step on top of what was kept, and leaves the address, so that loading again does not open it twice. */
const openLink = async (): Promise<void> => {
  const { hash } = location;
  if (!isLink(hash)) return;
  history.replaceState(null, '', location.pathname + location.search);
  await carried((carry) => carry.openLink(hash.slice(1)));
};

const bringTheRest = async (): Promise<void> => {
  loadTheRest();
  try {
    const { attend } = await import('./shell/attend.ts');
    attend();
  } catch {
    addEventListener('online', () => void bringTheRest(), { once: true });
  }
};

const kept = readKept();
if (kept) begin(kept);
startKeeping();
effect(() => {
  document.title = `${textOf(entry.value, 'mark') || 'Bench'} – Copewright`;
});
listenForKeys();
watchPointer();
followAddress();
const known = new Promise<void>((done) => {
  effect(() => {
    if (awaited.value !== 'coming') done();
  });
  setTimeout(done, PATIENCE);
});
void known.then(() => render(<App />, document.getElementById('bench')!));
addEventListener('online', tryAgain);
addEventListener('hashchange', () => {
  followAddress();
  void openLink();
});
void openLink();
const waiting = effect(() => {
  // Of an end that is not complete yet there is no piece to wait for.
  if (figure.value === null && lastGood.value !== null) return;
  setTimeout(() => void bringTheRest(), ONCE_IT_STANDS);
  queueMicrotask(() => waiting());
});
