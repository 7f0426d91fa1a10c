import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { createApp } from '../../api/app.ts';
import { endSchema } from '../../core/end/schema.ts';
import { anyEnd } from './anyEnd.ts';
import { ask, postJson } from './ask.ts';
import { exampleEnd } from './exampleEnd.ts';
import { accepts, type JsonSchema } from './jsonSchema.ts';

interface Operation {
  readonly parameters: readonly { readonly name: string }[];
  readonly requestBody?: { readonly content: Readonly<Record<string, { readonly example?: unknown }>> };
  readonly responses: Readonly<Record<string, { readonly content: Readonly<Record<string, { schema: JsonSchema }>> }>>;
}
interface Description {
  readonly openapi: string;
  readonly paths: Readonly<Record<string, Readonly<Record<string, Operation>>>>;
  readonly components: { readonly schemas: Readonly<Record<string, JsonSchema>> };
}

const description: Description = await (await ask('/openapi.json')).json();
const operations = Object.entries(description.paths).flatMap(([path, methods]) =>
  Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
);
const named = (name: string): JsonSchema => ({ $ref: `#/components/schemas/${name}` });
const fits = (schema: JsonSchema, value: unknown): boolean => accepts(schema, value, description);

describe('the description of the API', () => {
  test('is OpenAPI 3.1', () => {
    expect(description.openapi).toMatch(/^3\.1\./);
  });

  test('describes every address that is served, and no other', () => {
    const served = createApp().routes.filter(({ method, path }) => method !== 'ALL' && path !== '*');
    expect(operations.map(({ path, method }) => `${method.toUpperCase()} ${path}`).sort()).toEqual(
      served.map(({ method, path }) => `${method} ${path}`).sort(),
    );
  });

  test('every reference leads to a schema, and every schema is referred to', () => {
    const text = JSON.stringify(description);
    const referred = [...text.matchAll(/"#\/components\/schemas\/(\w+)"/g)].map(([, name]) => name);
    const free = ['FaultLine'];
    expect([...new Set([...referred, ...free])].sort()).toEqual(Object.keys(description.components.schemas).sort());
  });

  test('every answer of a described address fits what is described', async () => {
    for (const { path, method, operation } of operations) {
      const body = method === 'post' ? { body: JSON.stringify(exampleEnd) } : {};
      const response = await ask(path, {
        method: method.toUpperCase(),
        headers: { 'content-type': 'application/json' },
        ...body,
      });
      const type = response.headers.get('content-type') ?? '';
      const content = operation.responses[response.status]?.content[type];
      expect(content, `${method} ${path} ${response.status} ${type}`).toBeDefined();
      if (type === 'application/json') expect(fits(content!.schema, await response.json())).toBe(true);
    }
  });

  test('the answers with working, with faults and with failing ends fit it too', async () => {
    const working = await (await postJson('/v1/check?working=1', exampleEnd)).json();
    expect(fits(named('Report'), working)).toBe(true);
    expect(fits(named('Problem'), await (await postJson('/v1/check', {})).json())).toBe(true);
    expect(fits(named('Report'), { ...working, surplus: 1 })).toBe(false);
  });
});

describe('the schema of an end in the description', () => {
  const end = named('End');

  test('accepts the example that it carries', () => {
    const example = description.paths['/v1/check']?.post?.requestBody?.content['application/json']?.example;
    expect(example).toEqual(exampleEnd);
    expect(fits(end, example)).toBe(true);
  });

  test('refuses an end for each field that is missing, of the wrong kind, or unknown', () => {
    expect(fits(end, { ...exampleEnd, setback: undefined })).toBe(false);
    expect(fits(end, { ...exampleEnd, setback: '10' })).toBe(false);
    expect(fits(end, { ...exampleEnd, setback: -1 })).toBe(false);
    expect(fits(end, { ...exampleEnd, skew: 10 })).toBe(false);
    expect(fits(end, { ...exampleEnd, joint: { ...exampleEnd.joint, kind: 'glue' } })).toBe(false);
    expect(fits(end, { ...exampleEnd, top: { length: 10 } })).toBe(false);
  });

  test('takes and refuses what the program itself takes and refuses', () => {
    let taken = 0;
    fc.assert(
      fc.property(anyEnd, (value) => {
        const known = endSchema.safeParse(value).success;
        taken += known ? 1 : 0;
        expect(fits(end, value)).toBe(known);
      }),
      { numRuns: 1500 },
    );
    expect(taken).toBeGreaterThan(50);
    expect(taken).toBeLessThan(1450);
  });
});

test('every schema has a title or a description that a reader can use', () => {
  for (const [name, { title, description: told }] of Object.entries(description.components.schemas)) {
    expect(title ?? told, name).toBeTruthy();
  }
});
