import { step, times } from '../../formula/tree.ts';
import { elasticStress } from '../methods/elasticStress.ts';
import { phi } from './factors.ts';
import { Fy } from './given.ts';

const source = { clause: '13.4 rational', basis: 'memory' } as const;

/** Elastic shear stress, held to 0.66 φ F_y where option `elastic-shear: verdict` asks for it. */
export const { stressFull, stressCope } = elasticStress(source, step('τ_r', times(0.66, phi, Fy), source));
