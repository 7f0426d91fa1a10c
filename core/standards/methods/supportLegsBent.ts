import type { Limit } from '../../end/gates.ts';
import { cleats } from './kinds.ts';

/** A tie force bends the support legs of cleats open and pulls at their bolts: no formula here, so that what would hold refers. */
export const supportLegsBent: Limit = { when: cleats, reason: 'tie-bends-legs', always: false };
