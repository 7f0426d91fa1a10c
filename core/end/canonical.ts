/** JSON with sorted keys and without blanks: the same end always gives the same text. Absent values are left out. */
export const canonicalJson = (value: unknown): string => {
  if (Array.isArray(value)) return `[${value.map((one) => canonicalJson(one ?? null)).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const entries = Object.entries(value)
      .filter(([, one]) => one !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
      .map(([key, one]) => `${JSON.stringify(key)}:${canonicalJson(one)}`);
    return `{${entries.join(',')}}`;
  }
  return JSON.stringify(value);
};
