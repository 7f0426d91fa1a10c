/** The state of a check as it follows the check's name. The same in every region. */
export const stateWords = {
  holds: 'holds',
  fails: 'fails',
  refer: 'refers',
  information: 'for information',
  notApplicable: 'not applicable',
} as const;
