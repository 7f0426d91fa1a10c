import type { Pen, SetRun, TextStyle } from './pen.ts';

/** Text broken into lines of a given width. */
export type Lines = readonly (readonly SetRun[])[];

type Fragment = SetRun;

/** Words with what joins them: a space belongs to the run that it stood in. */
const wordsOf = (runs: readonly SetRun[]): Fragment[][] => {
  const words: Fragment[][] = [[]];
  for (const run of runs) {
    run.text.split(' ').forEach((text, i) => {
      if (i > 0) words.push([]);
      if (text) words.at(-1)!.push({ ...run, text });
    });
  }
  return words.filter((word) => word.length > 0);
};

const space: SetRun = { text: ' ', italic: false, sub: false };

/** A word wider than the line, cut where the line ends. */
const cutWord = (pen: Pen, word: readonly Fragment[], style: TextStyle, width: number): Fragment[][] => {
  const parts: Fragment[][] = [[]];
  let taken = 0;
  for (const fragment of word) {
    for (const text of fragment.text) {
      const one = { ...fragment, text };
      const w = pen.width([one], style);
      if (taken + w > width && taken > 0) {
        parts.push([]);
        taken = 0;
      }
      parts.at(-1)!.push(one);
      taken += w;
    }
  }
  return parts;
};

/** Breaks runs into lines at spaces. */
export const wrap = (pen: Pen, runs: readonly SetRun[], style: TextStyle, width: number): SetRun[][] => {
  const lines: SetRun[][] = [];
  let line: SetRun[] = [];
  let taken = 0;
  const gap = pen.width([space], style);
  for (const whole of wordsOf(runs)) {
    const fits = pen.width(whole, style) <= width;
    for (const word of fits ? [whole] : cutWord(pen, whole, style, width)) {
      const w = pen.width(word, style);
      if (line.length > 0 && taken + gap + w > width) {
        lines.push(line);
        line = [];
        taken = 0;
      }
      if (line.length > 0) {
        line.push(spaceLike(word[0]!));
        taken += gap;
      }
      line.push(...word);
      taken += w;
    }
  }
  if (line.length > 0) lines.push(line);
  return lines.map(joined);
};

const spaceLike = ({ bold }: SetRun): SetRun => (bold === undefined ? space : { ...space, bold });

const joined = (line: readonly SetRun[]): SetRun[] => {
  const out: SetRun[] = [];
  for (const run of line) {
    const last = out.at(-1);
    const alike = last && !last.italic && !run.italic && last.sub === run.sub && last.sup === run.sup;
    if (alike && last.bold === run.bold) out[out.length - 1] = { ...last, text: last.text + run.text };
    else out.push(run);
  }
  return out;
};

/** Keeps the first lines; where more are left out, the last one ends in an ellipsis. */
export const atMostLines = (pen: Pen, lines: Lines, count: number, style: TextStyle, width: number): Lines => {
  if (lines.length <= count) return lines;
  const kept = lines.slice(0, count);
  return [...kept.slice(0, -1), shortened(pen, kept.at(-1)!, style, width)];
};

/** A line with an ellipsis, cut so that it fits. */
const shortened = (pen: Pen, line: readonly SetRun[], style: TextStyle, width: number): readonly SetRun[] => {
  const ellipsis = { ...plainRun('…') };
  let cut = [...line];
  while (cut.length > 0 && pen.width([...cut, ellipsis], style) > width) {
    const last = cut.at(-1)!;
    const text = [...last.text].slice(0, -1).join('');
    cut = [...cut.slice(0, -1), ...(text ? [{ ...last, text }] : [])];
  }
  return [...cut, ellipsis];
};

export const plainRun = (text: string, bold?: boolean): SetRun => ({
  text,
  italic: false,
  sub: false,
  ...(bold !== undefined && { bold }),
});

/** Sets lines from the base line of the first downward, `leading` mm apart. */
export const setLines = (pen: Pen, x: number, y: number, lines: Lines, style: TextStyle, leading: number): void => {
  lines.forEach((line, i) => {
    pen.text(x, y + i * leading, line, style);
  });
};

/** One line cut to a width. */
export const oneLine = (pen: Pen, text: string, style: TextStyle, width: number): readonly SetRun[] => {
  const line = [plainRun(text)];
  return pen.width(line, style) <= width ? line : shortened(pen, line, style, width);
};
