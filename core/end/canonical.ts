/** Signs that JSON writes as they are. */
const plain = /^[ !#-[\]-~]*$/;

const quoted = (text: string): string => (plain.test(text) ? `"${text}"` : JSON.stringify(text));

/** JSON with sorted keys and without blanks: the same end always gives the same text. Absent values are left out. */
export const canonicalJson = (value: unknown): string => {
  if (typeof value === 'string') return quoted(value);
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  if (Array.isArray(value)) return `[${value.map((one) => canonicalJson(one ?? null)).join(',')}]`;
  let text = '';
  for (const key of Object.keys(value).sort()) {
    const one = (value as Readonly<Record<string, unknown>>)[key];
    if (one !== undefined) text += `${text && ','}${quoted(key)}:${canonicalJson(one)}`;
  }
  return `{${text}}`;
};
