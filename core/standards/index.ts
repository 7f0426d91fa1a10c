import { aisc360Asd, aisc360Lrfd } from './aisc360/index.ts';
import { as4100 } from './as4100/index.ts';
import { csaS16 } from './csaS16/index.ts';
import { admit, standards } from './known.ts';
import { sans10162 } from './sans10162/index.ts';

admit(sans10162);
admit(csaS16);
admit(aisc360Lrfd, aisc360Asd);
admit(as4100);

/** Every design standard, by its id. */
export { standards };
