import { afterEach, beforeEach, expect, vi } from 'vitest';

/** A test that writes to the console fails: noise hides the one line that matters. */
const channels = ['log', 'info', 'warn', 'error', 'debug'] as const;

beforeEach(() => {
  for (const channel of channels) vi.spyOn(console, channel);
});

afterEach(() => {
  for (const channel of channels) expect(vi.mocked(console[channel]).mock.calls, `console.${channel}`).toEqual([]);
  vi.restoreAllMocks();
});
