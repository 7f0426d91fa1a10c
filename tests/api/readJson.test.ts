import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readJson } from '../../api/readJson.ts';

const read = (text: string) => readJson(new TextEncoder().encode(text));
const faultOf = (text: string) => {
  const found = read(text);
  return 'fault' in found ? { code: found.fault.code, path: found.fault.path } : 'read';
};

describe('JSON text', () => {
  test('is read as JSON.parse reads it', () => {
    fc.assert(
      fc.property(fc.json(), (text) => {
        const wanted: unknown = JSON.parse(text);
        const found = read(text);
        if (!text.includes('__proto__') && !/(?<![.\d])\d{13}|e[+-]|0\.0{8}/.test(text))
          expect(found).toEqual({ value: wanted });
      }),
      { numRuns: 1000 },
    );
  });

  test('with a name given twice is refused at that name, wherever it stands', () => {
    expect(faultOf('{"reaction":165,"mark":"A","reaction":16.5}')).toEqual({
      code: 'repeated-field',
      path: 'reaction',
    });
    expect(faultOf('{"a":1,"b":{"c":[{"d":1},{"d":1,"d":1}]}}')).toEqual({ code: 'repeated-field', path: 'b.c.d' });
    expect(faultOf('{"a":{"x":1},"b":{"x":1}}')).toBe('read');
    expect(faultOf('[{"a":1},{"a":1}]')).toBe('read');
  });

  test('knows a name again however it is escaped, and takes no string for a name', () => {
    expect(faultOf('{"a":1,"\\u0061":1}')).toEqual({ code: 'repeated-field', path: 'a' });
    expect(faultOf('{"a":"\\"a\\":","b":"{\\"a\\":1,\\"a\\":2}"}')).toBe('read');
    expect(faultOf('{"\\"":1,"\\\\":2,":":3,",":4}')).toBe('read');
    expect(faultOf('{"{":1,"}":2,"{":3}')).toEqual({ code: 'repeated-field', path: '{' });
  });

  test('with a name that validators pass over is refused', () => {
    expect(faultOf('{"options":{"__proto__":"x"}}')).toEqual({ code: 'unknown-field', path: 'options.__proto__' });
    expect(faultOf('{"\\u005f_proto__":{}}')).toEqual({ code: 'unknown-field', path: '__proto__' });
    expect(faultOf('{"mark":"__proto__"}')).toBe('read');
  });

  test('with a number past all bounds is refused at that number', () => {
    expect(faultOf('{"joint":{"bolts":{"pitch":1e13}}}')).toEqual({ code: 'too-big', path: 'joint.bolts.pitch' });
    expect(faultOf('{"reaction":-1e999}')).toEqual({ code: 'too-big', path: 'reaction' });
    expect(faultOf('{"setback":1e-320}')).toEqual({ code: 'too-small', path: 'setback' });
    expect(faultOf('{"mark":"1e999","reaction":1e12,"setback":0,"tie":-0.0,"quantity":1e-9}')).toBe('read');
    expect(faultOf('1e13')).toEqual({ code: 'too-big', path: '' });
  });

  test('that is none is named so, and shown only in part', () => {
    expect(read(`{${'x'.repeat(100)}`)).toMatchObject({ fault: { code: 'not-json', given: `{${'x'.repeat(39)}…` } });
    expect(faultOf(' \n')).toEqual({ code: 'not-an-end', path: '' });
    expect(readJson(new Uint8Array([0xc3, 0x28]))).toMatchObject({ fault: { code: 'not-json' } });
  });

  test('any text whatever is read or refused, never thrown at', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary' }), (text) => void read(text)));
    const letters = fc.string({ unit: fc.constantFrom(...'{}[],:"\\a1e9 ') });
    fc.assert(
      fc.property(letters, (text) => void read(text)),
      { numRuns: 3000 },
    );
  });
});
