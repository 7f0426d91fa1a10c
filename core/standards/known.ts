import type { Standard } from './standard.ts';

/** The standards at hand, by id: all of them behind the doors of core/check, on the bench those that were loaded. */
export const standards: Readonly<Record<string, Standard>> = {};

/** Puts standards at hand. */
export const admit = (...all: readonly Standard[]): void => {
  for (const one of all) (standards as Record<string, Standard>)[one.id] = one;
};
