import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { copyFileSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, test } from 'vitest';
import { postJson } from './ask.ts';
import { exampleEnd, failingEnd } from './exampleEnd.ts';

const launcher = fileURLToPath(new URL('../../api/copewright.js', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'copewright-'));
afterAll(() => rmSync(folder, { recursive: true }));

// A project of its own around it, whose settings must not matter.
writeFileSync(join(folder, 'tsconfig.json'), '{ "compilerOptions": { "paths": { "zod": ["./none"] } } }');

const start = (args: readonly string[], program = launcher): ChildProcess =>
  spawn(process.execPath, [program, ...args], { cwd: folder });

const ended = async (child: ChildProcess, input = ''): Promise<{ status: number; out: string; err: string }> => {
  const [out, err]: [Buffer[], Buffer[]] = [[], []];
  child.stdout?.on('data', (part) => out.push(part));
  child.stderr?.on('data', (part) => err.push(part));
  child.stdin?.on('error', () => undefined);
  child.stdin?.end(input);
  const [status] = await once(child, 'close');
  return { status, out: Buffer.concat(out).toString(), err: Buffer.concat(err).toString() };
};

describe('the program as it is started from any folder', () => {
  test('reads an end from standard input, prints what the API answers and ends with 0', async () => {
    const text = await (await postJson('/v1/check', exampleEnd)).text();
    const run = await ended(start(['check', '-', '--json']), JSON.stringify(exampleEnd));
    expect(run).toEqual({ status: 0, out: `${text}\n`, err: '' });
  });

  test('reads many ends from standard input, and ends with 1 where one fails', async () => {
    const input = [exampleEnd, failingEnd].map((end) => JSON.stringify(end)).join('\n');
    const { status, out } = await ended(start(['check', '--ndjson']), input);
    expect([
      status,
      out
        .trimEnd()
        .split('\n')
        .map((line) => JSON.parse(line).verdict),
    ]).toEqual([1, ['holds', 'fails']]);
  });

  test('ends with 2 where its arguments are not understood', async () => {
    expect(await ended(start(['check', '--wroking']))).toMatchObject({ status: 2, out: '' });
  });

  test('is quiet when its reader has seen enough', async () => {
    const child = start(['check', '--ndjson']);
    let err = '';
    child.stderr?.on('data', (part) => {
      err += part;
    });
    child.stdin?.on('error', () => undefined);
    child.stdin?.end(`${JSON.stringify(exampleEnd)}\n`.repeat(2000));
    await once(child.stdout!, 'data');
    child.stdout?.destroy();
    await once(child, 'close');
    expect(err).toBe('');
  });

  test('serves on the loopback address until it is stopped', async () => {
    const child = start(['serve', '--port', '0']);
    const [line] = await once(child.stdout!, 'data');
    const url = /http:\/\/127\.0\.0\.1:\d+/.exec(String(line))?.[0];
    expect((await fetch(`${url}/v1/standards`)).status).toBe(200);
    child.kill('SIGTERM');
    const [status] = await once(child, 'close');
    expect(status).toBe(0);
  });

  test('says in one line what to run where nothing is installed', async () => {
    mkdirSync(join(folder, 'api'));
    const bare = join(folder, 'api', 'copewright.js');
    copyFileSync(launcher, bare);
    copyFileSync(fileURLToPath(new URL('../../api/setup.js', import.meta.url)), join(folder, 'api', 'setup.js'));
    writeFileSync(join(folder, 'package.json'), '{ "type": "module" }');
    const { status, out, err } = await ended(start(['check', 'x.json'], bare));
    expect([status, out]).toEqual([2, '']);
    expect(err).toMatch(/^[^\n]*npm ci[^\n]*\n$/);
  });
});
