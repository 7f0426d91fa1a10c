import { admit, standards } from './known.ts';
import { sans10162 } from './sans10162/index.ts';

admit(sans10162);

/** Every design standard, by its id. */
export { standards };
