/** Penalties of ISO/IEC 18004 for runs of one colour, blocks of 2 by 2, patterns like a finder, and each step off half dark. */
const RUN = 3;
const BLOCK = 3;
const FINDER = 40;
const BALANCE = 10;

/** True where a mask turns the module at x, y over. */
const rules: readonly ((x: number, y: number) => boolean)[] = [
  (x, y) => (x + y) % 2 === 0,
  (_, y) => y % 2 === 0,
  (x) => x % 3 === 0,
  (x, y) => (x + y) % 3 === 0,
  (x, y) => (Math.floor(x / 3) + Math.floor(y / 2)) % 2 === 0,
  (x, y) => ((x * y) % 2) + ((x * y) % 3) === 0,
  (x, y) => (((x * y) % 2) + ((x * y) % 3)) % 2 === 0,
  (x, y) => (((x + y) % 2) + ((x * y) % 3)) % 2 === 0,
];

/** All masks repeat after so many modules both ways; by the place in that period: bit m is 1 where mask m turns over. */
const PERIOD = 12;
const turns = Uint8Array.from({ length: PERIOD * PERIOD }, (_, i) =>
  rules.reduce((bits, rule, mask) => bits | (rule(i % PERIOD, Math.floor(i / PERIOD)) ? 1 << mask : 0), 0),
);

/** A code of level M with mask 0: its modules, true for dark, and which of them carry data. */
export interface Unmasked {
  readonly size: number;
  readonly dark: readonly (readonly boolean[])[];
  readonly isData: (x: number, y: number) => boolean;
}

/** The fifteen bits that tell level M and the mask, drawn twice. */
const drawFormat = (cells: Uint8Array, size: number, mask: number): void => {
  let rest = mask;
  for (let i = 0; i < 10; i += 1) rest = (rest << 1) ^ ((rest >>> 9) * 0x537);
  const bits = ((mask << 10) | rest) ^ 0x5412;
  const set = (x: number, y: number, i: number): void => {
    const at = y * size + x;
    cells[at] = (cells[at]! & ~(1 << mask)) | (((bits >>> i) & 1) << mask);
  };
  for (let i = 0; i < 15; i += 1) {
    // Row and column 6 hold the timing marks.
    if (i < 8) set(8, i < 6 ? i : i + 1, i);
    else set(i === 8 ? 7 : 14 - i, 8, i);
    if (i < 8) set(size - 1 - i, 8, i);
    else set(8, size - 15 + i, i);
  }
};

/** The modules row by row under all masks at once: bit m is the module under mask m, 1 for dark. */
const allMasked = ({ size, dark, isData }: Unmasked): Uint8Array => {
  const cells = new Uint8Array(size * size);
  for (let y = 0, at = 0; y < size; y += 1) {
    const row = dark[y]!;
    for (let x = 0; x < size; x += 1, at += 1) {
      const cell = row[x] ? 0xff : 0;
      const turn = turns[(y % PERIOD) * PERIOD + (x % PERIOD)]!;
      // Under mask 0 as it came.
      cells[at] = isData(x, y) ? cell ^ turn ^ (turn & 1 ? 0xff : 0) : cell;
    }
  }
  for (let mask = 0; mask < rules.length; mask += 1) drawFormat(cells, size, mask);
  return cells;
};

/** The eight bits of a byte in lanes of a byte each, four to a number: a row of a code is shorter than a lane can count. */
const spread = (bits: number): number =>
  (bits & 1) | ((bits & 2) << 7) | ((bits & 4) << 14) | (((bits & 8) << 21) >>> 0);
const low = Uint32Array.from({ length: 256 }, (_, byte) => spread(byte & 15));
const high = Uint32Array.from({ length: 256 }, (_, byte) => spread(byte >>> 4));

/** Adds what the lanes have counted to the sum of each mask. */
const addLanes = (sums: number[], lowLanes: number, highLanes: number): void => {
  for (let i = 0; i < 4; i += 1) {
    sums[i]! += (lowLanes >>> (8 * i)) & 255;
    sums[i + 4]! += (highLanes >>> (8 * i)) & 255;
  }
};

