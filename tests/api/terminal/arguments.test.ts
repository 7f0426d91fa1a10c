import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readArguments } from '../../../api/terminal/arguments.ts';

const sentenceOf = (...args: string[]): string => {
  const asked = readArguments(args);
  return 'sentence' in asked ? asked.sentence : '';
};

describe('the arguments of the command line', () => {
  test('options stand before or after the file', () => {
    const wanted = { command: 'check', file: 'a.json', flags: new Set(['json']), values: {} };
    expect(readArguments(['check', 'a.json', '--json'])).toEqual(wanted);
    expect(readArguments(['check', '--json', 'a.json'])).toEqual(wanted);
  });

  test('a value follows its option, with a blank or an equals sign', () => {
    for (const args of [['-o', 'x.pdf'], ['--output', 'x.pdf'], ['--output=x.pdf'], ['-ox.pdf']]) {
      expect(readArguments(['sheet', 'a.json', ...args])).toMatchObject({
        file: 'a.json',
        values: { output: 'x.pdf' },
      });
    }
  });

  test('- is a file', () => {
    expect(readArguments(['check', '-'])).toMatchObject({ file: '-' });
  });

  test('help is given wherever it is asked for', () => {
    for (const args of [['help'], ['--help'], ['-h'], ['check', '--help'], ['check', '-h'], []]) {
      expect(readArguments(args)).toMatchObject({ command: 'help' });
    }
  });

  test('what is not known is named with the nearest that is', () => {
    expect(sentenceOf('shet')).toBe('shet is not known here; nearest: sheet.');
    expect(sentenceOf('serve', '--prot', '1')).toBe('--prot is not known here; nearest: --port.');
    expect(sentenceOf('check', '--constructor')).toContain('is not known here');
    expect(sentenceOf('toString')).toContain('is not known here');
  });

  test('a value too many or too few is named', () => {
    expect(sentenceOf('check', '--json=yes', 'a.json')).toBe('--json takes no value.');
    expect(sentenceOf('serve', '--port')).toBe('--port needs a value.');
    expect(sentenceOf('check', 'a.json', 'b.json')).toBe('b.json is one too many; check takes one file.');
    expect(sentenceOf('serve', 'a.json')).toBe('a.json is one too many; serve takes no file.');
  });

  test('no arguments whatever make it throw', () => {
    const word = fc.oneof(
      fc.string(),
      fc.constantFrom('check', 'sheet', 'serve', 'help', '-', '--', '-o', '--json', '--port', '--no-json', '--=', '-'),
    );
    fc.assert(
      fc.property(fc.array(word), (args) => void readArguments(args)),
      { numRuns: 1000 },
    );
  });
});
