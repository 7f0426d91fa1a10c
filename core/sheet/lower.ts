/** A title as it stands within a sentence. */
export const lower = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
