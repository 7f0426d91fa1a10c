import { once } from 'node:events';
import { connect, type Socket } from 'node:net';
import type { ServerType } from '@hono/node-server';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { serve } from '../../api/serve.ts';
import { exampleEnd } from './exampleEnd.ts';

let server: ServerType;
let url: string;
let port: number;

beforeAll(async () => {
  ({ server, url } = await serve({ host: '127.0.0.1', port: 0 }));
  port = Number(new URL(url).port);
});

afterAll(async () => {
  server.close();
  if ('closeAllConnections' in server) server.closeAllConnections();
});

/** Writes raw bytes and gives back what comes before the connection closes, or before `enough` is seen. */
const exchange = async (write: (socket: Socket) => void | Promise<void>, enough = /\r\n\r\n.+/s): Promise<string> => {
  const socket = connect(port, '127.0.0.1');
  // The server may close while this side still writes.
  socket.on('error', () => undefined);
  await once(socket, 'connect');
  let answer = '';
  const ended = new Promise<void>((resolve) => {
    socket.on('close', () => resolve());
    socket.on('data', (chunk) => {
      answer += chunk.toString('latin1');
      if (enough.test(answer)) resolve();
    });
  });
  await write(socket);
  await ended;
  socket.destroy();
  return answer;
};

const head = (...more: string[]): string =>
  ['POST /v1/check HTTP/1.1', 'Host: 127.0.0.1', 'Content-Type: application/json', ...more, '', ''].join('\r\n');

const statusOf = (answer: string): number => Number(answer.split(' ')[1]);

describe('over a connection', () => {
  test('an end is checked', async () => {
    const body = JSON.stringify(exampleEnd);
    const response = await fetch(`${url}/v1/check`, {
      method: 'POST',
      body,
      headers: { 'content-type': 'application/json' },
    });
    expect(await response.json()).toMatchObject({ mark: 'K-207/L', verdict: 'holds' });
  });

  test('a body that is said to be 10 MB is refused before it is sent', async () => {
    const answer = await exchange((socket) => void socket.write(head('Content-Length: 10000000')));
    expect(statusOf(answer)).toBe(413);
    expect(answer).toContain('application/problem+json');
  });

  test('a body of 10 MB that is sent is refused', async () => {
    const body = Buffer.alloc(10_000_000, 0x20);
    const answer = await exchange((socket) => {
      socket.write(head(`Content-Length: ${body.length}`));
      socket.write(body);
    });
    expect(statusOf(answer)).toBe(413);
  });

  test('a body without a length is refused once it passes the limit, though it never ends', async () => {
    const piece = `10000\r\n${' '.repeat(0x10000)}\r\n`;
    const answer = await exchange(async (socket) => {
      socket.write(head('Transfer-Encoding: chunked'));
      for (let sent = 0; sent < 40; sent += 1) socket.write(piece);
    });
    expect(statusOf(answer)).toBe(413);
  });

  test('a body without a length is read when it is within the limit', async () => {
    const body = JSON.stringify(exampleEnd);
    const answer = await exchange((socket) => {
      socket.write(head('Transfer-Encoding: chunked'));
      for (const part of [body.slice(0, 100), body.slice(100)]) {
        socket.write(`${part.length.toString(16)}\r\n${part}\r\n`);
      }
      socket.write('0\r\n\r\n');
    });
    expect(statusOf(answer)).toBe(200);
  });

  test('a length that is less than the body cuts it there, which is no JSON', async () => {
    const answer = await exchange(
      (socket) => void socket.write(`${head('Content-Length: 5')}${JSON.stringify(exampleEnd)}`),
    );
    expect(statusOf(answer)).toBe(400);
  });

  test('two lengths that contradict each other are refused', async () => {
    const answer = await exchange(
      (socket) => void socket.write(`${head('Content-Length: 2', 'Transfer-Encoding: chunked')}{}`),
    );
    expect(statusOf(answer)).toBe(400);
  });

  test('a caller who leaves in the middle of a body or of an answer does no harm', async () => {
    const socket = connect(port, '127.0.0.1');
    await once(socket, 'connect');
    socket.write(head('Content-Length: 1000'));
    socket.destroy();
    const lines = `${JSON.stringify(exampleEnd)}\n`.repeat(500);
    const leaver = new AbortController();
    const headers = { 'content-type': 'application/x-ndjson' };
    const response = await fetch(`${url}/v1/check`, { method: 'POST', body: lines, headers, signal: leaver.signal });
    await response.body?.getReader().read();
    leaver.abort();
    expect((await fetch(`${url}/v1/standards`)).status).toBe(200);
  });

  test('an address that climbs out of its folder leads nowhere', async () => {
    for (const path of [
      '/../package.json',
      '/..%2fpackage.json',
      '/assets/../../package.json',
      '//etc/passwd',
      '/%00',
    ]) {
      const answer = await exchange((socket) => void socket.write(`GET ${path} HTTP/1.1\r\nHost: 127.0.0.1\r\n\r\n`));
      expect(statusOf(answer), path).toBe(404);
    }
    const backslash = await exchange(
      (socket) => void socket.write('GET /..\\package.json HTTP/1.1\r\nHost: x\r\n\r\n'),
      /\r\n\r\n/,
    );
    expect(statusOf(backslash)).toBe(400);
  });

  test('many lines come back as a stream, whose length nobody has to know first', async () => {
    const lines = `${JSON.stringify(exampleEnd)}\n`.repeat(200);
    const response = await fetch(`${url}/v1/check`, {
      method: 'POST',
      body: lines,
      headers: { 'content-type': 'application/x-ndjson' },
    });
    expect(response.headers.get('content-length')).toBeNull();
    expect((await response.text()).trim().split('\n')).toHaveLength(200);
  });

  test('a port that is taken is an error that names its reason', async () => {
    await expect(serve({ host: '127.0.0.1', port })).rejects.toMatchObject({ code: 'EADDRINUSE' });
  });
});
