import '../words/furtherWords.ts';
import { aisc360Asd, aisc360Lrfd } from './aisc360/index.ts';
import { as4100 } from './as4100/index.ts';
import { csaS16 } from './csaS16/index.ts';
import { en1993, en1993Uk } from './en1993/index.ts';
import { is800 } from './is800/index.ts';
import { admit, standards } from './known.ts';
import { sans10162 } from './sans10162/index.ts';

admit(sans10162);
admit(csaS16);
admit(aisc360Lrfd, aisc360Asd);
admit(en1993, en1993Uk);
admit(as4100);
admit(is800);

/** Every design standard, by its id. */
export { standards };
