/** What a route takes after the question mark: for each name the values that it may have. */
export type QuerySpec = Readonly<Record<string, readonly string[]>>;

export type Query = Readonly<Record<string, string>>;

/** Reads the query of an address: a value for each name that is given, or the sentence that says what is not known. */
export const readQuery = (url: string, spec: QuerySpec): { readonly query: Query } | { readonly unknown: string } => {
  const at = url.indexOf('?');
  const query: Record<string, string> = {};
  if (at < 0) return { query };
  for (const [name, value] of new URLSearchParams(url.slice(at))) {
    const values = Object.hasOwn(spec, name) ? spec[name] : undefined;
    if (!values) {
      const known = Object.keys(spec).join(', ') || 'nothing';
      return { unknown: `This address takes no ${name.slice(0, 40)}; it takes ${known}.` };
    }
    if (!values.includes(value)) {
      return { unknown: `${name} cannot be ${value.slice(0, 40)}; it may be ${values.join(', ')}.` };
    }
    query[name] = value;
  }
  return { query };
};