/** For blocks of one colour, and for how far the dark modules are from half of all; of each mask. */
const areaPenalties = (cells: Uint8Array, size: number): number[] => {
  const blocks = rules.map(() => 0);
  const darks = rules.map(() => 0);
  for (let y = 0; y < size; y += 1) {
    let [darkLow, darkHigh, blockLow, blockHigh] = [0, 0, 0, 0];
    for (let x = 0, at = y * size; x < size; x += 1, at += 1) {
      const a = cells[at]!;
      darkLow += low[a]!;
      darkHigh += high[a]!;
      if (x === 0 || y === 0) continue;
      const [b, c, d] = [cells[at - 1]!, cells[at - size]!, cells[at - size - 1]!];
      const alike = (a & b & c & d) | (~(a | b | c | d) & 255);
      blockLow += low[alike]!;
      blockHigh += high[alike]!;
    }
    addLanes(darks, darkLow, darkHigh);
    addLanes(blocks, blockLow, blockHigh);
  }
  const all = size * size;
  return blocks.map((count, mask) => {
    const steps = Math.ceil(Math.abs(20 * darks[mask]! - 10 * all) / all) - 1;
    return BLOCK * count + BALANCE * steps;
  });
};

/** A line of modules, every `step` from `from`. */
interface Line {
  readonly from: number;
  readonly step: number;
  readonly size: number;
}

/** Where each run of one colour of a line begins, light first, goes to `starts`, then its end; returns how many runs. */
const runsOf = (cells: Uint8Array, mask: number, { from, step, size }: Line, starts: Uint16Array): number => {
  let count = 1;
  let last = 0;
  // Written at every module and kept at those where the colour changes: no branch that a processor guesses wrong.
  for (let i = 0, at = from; i < size; i += 1, at += step) {
    const colour = (cells[at]! >>> mask) & 1;
    starts[count] = i;
    count += colour ^ last;
    last = colour;
  }
  starts[count] = size;
  starts[count + 1] = size;
  return last === 0 ? count : count + 1;
};

/** Long runs, and runs like 1 1 3 1 1 with light of 4 on one side; beyond the code all is light. */
const linePenalty = (starts: Uint16Array, count: number, size: number): number => {
  let sum = 0;
  for (let i = 0; i < count; i += 1) {
    const run = starts[i + 1]! - starts[i]!;
    if (run >= 5) sum += RUN + run - 5;
  }
  const run = (i: number): number => starts[i + 1]! - starts[i]!;
  // The middle of a finder is a dark run with two runs on each side, and light beyond.
  for (let i = 3; i + 3 < count; i += 2) {
    const n = run(i - 1);
    if (run(i) !== 3 * n || run(i + 1) !== n || run(i - 2) !== n || run(i + 2) !== n) continue;
    const before = run(i - 3) + (i === 3 ? size : 0);
    const after = run(i + 3) + (i + 4 === count ? size : 0);
    if (before >= 4 * n && after >= n) sum += FINDER;
    if (after >= 4 * n && before >= n) sum += FINDER;
  }
  return sum;
};

/** The same code with the mask of the least penalty, which readers take best; the first of several alike. */
export const bestMasked = (code: Unmasked): boolean[][] => {
  const { size } = code;
  const cells = allMasked(code);
  const starts = new Uint16Array(size + 3);
  const penalties = areaPenalties(cells, size).map((area, mask) => {
    let sum = area;
    for (let i = 0; i < size; i += 1) {
      sum += linePenalty(starts, runsOf(cells, mask, { from: i * size, step: 1, size }, starts), size);
      sum += linePenalty(starts, runsOf(cells, mask, { from: i, step: size, size }, starts), size);
    }
    return sum;
  });
  const best = penalties.indexOf(Math.min(...penalties));
  return code.dark.map((row, y) => row.map((_, x) => ((cells[y * size + x]! >>> best) & 1) === 1));
};
