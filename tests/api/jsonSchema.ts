/** The part of JSON Schema 2020-12 in which the API is described. */
export interface JsonSchema {
  readonly title?: string;
  readonly description?: string;
  readonly $ref?: string;
  readonly type?: string | readonly string[];
  readonly enum?: readonly unknown[];
  readonly const?: unknown;
  readonly anyOf?: readonly JsonSchema[];
  readonly oneOf?: readonly JsonSchema[];
  readonly properties?: Readonly<Record<string, JsonSchema>>;
  readonly required?: readonly string[];
  readonly additionalProperties?: boolean | JsonSchema;
  readonly propertyNames?: JsonSchema;
  readonly items?: boolean | JsonSchema;
  readonly prefixItems?: readonly JsonSchema[];
  readonly minItems?: number;
  readonly maxItems?: number;
  readonly minLength?: number;
  readonly maxLength?: number;
  readonly pattern?: string;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly exclusiveMinimum?: number;
}

/** Words that say nothing about which values are taken. */
const silent = new Set(['title', 'description', 'readOnly', 'format', 'example']);
const spoken = new Set(
  '$ref type enum const anyOf oneOf properties required additionalProperties propertyNames items prefixItems minItems maxItems minLength maxLength pattern minimum maximum exclusiveMinimum'.split(
    ' ',
  ),
);

const kindOf = (value: unknown): string =>
  value === null ? 'null' : Array.isArray(value) ? 'array' : typeof value === 'object' ? 'object' : typeof value;

const hasType = (type: string | readonly string[], value: unknown): boolean =>
  [type].flat().some((one) => (one === 'integer' ? Number.isInteger(value) : kindOf(value) === one));

const refersTo = (ref: string, root: unknown): JsonSchema =>
  ref
    .slice(2)
    .split('/')
    .reduce<unknown>((at, name) => (at as Record<string, unknown>)[name], root) as JsonSchema;

const objectFits = (schema: JsonSchema, value: Record<string, unknown>, root: unknown): boolean => {
  const { properties = {}, required = [], additionalProperties = true, propertyNames = {} } = schema;
  // A value that is undefined is absent in JSON.
  const entries = Object.entries(value).filter(([, one]) => one !== undefined);
  const names = entries.map(([name]) => name);
  return (
    required.every((name) => names.includes(name)) &&
    entries.every(([name, one]) => {
      if (!accepts(propertyNames, name, root)) return false;
      const known = Object.hasOwn(properties, name) ? properties[name] : additionalProperties;
      return typeof known === 'boolean' ? known : accepts(known ?? {}, one, root);
    })
  );
};

const arrayFits = (schema: JsonSchema, value: readonly unknown[], root: unknown): boolean => {
  const { prefixItems = [], items = true, minItems = 0, maxItems = Number.POSITIVE_INFINITY } = schema;
  return (
    value.length >= minItems &&
    value.length <= maxItems &&
    value.every((one, at) => {
      const known = prefixItems[at] ?? items;
      return typeof known === 'boolean' ? known : accepts(known, one, root);
    })
  );
};

const textFits = (
  { minLength = 0, maxLength = Number.POSITIVE_INFINITY, pattern }: JsonSchema,
  value: string,
): boolean =>
  value.length >= minLength && value.length <= maxLength && (pattern === undefined || new RegExp(pattern).test(value));

const numberFits = (schema: JsonSchema, value: number): boolean =>
  value >= (schema.minimum ?? Number.NEGATIVE_INFINITY) &&
  value <= (schema.maximum ?? Number.POSITIVE_INFINITY) &&
  value > (schema.exclusiveMinimum ?? Number.NEGATIVE_INFINITY);

/** Whether a value fits a schema. Throws for a word of the schema that it does not know, so that no check is passed over. */
export const accepts = (schema: JsonSchema, value: unknown, root: unknown): boolean => {
  const strange = Object.keys(schema).filter((word) => !silent.has(word) && !spoken.has(word));
  if (strange.length > 0) throw new Error(`unknown in a schema: ${strange.join(', ')}`);
  if (schema.$ref !== undefined) return accepts(refersTo(schema.$ref, root), value, root);
  if (schema.const !== undefined && value !== schema.const) return false;
  if (schema.enum && !schema.enum.includes(value)) return false;
  if (schema.type !== undefined && !hasType(schema.type, value)) return false;
  if (schema.anyOf && !schema.anyOf.some((one) => accepts(one, value, root))) return false;
  if (schema.oneOf && schema.oneOf.filter((one) => accepts(one, value, root)).length !== 1) return false;
  if (typeof value === 'string') return textFits(schema, value);
  if (typeof value === 'number') return numberFits(schema, value);
  if (Array.isArray(value)) return arrayFits(schema, value, root);
  return typeof value !== 'object' || value === null || objectFits(schema, value as Record<string, unknown>, root);
};
