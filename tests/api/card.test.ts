import { describe, expect, test } from 'vitest';
import { cardRequestSchema, cardSchema } from '../../api/http/cardSchema.ts';
import { problemSchema } from '../../api/http/schemas.ts';
import { ask, post, postJson } from './ask.ts';
import { exampleEnd } from './exampleEnd.ts';
import { accepts, type JsonSchema } from './jsonSchema.ts';

const request = { end: exampleEnd, sections: ['UB 406x178x60', 'UB 457x191x67', 'UB 127x76x13'], rows: [2, 3, 4] };

describe('POST /v1/card', () => {
  test('answers with a PDF named after the fingerprint, the same bytes each time', async () => {
    const [first, second] = [await postJson('/v1/card', request), await postJson('/v1/card?as=pdf', request)];
    expect(first.status).toBe(200);
    expect(first.headers.get('content-type')).toBe('application/pdf');
    const { fingerprint } = await (await postJson('/v1/card?as=json', request)).json();
    expect(first.headers.get('content-disposition')).toContain(`shop-card-${fingerprint}.pdf`);
    const [one, other] = [await first.arrayBuffer(), await second.arrayBuffer()].map((bytes) => Buffer.from(bytes));
    expect(one!.subarray(0, 5).toString()).toBe('%PDF-');
    expect(one!.equals(other!)).toBe(true);
  });

  test('answers with the table where that is asked for, as it is described', async () => {
    const card = await (await postJson('/v1/card?as=json', request)).json();
    expect(cardSchema.parse(card)).toEqual(card);
    expect(card.sections[0]).toMatchObject({
      section: 'UB 406x178x60',
      cells: [{ verdict: 'refer' }, { verdict: 'holds', reaction: 170, governing: 'bolt-shear' }, { verdict: 'holds' }],
    });
    const description = await (await ask('/openapi.json')).json();
    const named = (name: string): JsonSchema => ({ $ref: `#/components/schemas/${name}` });
    expect(accepts(named('Card'), card, description)).toBe(true);
    const { content } = description.paths['/v1/card'].post.requestBody;
    const { example } = content['application/json'];
    expect(accepts(named('CardRequest'), example, description)).toBe(true);
    expect((await postJson('/v1/card', example)).status).toBe(200);
  });

  test('refuses what its description refuses, by the name of the fault', async () => {
    const wrong: [unknown, string][] = [
      [{ ...request, rows: [0] }, 'row-count'],
      [{ ...request, rows: [] }, 'count-outside'],
      [{ ...request, rows: '2-8' }, 'wrong-kind'],
      [{ ...request, sections: [] }, 'count-outside'],
      [{ ...request, sections: 'UB 406x178x60' }, 'wrong-kind'],
      [{ ...request, surplus: 1 }, 'unknown-card-field'],
      [{ sections: request.sections }, 'missing'],
      [exampleEnd, 'missing'],
      [[], 'not-a-card'],
    ];
    for (const [body, code] of wrong) {
      expect(cardRequestSchema.safeParse(body).success).toBe(false);
      const response = await postJson('/v1/card', body);
      expect(response.status, code).toBe(422);
      const problem = problemSchema.parse(await response.json());
      expect(problem.faults?.map((one) => one.code)).toContain(code);
    }
  });

  test('refuses an unknown family or section with the nearest names, and a card with nothing to print', async () => {
    const detail = async (body: unknown): Promise<string> => (await (await postJson('/v1/card', body)).json()).detail;
    expect(await detail({ end: exampleEnd, family: 'UBB' })).toMatch(/UBB is not in the library; nearest: UB/);
    expect(await detail({ end: exampleEnd, sections: ['UB 406x178x61'] })).toContain('nearest: UB 406x178x60');
    expect(await detail({ end: { ...exampleEnd, tie: 9000 }, family: 'UB' })).toContain('No section of the list');
  });

  test('a body that is no JSON is a 400, one too large a 413, another question a 400', async () => {
    expect((await post('/v1/card', '{')).status).toBe(400);
    expect((await post('/v1/card', ' '.repeat(1024 * 1024 + 1))).status).toBe(413);
    expect((await postJson('/v1/card?as=html', request)).status).toBe(400);
  });
});
