type Json = Record<string, unknown>;

const isPlain = (value: unknown): value is Json => typeof value === 'object' && value !== null && !Array.isArray(value);

/** The end with some of its fields changed, at any depth; `undefined` takes a field away, a section's own sizes replace its name. */
export const changed = (end: Json, change: Json): Json => {
  const result: Json = { ...end };
  for (const [key, value] of Object.entries(change)) {
    const before = result[key];
    if (value === undefined) delete result[key];
    else result[key] = isPlain(value) ? changed(isPlain(before) ? before : {}, value) : value;
  }
  return result;
};
