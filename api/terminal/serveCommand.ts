import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { serve } from '../serve.ts';
import type { Asked } from './arguments.ts';
import { complain, HOLDS, print } from './output.ts';

export const LOOPBACK = '127.0.0.1';
export const PORT = 4280;

const web = fileURLToPath(new URL('../../dist/web', import.meta.url));

const sentences: Readonly<Record<string, (host: string, port: number) => string>> = {
  EADDRINUSE: (_, port) => `Port ${port} is in use; choose another with --port.`,
  EACCES: (_, port) => `Port ${port} is not open to you; choose one above 1023 with --port.`,
  EADDRNOTAVAIL: (host) => `${host} is no address of this machine.`,
  ENOTFOUND: (host) => `${host} is no address of this machine.`,
};

/** Serves bench and API until it is stopped; the exit status. */
export const serveCommand = async ({ values }: Asked): Promise<number> => {
  const { host = LOOPBACK, port: written = String(PORT) } = values;
  const port = /^\d{1,5}$/.test(written) ? Number(written) : Number.NaN;
  if (!(port <= 65535)) return complain('--port takes a number from 0 to 65535.');
  const built = existsSync(`${web}/index.html`);
  try {
    const { server, url } = await serve({ host, port, ...(built && { web }) });
    await print(`Copewright: ${url}\n`);
    if (!built) await print('The API alone: the bench is not built; npm start builds it.\n');
    if (![LOOPBACK, 'localhost', '::1'].includes(host))
      await print('Open to every machine that reaches this address.\n');
    const stop = (): void => {
      server.close();
      if ('closeAllConnections' in server) server.closeAllConnections();
    };
    process.once('SIGINT', stop).once('SIGTERM', stop);
    return HOLDS;
  } catch (error) {
    const sentence = sentences[(error as NodeJS.ErrnoException | null)?.code ?? ''];
    if (!sentence) throw error;
    return complain(sentence(host, port));
  }
};
