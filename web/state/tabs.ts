import { signal } from '@preact/signals';

/** Another tab of this browser has the bench open: what is kept is that of the tab changed last. */
export const otherTab = signal(false);

/** Tabs greet each other, answer, and say when they go. */
export const watchTabs = (): void => {
  if (typeof BroadcastChannel === 'undefined') return;
  const channel = new BroadcastChannel('copewright.bench');
  channel.onmessage = ({ data }: MessageEvent<string>) => {
    otherTab.value = data !== 'goes';
    if (data === 'comes' || data === 'goes') channel.postMessage('stays');
  };
  addEventListener('pageshow', () => channel.postMessage('comes'));
  addEventListener('pagehide', () => channel.postMessage('goes'));
};
