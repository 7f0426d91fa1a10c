/** Sentences of the verdict, with names and amounts in their places. The same in every region. */
export const verdictWords = {
  verdict: { holds: 'HOLDS', fails: 'FAILS', refer: 'REFER' },
  incomplete: 'INCOMPLETE',
  weakest: 'Weakest: ',
  failsAt: (title: string, reaction: string): string => `${title}, fails at ${reaction}`,
  toSpare: 'to spare',
  short: 'short',
  fails: (titles: string): string => `Fails: ${titles}.`,
  alsoFails: (titles: string): string => `Also fails: ${titles}.`,
  refers: (titles: string): string => `Refers: ${titles}.`,
  because: (titles: string, reason: string): string => (reason ? `${titles} (${reason})` : titles),
  checks: (count: number): string => `${count} checks`,
  more: (count: number): string => `And ${count} more.`,
  noNumber: 'no number by this method',
} as const;
