import type { Standard } from '../standard.ts';

export const verified: Standard['verified'] = {};
