import * as z from 'zod';
import { VERSION } from '../../core/check/version.ts';
import { exampleEnd } from '../exampleEnd.ts';
import type { Route } from './route.ts';
import { type SchemaName, schemas } from './schemas.ts';

type Json = Record<string, unknown>;

const refTo = (name: SchemaName): Json => ({ $ref: `#/components/schemas/${name}` });

/** The schemas as the program itself reads them, in JSON Schema 2020-12. */
const described = (): Json => {
  const registry = z.registry<{ id: string }>();
  for (const [id, schema] of Object.entries(schemas)) registry.add(schema, { id });
  const made = z.toJSONSchema(registry, { uri: (id) => `#/components/schemas/${id}`, io: 'input' }).schemas;
  return Object.fromEntries(Object.entries(made).map(([id, { $schema: _, $id: __, ...schema }]) => [id, schema]));
};

const contentOf = (content: Route['takes'], example?: unknown): Json =>
  Object.fromEntries(
    Object.entries(content).map(([type, one]) => {
      if (typeof one === 'string') return [type, { schema: refTo(one), ...(example !== undefined && { example }) }];
      if ('lines' in one) return [type, { schema: { type: 'string', description: one.lines } }];
      return [type, { schema: { description: one.other } }];
    }),
  );

const problemNames: Readonly<Record<number, string>> = {
  400: 'Not readable as JSON, or an unknown query',
  413: 'Too large',
  415: 'A kind of body that is not taken here',
  422: 'The end cannot be checked, or the card not printed; the faults say why',
};

const operation = (route: Route): Json => ({
  summary: route.summary,
  parameters: Object.entries(route.query).map(([name, values]) => ({
    name,
    in: 'query',
    description: route.meaning[name],
    schema: { type: 'string', enum: values },
  })),
  ...(route.method === 'post' && {
    requestBody: { required: true, content: contentOf(route.takes, route.example ?? exampleEnd) },
  }),
  responses: {
    200: { description: route.summary, content: contentOf(route.gives) },
    ...Object.fromEntries(
      route.problems.map((status) => [
        status,
        { description: problemNames[status], content: { 'application/problem+json': { schema: refTo('Problem') } } },
      ]),
    ),
  },
});

/** The description of the API, OpenAPI 3.1, made from the routes and schemas that serve it. */
export const openApi = (routes: readonly Route[]): Json => ({
  openapi: '3.1.0',
  info: {
    title: 'Copewright',
    version: VERSION,
    description:
      'Checks the coped, drilled end of a steel beam before it is cut. For a competent person and for the data given only; local codes govern; licensed practice decides.',
    license: { name: 'MIT', identifier: 'MIT' },
  },
  paths: Object.fromEntries(routes.map((route) => [route.path, { [route.method]: operation(route) }])),
  components: { schemas: described() },
});
