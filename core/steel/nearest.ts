/** A name that is not known, with the known ones that come closest to it. */
export interface Unknown {
  readonly nearest: readonly string[];
}

/**
 * The `count` known names closest to a word, closest first.
 *
 * Letters are compared by the edits that turn one into the other; numbers, in their order, by the lesser of their relative difference
 * (the next size) and the share of digits to change (a slip of the finger). A word without letters is compared by its numbers alone,
 * a word with neither has no neighbours.
 */
export const nearest = (word: string, known: readonly string[], count: number): string[] => {
  const wanted = parts(word.slice(0, 40));
  if (wanted.letters === '' && wanted.numbers.length === 0) return [];
  return partsOf(known)
    .map((it, i) => ({ name: known[i]!, distance: distance(wanted, it) }))
    .sort((a, b) => a.distance - b.distance)
    .slice(0, count)
    .map(({ name }) => name);
};

interface Parts {
  readonly letters: string;
  readonly numbers: readonly { readonly digits: string; readonly value: number }[];
}

const parts = (name: string): Parts => {
  const tokens = name.toUpperCase().match(/[A-Z]+|\d+(?:\.\d+)?(?:\/\d+)?/g) ?? [];
  return {
    letters: tokens.filter((it) => it !== 'X' && it >= 'A').join(''),
    numbers: tokens.filter((it) => it < 'A').map((digits) => ({ digits, value: worth(digits) })),
  };
};

const worth = (digits: string): number => {
  const [over, under] = digits.split('/').map(Number);
  return under ? over! / under : over!;
};

/** The lists of known names never change: each is taken apart once. */
const partsOf = (known: readonly string[]): readonly Parts[] => {
  const seen = taken.get(known);
  if (seen !== undefined) return seen;
  const all = known.map(parts);
  taken.set(known, all);
  return all;
};

const taken = new WeakMap<readonly string[], readonly Parts[]>();

const distance = (word: Parts, name: Parts): number => {
  const shared = Math.min(word.numbers.length, name.numbers.length);
  let sum = 1.4 * Math.abs(word.numbers.length - name.numbers.length);
  if (word.letters !== '') sum += edits(word.letters, name.letters);
  for (let i = 0; i < shared; i++) {
    const [one, other] = [word.numbers[i]!, name.numbers[i]!];
    if (one.digits === other.digits) continue;
    const larger = Math.max(one.value, other.value);
    const gap = larger > 0 ? Math.abs(one.value - other.value) / larger : 0;
    const digits = Math.max(one.digits.length, other.digits.length);
    sum += 4 * (gap * digits <= 1 ? gap : Math.min(gap, edits(one.digits, other.digits) / digits));
  }
  return sum;
};

/** Letters to add, drop or change to turn one word into the other. */
const edits = (a: string, b: string): number => {
  if (a === b) return 0;
  const row: number[] = [];
  for (let j = 0; j < b.length; j++) row.push(j + 1);
  for (let i = 0; i < a.length; i++) {
    let [left, diagonal] = [i + 1, i];
    for (let j = 0; j < b.length; j++) {
      const change = diagonal + (a[i] === b[j] ? 0 : 1);
      diagonal = row[j]!;
      left = Math.min(change, diagonal + 1, left + 1);
      row[j] = left;
    }
  }
  return row.at(-1) ?? a.length;
};
