import type { CheckName } from '../../core/end/checkNames.ts';
import { OpenWorking } from '../ladder/OpenWorking.tsx';
import { besideShown } from './beside.ts';
import { secondOf, secondTitle } from './second.ts';

/** How the second standard comes to its number. */
export const SecondWorking = ({ id }: { readonly id: CheckName }) => {
  const check = secondOf(id);
  if (!check || check.state === 'notApplicable') return null;
  return <OpenWorking check={check} of={besideShown.value!.examined} under={secondTitle()} labelledBy={`rung-${id}`} />;
};
