import { later } from './later.ts';

/** What proposes copes from the support; no part of the first view. */
export const copes = later(() => import('../copes/index.ts'));
