import type { Region } from '../words/regions.ts';

/** What is told of a design standard before its rules are at hand. */
export interface Listed {
  readonly id: string;
  readonly title: string;
  readonly edition: string;
  /** The level at which the reaction is given. */
  readonly level: 'factored' | 'service';
  /** Whose trade words it speaks. */
  readonly region: Region;
  /** How its trade draws the symbols of welds: ISO 2553, or AWS A2.4 and what is like it (AS 1101.3). */
  readonly weldSymbols: 'iso' | 'aws';
}

const entry = <Id extends string>(
  id: Id,
  title: string,
  edition: string,
  level: Listed['level'],
  region: Region,
  weldSymbols: Listed['weldSymbols'],
): Listed & { readonly id: Id } => ({ id, title, edition, level, region, weldSymbols });

/** Every design standard that an end can name, in the order of the lists. */
export const listed = [
  entry('sans-10162-1', 'SANS 10162-1', '2011', 'factored', 'commonwealth', 'iso'),
  entry('csa-s16', 'CSA S16', '2019', 'factored', 'north-america', 'aws'),
  entry('aisc-360-lrfd', 'ANSI/AISC 360, LRFD', '2022', 'factored', 'north-america', 'aws'),
  entry('aisc-360-asd', 'ANSI/AISC 360, ASD', '2022', 'service', 'north-america', 'aws'),
  entry('en-1993', 'EN 1993-1-8, recommended values', '2005', 'factored', 'commonwealth', 'iso'),
  entry('en-1993-uk', 'EN 1993-1-8, UK National Annex', '2005', 'factored', 'commonwealth', 'iso'),
  entry('as-4100', 'AS 4100', '2020', 'factored', 'commonwealth', 'aws'),
  entry('is-800', 'IS 800', '2007', 'factored', 'commonwealth', 'iso'),
] as const;

export type StandardId = (typeof listed)[number]['id'];

/** What is listed of a standard. */
export const listedOf = (id: StandardId): Listed => listed.find((one) => one.id === id)!;
