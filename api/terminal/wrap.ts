/** Columns that everything printed fits in. */
export const WIDTH = 100;

/** A text that was given from outside, without the letters that steer a terminal. */
export const harmless = (text: string): string => text.replace(/\p{Cc}/gu, '·');

/** Letters of a text; every sign this program prints is one column wide. */
export const widthOf = (text: string): number => [...text].length;

const pieces = (word: string, width: number): string[] => {
  const letters = [...word];
  const found: string[] = [];
  for (let at = 0; at < letters.length; at += width) found.push(letters.slice(at, at + width).join(''));
  return found;
};

/** Breaks a text at its blanks into lines of at most `width` letters; a longer word is cut. */
export const wrap = (text: string, width: number): string[] => {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(/[ \n]+/).flatMap((one) => pieces(one, width))) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (widthOf(longer) <= width) line = longer;
    else {
      lines.push(line);
      line = word;
    }
  }
  return line === '' && lines.length > 0 ? lines : [...lines, line];
};

/** A text behind a lead, its further lines set in as far as its first. */
export const hanging = (lead: string, text: string, width = WIDTH): string[] => {
  const indent = ' '.repeat(widthOf(lead));
  return wrap(text, width - indent.length).map((line, at) => (at === 0 ? lead : indent) + line);
};
