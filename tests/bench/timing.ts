/** One measured figure. `ceiling` leaves room of about three for a slow or busy machine; above it the run fails. */
export interface Figure {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly target: number;
  readonly ceiling: number;
  /** True where more is better, as with ratios. */
  readonly more?: boolean;
}

export interface Contestant {
  readonly name: string;
  /** One turn of the work; what it gives back is summed, so that nothing is optimised away. */
  readonly turn: () => number;
  readonly turns: number;
}

export interface Timed {
  readonly name: string;
  /** Microseconds a turn. */
  readonly median: number;
  readonly least: number;
  readonly sum: number;
}

const middle = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1]!;

/** Times contestants round by round, one after the other, after a warm-up. */
export const interleaved = (contestants: readonly Contestant[], rounds = 25): Timed[] => {
  const times = contestants.map(() => [] as number[]);
  const sums = contestants.map(() => 0);
  for (let round = -3; round < rounds; round += 1) {
    contestants.forEach(({ turn, turns }, at) => {
      let sum = 0;
      const start = performance.now();
      for (let i = 0; i < turns; i += 1) sum += turn();
      const each = ((performance.now() - start) * 1000) / turns;
      if (round >= 0) times[at]!.push(each);
      sums[at] = sum;
    });
  }
  return contestants.map(({ name }, at) => ({
    name,
    median: middle(times[at]!),
    least: Math.min(...times[at]!),
    sum: sums[at]!,
  }));
};
