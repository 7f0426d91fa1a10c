/// <reference types="vite/client" />
import type { Example } from '../../core/check/proof.ts';

const files = import.meta.glob<Example>('../../fixtures/published/*.json', { eager: true, import: 'default' });

/** Every example with numbers from outside that the tests hold the program to. */
export const examples: readonly Example[] = Object.values(files);
