import { leg } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { minus, step, times } from '../../formula/tree.ts';

/** What counts of an end plate's welds along the web, mm: its depth on the web without a leg at each end. */
export const webWeldLength = step('L_w', minus(plateOnWeb, times(2, leg)), undefined, 'without a leg at each end');
