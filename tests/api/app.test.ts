import { describe, expect, test } from 'vitest';
import { createApp } from '../../api/app.ts';
import { LINES_MOST } from '../../api/http/postCheck.ts';
import { reportSchema } from '../../api/http/reportSchema.ts';
import { problemSchema, sectionsSchema, standardsSchema } from '../../api/http/schemas.ts';
import { checkEnd } from '../../core/check/checkEnd.ts';
import { standards } from '../../core/standards/index.ts';
import { findSection, listSections } from '../../core/steel/findSection.ts';
import { ask, LINES_TYPE, post, postJson } from './ask.ts';
import { exampleEnd, failingEnd } from './exampleEnd.ts';

const problemOf = async (response: Response) => {
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  const problem = problemSchema.parse(await response.json());
  expect(problem.status).toBe(response.status);
  return problem;
};

describe('POST /v1/check', () => {
  test('answers with the report that the core gives, and no working', async () => {
    const response = await postJson('/v1/check', exampleEnd);
    expect(response.status).toBe(200);
    expect(response.headers.get('content-type')).toBe('application/json');
    const report = await response.json();
    expect({ report }).toEqual(checkEnd(exampleEnd));
    expect(reportSchema.parse(report)).toEqual(report);
  });

  test('adds the working of every check when asked', async () => {
    const report = await (await postJson('/v1/check?working=1', exampleEnd)).json();
    expect({ report }).toEqual(checkEnd(exampleEnd, { working: true }));
    expect(reportSchema.parse(report).checks[0]?.working).not.toHaveLength(0);
  });

  test('takes JSON with a byte-order mark and a media type with parameters', async () => {
    const body = `\ufeff${JSON.stringify(exampleEnd)}`;
    expect((await post('/v1/check', body, 'Application/JSON; charset=utf-8')).status).toBe(200);
  });

  test('an end that fails is an answer, not a problem', async () => {
    const response = await postJson('/v1/check', failingEnd);
    expect(response.status).toBe(200);
    expect(await response.json()).toMatchObject({ verdict: 'fails' });
  });

  test('a fault in the end is a 422 that names every fault with its path and its sentence', async () => {
    const { faults, detail } = await problemOf(await postJson('/v1/check', { ...exampleEnd, setback: 'ten', top: 5 }));
    expect(faults?.map(({ path }) => path).sort()).toEqual(['setback', 'top']);
    expect(detail).toBe(faults?.map(({ text }) => text).join(' '));
  });

  test('uplift is refused by name', async () => {
    const response = await postJson('/v1/check', { ...exampleEnd, reaction: -1 });
    expect(response.status).toBe(422);
    expect((await problemOf(response)).faults).toMatchObject([{ code: 'uplift', path: 'reaction' }]);
  });

  const unreadable: readonly (readonly [name: string, body: BodyInit])[] = [
    ['text that is no JSON', '{"mark": '],
    ['nothing', ''],
    ['NaN', '{"reaction": NaN}'],
    ['two ends after each other', '{}{}'],
    ['bytes that are no UTF-8', new Uint8Array([0x22, 0xff, 0x22])],
  ];
  test.each(unreadable)('%s is a 400', async (_, body) => {
    const response = await post('/v1/check', body);
    expect(response.status).toBe(400);
    await problemOf(response);
  });

  test('a body of another kind is a 415 that says what is taken', async () => {
    for (const type of ['text/plain', 'application/x-www-form-urlencoded', '', 'constructor']) {
      const response = await ask('/v1/check', { method: 'POST', body: '{}', headers: { 'content-type': type } });
      expect(response.status).toBe(415);
      expect((await problemOf(response)).detail).toContain('application/json');
    }
  });

  test('more than 1 MiB is a 413, whatever the headers say of it', async () => {
    const large = JSON.stringify({ ...exampleEnd, mark: ' '.repeat(1024 * 1024) });
    expect((await post('/v1/check', large)).status).toBe(413);
    const lying = { 'content-type': 'application/json', 'content-length': '10' };
    expect((await ask('/v1/check', { method: 'POST', body: large, headers: lying })).status).toBe(413);
    const wrong = { ...lying, 'content-length': 'x' };
    expect((await ask('/v1/check', { method: 'POST', body: '{}', headers: wrong })).status).toBe(413);
  });
});

