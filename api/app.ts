import { Hono } from 'hono';
import { problem } from './http/problem.ts';
import { readQuery } from './http/query.ts';
import type { Route } from './http/route.ts';
import { routes } from './http/routes.ts';
import { webFiles } from './http/webFiles.ts';

const mediaType = (request: Request): string =>
  (request.headers.get('content-type') ?? '').split(';', 1)[0]!.trim().toLowerCase();

/** Refuses what the route does not take, and hands the rest to its handler. */
const answer = (route: Route, request: Request): Response | Promise<Response> => {
  const read = readQuery(request.url, route.query);
  if ('unknown' in read) return problem(400, read.unknown);
  const type = mediaType(request);
  if (route.method === 'post' && !Object.hasOwn(route.takes, type)) {
    return problem(415, `Send the body as ${Object.keys(route.takes).join(' or ')}.`, {
      headers: { Accept: Object.keys(route.takes).join(', ') },
    });
  }
  return route.handler(request, read.query, type);
};

const wrongMethod = (allowed: string): Response =>
  problem(405, `This address answers to ${allowed} only.`, { headers: { Allow: allowed } });

const allowedBy = (method: Route['method']): string => (method === 'get' ? 'GET, HEAD' : 'POST');

/** The program behind an address: the API, and with `web` the files of the bench. */
export const createApp = ({ web }: { readonly web?: string } = {}): Hono => {
  const app = new Hono();
  for (const route of routes) {
    app.on(route.method.toUpperCase(), route.path, (c) => answer(route, c.req.raw));
    app.all(route.path, () => wrongMethod(allowedBy(route.method)));
  }
  const files = web === undefined ? undefined : webFiles(web);
  app.all('*', (c) => {
    const found = files?.(c.req.path, c.req.raw);
    if (!found) return problem(404, 'Nothing stands at this address.');
    return c.req.method === 'GET' || c.req.method === 'HEAD' ? found : wrongMethod('GET, HEAD');
  });
  app.onError((error) => {
    console.error(error);
    return problem(500, 'The program broke a promise of its own. Nothing was checked.');
  });
  return app;
};
