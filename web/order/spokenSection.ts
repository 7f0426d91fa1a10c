/** A designation as it is read: signs of multiplication between the sizes, with room around them. */
export const spokenSection = (name: string): string => name.replace(/(?<=\d)\s*[xX*×]\s*(?=\d)/g, ' × ');
