import { fullDepthPlate } from '../../end/gates.ts';
import { tw, V } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { fyw } from './given.ts';
import { Vc } from './plate.ts';

const source = { clause: '5.11.3', basis: 'seen' } as const;

const inShear = (resistance: Tree<Force>): StrengthRule => ({
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance, limits: [fullDepthPlate] }],
});

/** Shear of the end plate beside the web, on both sides of it, AS 4100:2020 cl. 5.11.3. */
export const endPlateGrossShear: StrengthRule = inShear(step('ΣφV_c', times(2, Vc), source));

/** Shear of the beam's web beside the weld, over the plate's depth, as a rectangle. */
export const endPlateWebShear: StrengthRule = inShear(
  step('φV_c', times(0.5, phi, fyw, tw, plateOnWeb), source, 'rectangle: greatest 1.5 times the mean'),
);
