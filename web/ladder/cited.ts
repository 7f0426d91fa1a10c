/** A clause as it is cited: numbered clauses with `cl.`, methods by their name. */
export const cited = (clause: string): string => (/^[A-Z]{0,2}\d/.test(clause) ? `cl. ${clause}` : clause);
