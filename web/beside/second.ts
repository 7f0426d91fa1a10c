import type { Beside } from '../../core/check/besideOf.ts';
import type { Check } from '../../core/check/report.ts';
import type { CheckName } from '../../core/end/checkNames.ts';
import { titled } from '../state/rules.ts';
import { besideShown } from './beside.ts';

/** Says something by the second standard: it is no stress for information only. */
const speaks = ({ id, state }: Check): boolean =>
  state !== 'notApplicable' && !(id.startsWith('stress-') && state === 'information');

const all = ({ examined }: Beside): readonly Check[] => examined.report.checks;

/** The checks that say something by the second standard. */
export const secondChecks = (): readonly Check[] => (besideShown.value ? all(besideShown.value).filter(speaks) : []);

/** A check by the second standard, whether it applies or not. */
export const secondOf = (id: CheckName): Check | undefined =>
  besideShown.value ? all(besideShown.value).find((one) => one.id === id) : undefined;

/** The way of failing that comes first by the second standard. */
export const secondWeakest = (): CheckName | undefined =>
  secondChecks().find(({ id, reactionAtFailure }) => !id.startsWith('fit-') && typeof reactionAtFailure === 'number')
    ?.id;

/** Name of the second standard with its edition. */
export const secondTitle = (): string => (besideShown.value ? titled(besideShown.value.examined.report.standard) : '');
