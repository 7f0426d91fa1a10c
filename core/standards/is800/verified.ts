import type { Standard } from '../standard.ts';

/** How far each check is verified, generated from fixtures/published by `npm run generate`. */
export const verified: Standard['verified'] = {};
