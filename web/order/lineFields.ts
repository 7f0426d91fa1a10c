import type { ComponentType } from 'preact';
import type { LineName } from '../state/tradeOrder.ts';
import { BeamFields } from './BeamFields.tsx';
import { BoltsFields } from './BoltsFields.tsx';
import { CutFields } from './CutFields.tsx';
import { JointFields } from './JointFields.tsx';
import { LoadFields } from './LoadFields.tsx';
import { SheetFields } from './SheetFields.tsx';
import { StandardFields } from './StandardFields.tsx';

/** The fields of each line of the order. */
export const lineFields: Readonly<Record<LineName, ComponentType>> = {
  beam: BeamFields,
  cut: CutFields,
  bolts: BoltsFields,
  joint: JointFields,
  load: LoadFields,
  standard: StandardFields,
  sheet: SheetFields,
};
