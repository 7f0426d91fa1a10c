import { otherTab } from './network.ts';

/** Tabs greet each other, answer, and say when they go. */
export const watchTabs = (): void => {
  if (typeof BroadcastChannel === 'undefined') return;
  const channel = new BroadcastChannel('copewright.bench');
  channel.onmessage = ({ data }: MessageEvent<string>) => {
    otherTab.value = data !== 'goes';
    if (data === 'comes' || data === 'goes') channel.postMessage('stays');
  };
  const greet = () => channel.postMessage('comes');
  greet();
  addEventListener('pageshow', greet);
  addEventListener('pagehide', () => channel.postMessage('goes'));
};
