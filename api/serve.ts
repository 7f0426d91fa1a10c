import type { AddressInfo } from 'node:net';
import { serve as listen, type ServerType } from '@hono/node-server';
import { createApp } from './app.ts';

export interface ServeOptions {
  readonly host: string;
  readonly port: number;
  /** Folder of the built bench; absent = the API alone. */
  readonly web?: string;
}

/** A body that does not arrive in this time is given up, ms. */
const PATIENCE = 30_000;

/** Serves until the server is closed. Rejects where the address cannot be had. */
export const serve = ({
  host,
  port,
  web,
}: ServeOptions): Promise<{ readonly server: ServerType; readonly url: string }> =>
  new Promise((resolve, reject) => {
    const { fetch } = createApp(web === undefined ? {} : { web });
    const server = listen(
      { fetch, hostname: host, port, serverOptions: { requestTimeout: PATIENCE } },
      ({ address, family, port: taken }: AddressInfo) =>
        resolve({ server, url: `http://${family === 'IPv6' ? `[${address}]` : address}:${taken}` }),
    );
    server.once('error', reject);
  });
