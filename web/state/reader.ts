import { readEnd } from '../../core/end/readEnd.ts';
import { faultSentences } from '../../core/words/faults.ts';
import { admitReader } from './readEnd.ts';

admitReader(readEnd, faultSentences);
