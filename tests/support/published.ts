import { readdirSync, readFileSync } from 'node:fs';
import type { Example } from '../../core/check/proof.ts';

export type PublishedFixture = Example;

const readAll = <T>(folder: string): [name: string, value: T][] => {
  const place = new URL(`../../fixtures/${folder}/`, import.meta.url);
  return readdirSync(place)
    .filter((file) => file.endsWith('.json'))
    .sort()
    .map((file) => [file.slice(0, -5), JSON.parse(readFileSync(new URL(file, place), 'utf8')) as T]);
};

export const publishedFixtures = (): PublishedFixture[] =>
  readAll<PublishedFixture>('published').map(([, fixture]) => fixture);

/** Ends that are good, by name. */
export const goodEnds = (): { name: string; end: Record<string, unknown> }[] =>
  readAll<Record<string, unknown>>('input/good').map(([name, end]) => ({ name, end }));

interface Refused {
  readonly name: string;
  readonly end: unknown;
  readonly faults: readonly { readonly code: string; readonly path: string }[];
}

/** Ends that are bad, with the faults they must give. */
export const badEnds = (): Refused[] => readAll<Refused>('input/bad').map(([, refused]) => refused);