describe('POST /v1/check with one end on each line', () => {
  const linesOf = async (response: Response): Promise<unknown[]> =>
    (await response.text())
      .split('\n')
      .slice(0, -1)
      .map((line) => JSON.parse(line));
  const reportOf = (end: unknown) => (checkEnd(end) as { report: unknown }).report;

  test('answers each line by a line, in order, with 200 even where a line has a fault', async () => {
    const body = [JSON.stringify(exampleEnd), '{"mark":', JSON.stringify(failingEnd), '', '[]'].join('\n');
    const response = await post('/v1/check', body, LINES_TYPE);
    expect(response.status).toBe(200);
    expect(response.headers.get('content-type')).toBe(LINES_TYPE);
    const [first, second, third, fourth, fifth, ...more] = await linesOf(response);
    expect(first).toEqual(reportOf(exampleEnd));
    expect(second).toMatchObject({ faults: [{ code: 'not-json' }] });
    expect(third).toEqual(reportOf(failingEnd));
    expect(fourth).toMatchObject({ faults: [{ code: 'not-an-end' }] });
    expect(fifth).toMatchObject({ faults: [{ code: 'wrong-kind' }] });
    expect(more).toEqual([]);
  });

  test('a line end at the end of the body is no further line; Windows line ends are taken', async () => {
    const one = JSON.stringify(exampleEnd);
    expect(await linesOf(await post('/v1/check', `${one}\r\n${one}\r\n`, LINES_TYPE))).toHaveLength(2);
    expect(await linesOf(await post('/v1/check', '', LINES_TYPE))).toHaveLength(0);
  });

  test('gives the working of each end when asked', async () => {
    const [report] = await linesOf(await post('/v1/check?working=1', JSON.stringify(exampleEnd), LINES_TYPE));
    expect({ report }).toEqual(checkEnd(exampleEnd, { working: true }));
  });

  test('a line of more than 1 MiB is a fault of that line alone', async () => {
    const body = `${' '.repeat(1024 * 1024 + 1)}\n${JSON.stringify(exampleEnd)}\n`;
    const [first, second] = await linesOf(await post('/v1/check', body, LINES_TYPE));
    expect(first).toMatchObject({ faults: [{ code: 'too-large' }] });
    expect(second).toEqual(reportOf(exampleEnd));
  });

  test('more than 8 MiB is a 413, and so are more lines than are taken at a time', async () => {
    expect((await post('/v1/check', ' '.repeat(8 * 1024 * 1024 + 1), LINES_TYPE)).status).toBe(413);
    expect((await post('/v1/check', '\n'.repeat(LINES_MOST + 1), LINES_TYPE)).status).toBe(413);
    expect((await post('/v1/check', '\n'.repeat(LINES_MOST), LINES_TYPE)).status).toBe(200);
  });
});

describe('POST /v1/sheet', () => {
  test('answers with a PDF named after the mark and the fingerprint, the same bytes each time', async () => {
    const [first, second] = [await postJson('/v1/sheet', exampleEnd), await postJson('/v1/sheet', exampleEnd)];
    expect(first.status).toBe(200);
    expect(first.headers.get('content-type')).toBe('application/pdf');
    expect(first.headers.get('content-disposition')).toMatch(/^inline; filename="K-207-L-[0-9a-f]{8}\.pdf"$/);
    const [bytes, again] = [Buffer.from(await first.arrayBuffer()), Buffer.from(await second.arrayBuffer())];
    expect(bytes.subarray(0, 5).toString('latin1')).toBe('%PDF-');
    expect(bytes.equals(again)).toBe(true);
  });

  test('has more pages with the workings of all checks', async () => {
    const sizes = ['/v1/sheet', '/v1/sheet?workings=all'].map(async (path) =>
      Buffer.from(await (await postJson(path, exampleEnd)).arrayBuffer())
        .toString('latin1')
        .match(/\/Type \/Page\b/g),
    );
    const [one, all] = await Promise.all(sizes);
    expect(all?.length).toBeGreaterThan(one?.length ?? 0);
  });

  test('a mark of any letters gives a file name that every header takes', async () => {
    const response = await postJson('/v1/sheet', { ...exampleEnd, mark: '"; x=\r\n../../é' });
    expect(response.status).toBe(200);
    expect(response.headers.get('content-disposition')).toMatch(/^inline; filename="x-[0-9a-f]{8}\.pdf"$/);
  });

  test('a fault is the same problem as for the check', async () => {
    const bad = { ...exampleEnd, reaction: -1 };
    const [sheet, check] = [await postJson('/v1/sheet', bad), await postJson('/v1/check', bad)];
    expect(sheet.status).toBe(422);
    expect(await sheet.json()).toEqual(await check.json());
    expect((await post('/v1/sheet', '{', 'application/json')).status).toBe(400);
    expect((await post('/v1/sheet', '{}', LINES_TYPE)).status).toBe(415);
    expect((await post('/v1/sheet', ' '.repeat(1024 * 1024 + 1))).status).toBe(413);
  });
});

