import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { goldenDrawings } from './goldenDrawings.ts';

const kept = (name: string): string =>
  readFileSync(new URL(`../../../fixtures/golden/${name}.svg`, import.meta.url), 'utf8');

describe('the kept drawings', () => {
  it.each([...goldenDrawings()])('%s is drawn as it was looked at', (name, svg) => {
    expect(svg).toBe(kept(name));
  });
});
