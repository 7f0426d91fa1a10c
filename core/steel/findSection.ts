import { admit } from './knownSections.ts';
import { aiscW } from './sections/aiscW.ts';
import { auPfc } from './sections/auPfc.ts';
import { auUb } from './sections/auUb.ts';
import { auUc } from './sections/auUc.ts';
import { hea } from './sections/hea.ts';
import { heb } from './sections/heb.ts';
import { hem } from './sections/hem.ts';
import { ipe } from './sections/ipe.ts';
import { ipeA } from './sections/ipeA.ts';
import { ipeO } from './sections/ipeO.ts';
import { ismb } from './sections/ismb.ts';
import { ismb1989 } from './sections/ismb1989.ts';
import { pfc } from './sections/pfc.ts';
import { ub } from './sections/ub.ts';
import { uc } from './sections/uc.ts';
import { upe } from './sections/upe.ts';

admit(ub, uc, pfc, ipe, ipeA, ipeO, hea, heb, hem, upe, aiscW, auUb, auUc, auPfc, ismb, ismb1989);

/** Looking sections up with every family of the library at hand. */
export { findSection, listSections } from './knownSections.ts';
