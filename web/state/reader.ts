import { copeFaults, patternFaults, sectionFaults } from '../../core/end/geometryFaults.ts';
import { fittingFaults, holeFaults } from '../../core/end/holeFaults.ts';
import { readEnd } from '../../core/end/readEnd.ts';
import { faultSentences } from '../../core/words/faults.ts';
import { admitReader } from './readEnd.ts';

admitReader({ readEnd, sectionFaults, copeFaults, patternFaults, holeFaults, fittingFaults }, faultSentences);
