/** A piece of a line set in one way: italic for symbols, `sub` lowered and small, `sup` raised and small. */
export interface Run {
  readonly text: string;
  readonly italic: boolean;
  readonly sub: boolean;
  readonly sup?: boolean;
}

/**
 * In a formula every letter that stands alone is a symbol. In prose only a letter with a subscript, a Greek letter, and a Latin letter alone that is
 * neither a word (a, A, I) nor a unit.
 */
export type Manner = 'formula' | 'prose';

const GREEK = 'Α-ΡΣ-Ωα-ω';
const LETTERS = `A-Za-z${GREEK}`;
/** Letters, primes, then a subscript whose parts a comma may join: d′, A_gv, V_eff,Rd, γ_M0; or an exponent that is no whole number: ^1.5. */
const token = new RegExp(
  `([${LETTERS}]+)(′*)(?:_([${LETTERS}0-9]+(?:,[${LETTERS}0-9]+)*))?|\\^([0-9.,/]+|\\([^)]*\\))`,
  'g',
);
const greekFirst = new RegExp(`^([${GREEK}]+)([A-Za-z])$`);
const startsGreek = new RegExp(`^[${GREEK}]`);

/** Words that are one letter long, and units. */
const noSymbol = new Set(['a', 'A', 'I', 'N', 'm']);

const upright = (text: string): Run => ({ text, italic: false, sub: false });
const symbol = (text: string): Run => ({ text, italic: true, sub: false });

/** A symbol's letters: a factor in Greek before a Latin letter is a symbol of its own, so that φR_n reads φ R_n. */
const lettersOf = (letters: string, subscript: boolean, manner: Manner, inWord: boolean): Run[] => {
  const pair = greekFirst.exec(letters);
  if (pair) return [symbol(pair[1]!), symbol(pair[2]!)];
  if (subscript) return [symbol(letters)];
  if (letters.length > 1) return [startsGreek.test(letters) ? symbol(letters) : upright(letters)];
  if (startsGreek.test(letters)) return [symbol(letters)];
  const word = manner === 'prose' && (noSymbol.has(letters) || inWord);
  return [word ? upright(letters) : symbol(letters)];
};

/** Joins runs that are set alike. */
const joined = (runs: readonly Run[]): Run[] => {
  const out: Run[] = [];
  for (const run of runs) {
    const last = out.at(-1);
    if (last && last.italic === run.italic && last.sub === run.sub && last.sup === run.sup) {
      out[out.length - 1] = { ...last, text: last.text + run.text };
    } else if (run.text) out.push(run);
  }
  return out;
};

/** Sets a plain line of symbols, such as `φ_b A_b f_ub ≤ √(d′² + h²)`, in runs. The texts of the runs joined, with _ and ^ put back, are the line. */
export const richText = (line: string, manner: Manner = 'formula'): Run[] => {
  const runs: Run[] = [];
  let from = 0;
  for (const found of line.matchAll(token)) {
    const [whole, letters, primes, subscript, exponent] = found;
    const between = line.slice(from, found.index);
    from = found.index + whole.length;
    if (between) runs.push(upright(between));
    if (exponent !== undefined) {
      runs.push({ ...upright(exponent), sup: true });
      continue;
    }
    // A letter that touches a digit, a hyphen or an apostrophe is part of a name: M20, S355, I-beam.
    const inWord = /[0-9.’'-]$/.test(between) || /^[0-9’'-]/.test(line.slice(from));
    runs.push(...lettersOf(letters!, subscript !== undefined, manner, inWord));
    if (primes) runs.push(upright(primes));
    if (subscript !== undefined) runs.push({ ...upright(subscript), sub: true });
  }
  if (from < line.length) runs.push(upright(line.slice(from)));
  return joined(runs);
};
