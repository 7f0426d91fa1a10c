import { describe, expect, test } from 'vitest';
import { isRead, readQuantity } from '../../../core/units/readQuantity.ts';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { faultSentences } from '../../../core/words/faults.ts';
import { faultText } from '../../../core/words/words.ts';

const said = (text: string): string => {
  const reading = readQuantity(text, '1,0', 'mm-kN');
  if (isRead(reading)) throw new Error(`${text} was read`);
  return faultText(commonwealth, faultSentences, { ...reading, path: 'joint.bolts.pitch' });
};

describe('sentences of faults', () => {
  test('what cannot be read in a field is said with the field, what stands there and what may', () => {
    expect(said('seventy')).toBe('Pitch must be a number; seventy is none.');
    expect(said('70 stone')).toMatch(/^Pitch: the unit in .*stone.* is not known\. Known here: /);
    expect(said('70 kN')).toMatch(/^Pitch: .*70 kN.* has a unit of another kind\. Known here: /);
    expect(said('1/2')).toMatch(/^Pitch: 1\/2 of what\? Write one of these: /);
    expect(said('1,234')).toMatch(/^Pitch: 1,234 can be read two ways\. Write one of these: /);
  });

  test('no sentence leaves a place unfilled', () => {
    for (const code of Object.keys(faultSentences)) {
      const text = faultText(commonwealth, faultSentences, { code, path: 'setback', given: 'this', limit: 'that' });
      expect(text).not.toMatch(/[{}]|undefined/);
      expect(text).toMatch(/^[A-Z].*\.$/);
    }
  });
});
