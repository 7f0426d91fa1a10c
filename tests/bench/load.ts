import { once } from 'node:events';
import { connect } from 'node:net';

const END_OF_HEAD = Buffer.from('\r\n\r\n');

/** What is asked, the bodies one after the other, again and again. */
export interface Request {
  readonly port: number;
  readonly path: string;
  readonly bodies: readonly string[];
}

export interface Load {
  readonly perSecond: number;
  /** Milliseconds that the slowest of a hundred waited. */
  readonly p99: number;
  /** Bytes of one answer, so that a later run can tell whether the work was the same. */
  readonly bytes: number;
}

const written = ({ port, path, bodies }: Request): string[] =>
  bodies.map((body) =>
    [
      `POST ${path} HTTP/1.1`,
      `Host: 127.0.0.1:${port}`,
      'Content-Type: application/json',
      `Content-Length: ${Buffer.byteLength(body)}`,
      '',
      body,
    ].join('\r\n'),
  );

/** Asks over one connection until `until`; the times of the answers are added to `times`. */
const asking = async (port: number, next: () => string, until: number, times: number[]): Promise<number> => {
  const socket = connect(port, '127.0.0.1').setNoDelay(true);
  await once(socket, 'connect');
  let bytes = 0;
  await new Promise<void>((resolve, reject) => {
    let pending: Buffer = Buffer.alloc(0);
    let asked = performance.now();
    socket.write(next());
    socket.on('error', reject);
    socket.on('data', (chunk: Buffer) => {
      pending = pending.length === 0 ? chunk : Buffer.concat([pending, chunk]);
      const head = pending.indexOf(END_OF_HEAD);
      if (head < 0) return;
      const lines = pending.subarray(0, head).toString('latin1');
      const length = Number(/content-length: (\d+)/i.exec(lines)?.[1]);
      if (pending.length < head + END_OF_HEAD.length + length) return;
      if (!lines.startsWith('HTTP/1.1 200 ')) {
        reject(new Error(lines));
        return;
      }
      bytes = length;
      pending = Buffer.alloc(0);
      const now = performance.now();
      times.push(now - asked);
      asked = now;
      if (now < until) socket.write(next());
      else resolve();
    });
  });
  socket.destroy();
  return bytes;
};

/** Keeps a server busy over so many connections for so long, ms. */
export const load = async (request: Request, connections: number, duration: number): Promise<Load> => {
  const times: number[] = [];
  const texts = written(request);
  let asked = 0;
  const next = (): string => texts[asked++ % texts.length]!;
  const start = performance.now();
  const ask = () => asking(request.port, next, start + duration, times);
  const [bytes = 0] = await Promise.all(Array.from({ length: connections }, ask));
  const seconds = (performance.now() - start) / 1000;
  times.sort((a, b) => a - b);
  return { perSecond: times.length / seconds, p99: times[Math.floor(times.length * 0.99)]!, bytes };
};
