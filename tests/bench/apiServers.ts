import { serve as listen } from '@hono/node-server';
import { Hono } from 'hono';
import { serve } from '../../api/serve.ts';

/** Started as a process of its own by apiBench: the API, and beside it a bare echo of JSON. Prints both ports. */
const echo = new Hono().post('/', async (c) => c.json(await c.req.json()));

const { url } = await serve({ host: '127.0.0.1', port: 0 });
listen({ fetch: echo.fetch, hostname: '127.0.0.1', port: 0 }, ({ port }) => {
  process.stdout.write(`${new URL(url).port} ${port}\n`);
});
