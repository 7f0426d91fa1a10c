import { describe, expect, test } from 'vitest';
import { markOf, ratioText } from '../../../web/ladder/standing.ts';

describe('standing of a check', () => {
  test('what holds by less than a twentieth is marked close, what is used up exactly still holds', () => {
    expect(markOf({ state: 'holds', utilisation: 0.94 })).toBe('holds');
    expect(markOf({ state: 'holds', utilisation: 0.95 })).toBe('close');
    expect(markOf({ state: 'holds', utilisation: 1 })).toBe('close');
  });

  test('what fails or refers is never marked by its number', () => {
    expect(markOf({ state: 'fails', utilisation: 1.001 })).toBe('fails');
    expect(markOf({ state: 'refer', utilisation: 0.97 })).toBe('refer');
  });

  test('what has no verdict has no sign', () => {
    expect(markOf({ state: 'information', utilisation: 0.5 })).toBeNull();
    expect(markOf({ state: 'notApplicable', utilisation: null })).toBeNull();
  });

  test('a ratio just above one never reads as one, and one without bound is said to have none', () => {
    expect(ratioText({ state: 'fails', utilisation: 1.0001 })).toBe('1.01');
    expect(ratioText({ state: 'fails', utilisation: null })).toBe('∞');
    expect(ratioText({ state: 'refer', utilisation: null })).toBe('–');
  });
});
