import type { CheckName } from '../../core/end/checkNames.ts';
import { Sign } from '../ladder/Sign.tsx';
import { Sizes } from '../ladder/Sizes.tsx';
import { markOf } from '../ladder/standing.ts';
import { secondOf, secondTitle } from './second.ts';

/** What the second standard asks of a size, behind what the first does. */
export const RuleSizes = ({ id }: { readonly id: CheckName }) => {
  const check = secondOf(id);
  if (!check) return null;
  return (
    <span class="rule-second">
      <span class="unseen">{` and by ${secondTitle()} `}</span>
      <Sign mark={markOf(check)} />
      {check.state === 'notApplicable' ? <span class="rule-sizes">no rule</span> : <Sizes check={check} />}
    </span>
  );
};
