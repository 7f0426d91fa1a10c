import { copeLimits, intactFlange, oneColumn } from '../../end/gates.ts';
import { at, flag, mTop, tw, V } from '../../end/given.ts';
import { type Block, block, plateBlock as plate } from '../../end/tearPaths.ts';
import { atMost, type Condition, constant, least, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { clause } from './clauses.ts';
import { Fu, Fup, Fy, Fyp } from './given.ts';
import { type Method, rupture } from './method.ts';
import { endUsed } from './webEnd.ts';

const source = clause('J4.3, J4-5');
const noArea = constant('0', 0, '2,0');
const noForce = constant('0', 0, '0,1');
const uniform = constant('1.0', 1);

/** 1 where the tension plane is pulled evenly: along one bolt column. */
export const evenness = (oneColumnOnly: Condition) =>
  step('U_bs', pick([[oneColumnOnly, uniform]], constant('0.5', 0.5)), source, 'one column 1.0, more 0.5');

/** Block shear J4-5, N: nothing where the holes leave no net area in shear or in tension. */
export const blockForce = (
  { Agv, Anv, Ant }: Block,
  Fy: Tree<Stress>,
  Fu: Tree<Stress>,
  Ubs: Tree<'0,0'> = uniform,
): Tree<Force> =>
  step(
    'R_n',
    pick(
      [[atMost(least(Anv, Ant), noArea), noForce]],
      plus(least(times(0.6, Fu, Anv), times(0.6, Fy, Agv)), times(Ubs, Fu, Ant)),
    ),
    source,
  );

const oneInside = flag('', (f) => f.mTop <= 1, 'one column inside the cope');
const webForce = blockForce(block(tw, at, endUsed, mTop), Fy, Fu, evenness(oneInside));
const plateForce = blockForce(plate, Fyp, Fup, evenness(oneColumn));

/** Block of the coped web, columns inside the cope; end distance less the underrun. */
export const webBlock = ({ available }: Method): StrengthRule => ({
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: available(webForce, rupture, source),
      off: [intactFlange],
      limits: copeLimits,
    },
  ],
});

export const plateBlock = ({ available }: Method): StrengthRule => ({
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: available(plateForce, rupture, source) }],
});
