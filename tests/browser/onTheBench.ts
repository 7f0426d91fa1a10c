import type { BrowserContextOptions } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect } from 'vitest';
import { type RunningBench, startBench, type Visit } from './startBench.ts';

export interface Visits {
  readonly site: () => string;
  readonly visit: (options?: BrowserContextOptions) => Promise<Visit>;
  readonly stopServing: () => Promise<void>;
}

/** Serves the bench and starts a browser for the tests of a file. Every visit ends with its test, which fails by whatever no visit may bring. */
export const onTheBench = (): Visits => {
  let running: RunningBench | undefined;
  const visits: Visit[] = [];
  const bench = (): RunningBench => {
    if (!running) throw new Error('the bench is not served yet');
    return running;
  };
  beforeAll(async () => {
    running = await startBench();
  });
  afterEach(async () => {
    const all = visits.splice(0);
    await Promise.all(all.map(({ context }) => context.close()));
    expect(all.flatMap(({ faults }) => faults)).toEqual([]);
  });
  afterAll(() => running?.stop());
  return {
    site: () => bench().site,
    visit: async (options) => {
      const visit = await bench().visit(options);
      visits.push(visit);
      return visit;
    },
    stopServing: () => bench().stopServing(),
  };
};
