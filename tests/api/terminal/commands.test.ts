import { once } from 'node:events';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test, vi } from 'vitest';
import { cli } from '../../../api/cli.ts';
import { VERSION } from '../../../core/check/version.ts';
import { standards } from '../../../core/standards/index.ts';
import { LINES_TYPE, post, postJson } from '../ask.ts';
import { exampleEnd, failingEnd, referringEnd } from '../exampleEnd.ts';

const folder = mkdtempSync(join(tmpdir(), 'copewright-'));
afterAll(() => rmSync(folder, { recursive: true }));

const file = (name: string, content: unknown): string => {
  const path = join(folder, name);
  writeFileSync(path, typeof content === 'string' ? content : JSON.stringify(content));
  return path;
};
const holding = file('holding.json', exampleEnd);
const failing = file('failing.json', failingEnd);
const referring = file('referring.json', referringEnd);
const faulty = file('faulty.json', { ...exampleEnd, setback: 'ten', jiont: 1 });

/** Runs the command line in this process: what it writes, and the exit status that it leaves. */
const run = async (...args: readonly string[]): Promise<{ status: unknown; out: string; err: string }> => {
  const [out, err] = [process.stdout, process.stderr].map((stream) => vi.spyOn(stream, 'write').mockReturnValue(true));
  const before = process.exitCode;
  const listeners = process.stdout.listeners('error');
  try {
    await cli(args);
    const texts = [out, err].map((spy) => spy!.mock.calls.map(([text]) => text.toString()).join(''));
    return { status: process.exitCode, out: texts[0]!, err: texts[1]! };
  } finally {
    process.exitCode = before;
    out?.mockRestore();
    err?.mockRestore();
    for (const one of process.stdout.listeners('error')) {
      if (!listeners.includes(one)) process.stdout.off('error', one as (error: Error) => void);
    }
  }
};

/** One sentence on the error output, nothing on the other, and status 2. */
const expectSentence = ({ status, out, err }: Awaited<ReturnType<typeof run>>): void => {
  expect([status, out]).toEqual([2, '']);
  expect(err).toMatch(/^[^\n]+\.\n$/);
};

describe('copewright standards', () => {
  test('lists every standard with the level of its reactions', async () => {
    const { status, out } = await run('standards');
    expect(status).toBe(0);
    for (const { id, title } of Object.values(standards)) expect(out).toMatch(new RegExp(`^${id} .*${title}`, 'm'));
  });

  test('prints one in full: factors, options, every check with clause, basis and its formula with all branches', async () => {
    const { status, out } = await run('standards', 'sans-10162-1');
    expect(status).toBe(0);
    expect(out).toContain('φ = 0.9, φ_b = 0.8');
    expect(out).toMatch(/Shear of the full section \(web-gross-shear\); 13\.4\.1\.1, memory; held against published/);
    expect(out).toMatch(/f_s = 0\.66 f_y where λ_w ≤ 440 √\(5\.34 \/ f_y\)/);
    expect(out).toMatch(/= 180.000 × 5\.34 \/ λ_w², otherwise/);
    expect(out).toContain('licensed practice decides');
    expect(Math.max(...out.split('\n').map(({ length }) => length))).toBeLessThanOrEqual(100);
  });

  test('names the nearest for one that is not known', async () => expectSentence(await run('standards', 'sans-10162')));
});

describe('copewright check', () => {
  test('ends with 0 where the end holds, with 1 where it fails or refers', async () => {
    expect(await run('check', holding)).toMatchObject({ status: 0, out: expect.stringContaining('HOLDS'), err: '' });
    expect(await run('check', failing)).toMatchObject({ status: 1, out: expect.stringContaining('FAILS'), err: '' });
    expect(await run('check', referring)).toMatchObject({ status: 1, out: expect.stringContaining('REFER'), err: '' });
  });

  test('says each fault as a sentence with its path, and ends with 2', async () => {
    const { status, out, err } = await run('check', faulty);
    expect([status, out]).toEqual([2, '']);
    expect(err).toContain('setback: Setback must be a number');
    expect(err).toMatch(/^jiont: .*joint/m);
  });

  test('prints the JSON that the API answers with', async () => {
    expect((await run('check', holding, '--json')).out).toBe(
      `${await (await postJson('/v1/check', exampleEnd)).text()}\n`,
    );
    const worked = await postJson('/v1/check?working=1', exampleEnd);
    expect((await run('check', '--json', '--working', holding)).out).toBe(`${await worked.text()}\n`);
    const { faults } = await (await post('/v1/check', readFileSync(faulty, 'utf8'))).json();
    const fault = await run('check', faulty, '--json');
    expect([fault.status, JSON.parse(fault.out), fault.err]).toEqual([2, { faults }, '']);
  });

  test('prints the working of every check when asked', async () => {
    expect((await run('check', holding)).out).not.toContain('V_r =');
    expect((await run('check', holding, '--working')).out).toContain('V_r = 0.6 φ_b A_b f_ub');
  });

  test('a file that is not there, is empty, is a folder or is too large ends with 2 and one sentence', async () => {
    const large = file('large.json', ' '.repeat(1024 * 1024 + 1));
    for (const one of [join(folder, 'none.json'), file('empty.json', ''), folder, large]) {
      expectSentence(await run('check', one));
    }
    expectSentence(await run('check'));
  });
});

