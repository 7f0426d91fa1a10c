import { sans10162 } from './sans10162/index.ts';
import type { Standard } from './standard.ts';

/** Every design standard, by its id. */
export const standards: Readonly<Record<string, Standard>> = { [sans10162.id]: sans10162 };
