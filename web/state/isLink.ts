/** Whether the part of an address behind its `#` is meant as the link of an end, whole or cut short. */
export const isLink = (hash: string): boolean => /^#\d+\./.test(hash);