describe('copewright check --ndjson', () => {
  const good = JSON.stringify(exampleEnd);
  const bad = JSON.stringify(failingEnd);

  test('answers line by line as the API does, in order, and ends with 2 where a line has a fault', async () => {
    const body = `${[good, '{', bad].join('\n')}\n`;
    const { status, out } = await run('check', '--ndjson', file('mixed.ndjson', body));
    expect(status).toBe(2);
    expect(out).toBe(await (await post('/v1/check', body, LINES_TYPE)).text());
  });

  test('ends with 0 where all hold and with 1 where one fails', async () => {
    const all = await run('check', '--ndjson', '--working', file('all.ndjson', `${good}\n${good}`));
    expect([all.status, all.out.match(/"working"/g)?.length]).toEqual([0, expect.any(Number)]);
    expect((await run('check', '--ndjson', file('one.ndjson', `${good}\n${bad}\n`))).status).toBe(1);
  });
});

describe('copewright sheet', () => {
  test('writes the PDF that the API answers with, and ends as the check does', async () => {
    const [out, all] = [join(folder, 'out.pdf'), join(folder, 'all.pdf')];
    expect(await run('sheet', holding, '-o', out)).toEqual({ status: 0, out: '', err: '' });
    const bytes = Buffer.from(await (await postJson('/v1/sheet', exampleEnd)).arrayBuffer());
    expect(readFileSync(out).equals(bytes)).toBe(true);
    expect((await run('sheet', failing, '--output', all, '--workings', 'all')).status).toBe(1);
    expect(readFileSync(all).length).toBeGreaterThan(bytes.length);
  });

  test('without a name to write to, or with one that cannot be written, ends with 2 and one sentence', async () => {
    expectSentence(await run('sheet', holding));
    expectSentence(await run('sheet', '-o', 'x.pdf'));
    expectSentence(await run('sheet', holding, '-o', join(folder, 'none', 'x.pdf')));
    expectSentence(await run('sheet', holding, '-o', 'x.pdf', '--workings', 'some'));
    expect((await run('sheet', faulty, '-o', 'x.pdf')).err).toContain('setback: ');
  });
});

describe('copewright card', () => {
  const sections = ['UB 406x178x60', 'UB 457x191x67'];
  const listed = ['--sections', sections.join(', ')];

  test('writes the PDF that the API answers with, and ends with 0, whether the end itself holds or not', async () => {
    const out = join(folder, 'card.pdf');
    expect(await run('card', failing, ...listed, '--rows', '2-4', '-o', out)).toEqual({ status: 0, out: '', err: '' });
    const body = { end: exampleEnd, sections, rows: [2, 3, 4] };
    const bytes = Buffer.from(await (await postJson('/v1/card', body)).arrayBuffer());
    expect(readFileSync(out).equals(bytes)).toBe(true);
  });

  test('prints the table as JSON when asked, of a family too', async () => {
    const { status, out } = await run('card', holding, '--family', 'UB', '--rows', '2,3', '--json');
    expect(status).toBe(0);
    const answer = await postJson('/v1/card?as=json', { end: exampleEnd, family: 'UB', rows: [2, 3] });
    expect(out).toBe(`${await answer.text()}\n`);
  });

  test('what cannot be followed ends with 2 and one sentence', async () => {
    expectSentence(await run('card', '--family', 'UB', '-o', 'x.pdf'));
    expectSentence(await run('card', holding, '--family', 'UB'));
    expectSentence(await run('card', holding, '--family', 'UB', '--json', '-o', '-'));
    for (const rows of ['2-', '8-2', 'all', '2.5', ''])
      expectSentence(await run('card', holding, '--family', 'UB', `--rows=${rows}`, '-o', 'x.pdf'));
    expectSentence(await run('card', holding, ...listed, '-o', join(folder, 'none', 'x.pdf')));
    expectSentence(await run('card', join(folder, 'none.json'), ...listed, '-o', 'x.pdf'));
  });

  test('says each fault as a sentence with its path', async () => {
    const refused = async (...args: string[]): Promise<string> => {
      const { status, out, err } = await run('card', holding, ...args, '--json');
      expect([status, out]).toEqual([2, '']);
      return err;
    };
    expect(await refused('--family', 'UBB')).toMatch(/^family: .*nearest: UB/);
    expect(await refused('--sections', 'UB 406x178x61')).toMatch(/^sections: .*nearest: UB 406x178x60/);
    expect(await refused()).toMatch(/^sections: .*family or of a list/);
    expect((await run('card', faulty, '--family', 'UB', '--json')).err).toContain('setback: ');
  });
});

describe('copewright serve', () => {
  test('says in one line that a port is in use, and ends with 2', async () => {
    const taken = createServer().listen(0, '127.0.0.1');
    await once(taken, 'listening');
    const { port } = taken.address() as { port: number };
    const { status, err } = await run('serve', '--port', String(port));
    taken.close();
    expect([status, err]).toEqual([2, `Port ${port} is in use; choose another with --port.\n`]);
  });

  test('refuses a port that is none and a host that is not its own', async () => {
    expectSentence(await run('serve', '--port', '70000'));
    expectSentence(await run('serve', '--port', 'http'));
    // An address kept for documentation (RFC 5737): no machine has it.
    expectSentence(await run('serve', '--port', '0', '--host', '192.0.2.1'));
  });
});

test('help, the version, and arguments that are not known', async () => {
  const help = await run('help');
  expect(help).toMatchObject({ status: 0, out: expect.stringContaining('copewright check FILE.json') });
  expect(await run()).toEqual(help);
  expect(await run('--version')).toEqual({ status: 0, out: `${VERSION}\n`, err: '' });
  expect(await run('chekc', 'x.json')).toEqual({
    status: 2,
    out: '',
    err: 'chekc is not known here; nearest: check.\n',
  });
  expect((await run('check', holding, '--wroking')).err).toBe('--wroking is not known here; nearest: --working.\n');
});
