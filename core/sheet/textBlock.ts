import type { Pen, SetRun, TextStyle } from './pen.ts';

/** Text broken into lines of a given width. */
export type Lines = readonly (readonly SetRun[])[];

const space: SetRun = { text: ' ', italic: false, sub: false };

/** A run of a line that still grows. */
type Open = { -readonly [key in keyof SetRun]: SetRun[key] };

/** Pieces that no blank parts, and their width, mm. */
interface Word {
  readonly pieces: readonly SetRun[];
  readonly width: number;
}

/** A word wider than the line, cut where the line ends. */
const cutWord = (pen: Pen, word: Word, style: TextStyle, most: number): Word[] => {
  const parts: { pieces: SetRun[]; width: number }[] = [{ pieces: [], width: 0 }];
  for (const piece of word.pieces) {
    for (const text of piece.text) {
      const one = { ...piece, text };
      const width = pen.width([one], style);
      if (parts.at(-1)!.width + width > most && parts.at(-1)!.width > 0) parts.push({ pieces: [], width: 0 });
      const part = parts.at(-1)!;
      part.pieces.push(one);
      part.width += width;
    }
  }
  return parts;
};

/** Words between the blanks. */
const wordsOf = (pen: Pen, runs: readonly SetRun[], style: TextStyle): Word[] => {
  const words: Word[] = [];
  let pieces: SetRun[] = [];
  const close = (): void => {
    if (pieces.length > 0) words.push({ pieces, width: pen.width(pieces, style) });
    pieces = [];
  };
  for (const run of runs) {
    const { text } = run;
    let from = 0;
    for (let to = text.indexOf(' '); to >= 0; to = text.indexOf(' ', from)) {
      if (to > from) pieces.push({ ...run, text: text.slice(from, to) });
      close();
      from = to + 1;
    }
    if (from < text.length) pieces.push(from === 0 ? run : { ...run, text: text.slice(from) });
  }
  close();
  return words;
};

/** Puts a run at the end of a line; upright runs set alike become one. */
const append = (line: Open[], run: SetRun): void => {
  const last = line.at(-1);
  const alike = last && !last.italic && !run.italic && last.sub === run.sub && last.sup === run.sup;
  if (alike && last.bold === run.bold) last.text += run.text;
  else line.push({ ...run });
};

const spaceLike = ({ bold }: SetRun): SetRun => (bold === undefined ? space : { ...space, bold });

/** Breaks runs into lines at spaces. */
export const wrap = (pen: Pen, runs: readonly SetRun[], style: TextStyle, width: number): SetRun[][] => {
  const lines: Open[][] = [];
  const gap = pen.width([space], style);
  let taken = Number.POSITIVE_INFINITY;
  for (const whole of wordsOf(pen, runs, style)) {
    for (const word of whole.width <= width ? [whole] : cutWord(pen, whole, style, width)) {
      if (taken + gap + word.width > width) {
        lines.push([]);
        taken = 0;
      } else {
        append(lines.at(-1)!, spaceLike(word.pieces[0]!));
        taken += gap;
      }
      const line = lines.at(-1)!;
      for (const piece of word.pieces) append(line, piece);
      taken += word.width;
    }
  }
  return lines;
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
