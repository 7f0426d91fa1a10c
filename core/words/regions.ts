/** Whose trade words are spoken: cope, single plate, gage in North America; notch, fin plate, gauge elsewhere. */
export const regions = ['north-america', 'commonwealth'] as const;
export type Region = (typeof regions)[number];
