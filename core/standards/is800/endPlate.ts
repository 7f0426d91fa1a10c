import { fullDepthPlate } from '../../end/gates.ts';
import { tw, V } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { fyw, yieldShear } from './given.ts';
import { shear as source, Vd } from './plate.ts';

const inShear = (resistance: Tree<Force>): StrengthRule => ({
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance, limits: [fullDepthPlate] }],
});

/** Shear of the end plate beside the web, on both sides of it, IS 800:2007 cl. 8.4.1. */
export const endPlateGrossShear: StrengthRule = inShear(step('ΣV_d', times(2, Vd), source));

/** Shear of the beam's web beside the weld, over the plate's depth. */
export const endPlateWebShear: StrengthRule = inShear(step('V_d', yieldShear(times(plateOnWeb, tw), fyw), source));
