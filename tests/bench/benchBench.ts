import type { CDPSession } from 'playwright-core';
import { startBench } from '../browser/startBench.ts';
import type { Figure } from './timing.ts';

const ROUNDS = 9;
const KEYS = ['5', 'Backspace', '6', 'Backspace', '7', 'Backspace', '8', 'Backspace'];

/** Script time of the page so far, ms: own time of its thread, so that other work on the machine does not count. */
const scriptTime = async (session: CDPSession): Promise<number> => {
  const { metrics } = await session.send('Performance.getMetrics');
  return 1000 * metrics.find(({ name }) => name === 'ScriptDuration')!.value;
};

/**
 * What a keystroke in a size on the drawing costs, with a rung open: reading the text, checking the end, and writing drawing, order, ladder,
 * working and verdict into the page. Layout and paint are the browser's and come after it.
 */
export const benchBench = async (): Promise<Figure[]> => {
  const running = await startBench();
  try {
    const { context, tab } = await running.visit();
    const bench = await tab();
    await bench.rung('Bolt shear').click();
    await bench.page.getByRole('group', { name: /^Bolt shear/ }).waitFor();
    const session = await context.newCDPSession(bench.page);
    await session.send('Performance.enable', { timeDomain: 'threadTicks' });
    await bench.size('Pitch, mm').focus();
    await bench.press('End', '.');
    const times: number[] = [];
    for (let round = -4; round < ROUNDS; round += 1) {
      const before = await scriptTime(session);
      await bench.press(...KEYS);
      if (round >= 0) times.push(((await scriptTime(session)) - before) / KEYS.length);
    }
    const value = times.sort((a, b) => a - b)[ROUNDS >> 1]!;
    return [{ name: 'bench: script time of a keystroke, a rung open', value, unit: 'ms', target: 8, ceiling: 24 }];
  } finally {
    await running.stop();
  }
};
