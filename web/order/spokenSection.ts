/** A designation as it is read: signs of multiplication between the sizes, with room around them, on one line. */
export const spokenSection = (name: string): string =>
  name.replace(/(?<=\d)\s*[xX*×]\s*(?=\d)/g, '\u00a0×\u00a0').replace(/^([A-Za-z]+) (?=\d)/, '$1\u00a0');
