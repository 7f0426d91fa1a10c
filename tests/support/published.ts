import { readdirSync, readFileSync } from 'node:fs';

/** One number that the program did not make, with where it comes from. */
export interface Expectation {
  readonly check: string;
  /** Part of the check, where it has several. */
  readonly of?: string;
  /** A way that need not govern, by name: the resistance of that way is compared. */
  readonly way?: string;
  /** Number of the check compared: `resistance` where absent. */
  readonly field?: 'demand' | 'resistance' | 'reactionAtFailure' | 'utilisation';
  /** Or the value of a row of its working, by symbol. */
  readonly row?: string;
  readonly value: number;
  readonly unit: string;
  readonly within: number;
  /** The sum by hand. */
  readonly sum?: string;
  /** Why the difference is allowed. */
  readonly why: string;
}

export interface PublishedFixture {
  readonly id: string;
  readonly standard: string;
  readonly standing: 'published' | 'theory' | 'hand';
  readonly source: string;
  readonly says: string;
  readonly end: unknown;
  readonly expect: readonly Expectation[];
}

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