describe('GET /v1/sections', () => {
  test('lists every section of the library, with sizes that an end may give as its own', async () => {
    const { families } = sectionsSchema.parse(await (await ask('/v1/sections')).json());
    expect(families.map(({ sections }) => sections.map(({ designation }) => designation))).toEqual(
      listSections().map(({ designations }) => designations),
    );
    for (const { sections, shape } of families) {
      for (const { designation, depth } of sections) {
        const found = findSection(designation);
        expect('section' in found && [found.section.family, found.section.h]).toEqual([
          shape,
          expect.closeTo(depth, 4),
        ]);
      }
    }
  });

  test('gives one family alone, and says which there are when it does not know one', async () => {
    const { families } = sectionsSchema.parse(await (await ask('/v1/sections?family=IPE')).json());
    expect(families.map(({ family }) => family)).toEqual(['IPE']);
    const response = await ask('/v1/sections?family=toString');
    expect(response.status).toBe(400);
    expect((await problemOf(response)).detail).toContain('IPE');
  });
});

test('GET /v1/standards lists every standard with its options and grades', async () => {
  const listed = standardsSchema.parse(await (await ask('/v1/standards')).json()).standards;
  expect(listed).toEqual(
    Object.values(standards).map(({ id, title, edition, level, options, materials }) => ({
      ...{ id, title, edition, level, options },
      grades: materials.sections.grades,
      plateGrades: materials.plates.grades,
      boltGrades: materials.boltGrades,
    })),
  );
});

describe('every answer', () => {
  const asks: readonly (readonly [name: string, answer: () => Promise<Response>])[] = [
    ['a report', () => postJson('/v1/check', exampleEnd)],
    ['lines', () => post('/v1/check', '{}', LINES_TYPE)],
    ['a sheet', () => postJson('/v1/sheet', exampleEnd)],
    ['sections', () => ask('/v1/sections')],
    ['standards', () => ask('/v1/standards')],
    ['the description', () => ask('/openapi.json')],
    ['a problem', () => postJson('/v1/check', {})],
    ['an unknown address', () => ask('/nowhere')],
    ['a wrong method', () => ask('/v1/check')],
  ];
  test.each(asks)('%s carries the guards against foreign code and framing', async (_, answer) => {
    const { headers } = await answer();
    const policy = headers.get('content-security-policy') ?? '';
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('unsafe');
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('referrer-policy')).toBe('no-referrer');
    expect(headers.get('cross-origin-opener-policy')).toBe('same-origin');
    expect(headers.get('cross-origin-resource-policy')).toBe('same-origin');
  });

  test('an address that is not known is a 404', async () => {
    for (const path of ['/nowhere', '/v1', '/v1/check/', '/v2/check', '/%', '/%2e%2e/package.json', '/constructor']) {
      const response = await ask(path);
      expect(response.status).toBe(404);
      await problemOf(response);
    }
  });

  test('a wrong method is a 405 that says which is right', async () => {
    for (const [path, method, allow] of [
      ['/v1/check', 'GET', 'POST'],
      ['/v1/check', 'DELETE', 'POST'],
      ['/v1/sheet', 'PUT', 'POST'],
      ['/v1/sections', 'POST', 'GET, HEAD'],
      ['/openapi.json', 'OPTIONS', 'GET, HEAD'],
    ] as const) {
      const response = await ask(path, { method });
      expect(response.status).toBe(405);
      expect(response.headers.get('allow')).toBe(allow);
      await problemOf(response);
    }
  });

  test('HEAD is answered where GET is, without a body', async () => {
    const response = await ask('/v1/standards', { method: 'HEAD' });
    expect([response.status, await response.text()]).toEqual([200, '']);
  });

  test('a query that is not known is a 400, never passed over', async () => {
    for (const path of [
      '/v1/check?workings=1',
      '/v1/check?working=yes',
      '/v1/sheet?working=1',
      '/v1/check?__proto__=1',
    ]) {
      const response = await postJson(path, exampleEnd);
      expect(response.status).toBe(400);
      await problemOf(response);
    }
  });
});

test('without the folder of a bench there is nothing but the API', async () => {
  expect((await createApp().request('/')).status).toBe(404);
});
