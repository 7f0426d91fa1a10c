import { secondId } from '../state/secondStandard.ts';
import { laterPart } from '../style/laterPart.ts';

const parts = laterPart(() => import('../beside/index.ts'));

/** What shows a second standard beside the first, once one is asked for and its parts are there; they are no part of the first view. */
export const besideParts = (): typeof import('../beside/index.ts') | null => (secondId.value ? parts.value : null);
