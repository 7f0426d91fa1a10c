import type { Check } from '../../core/check/report.ts';
import { RichText } from './RichText.tsx';
import { inSentence } from './rungs.ts';

/** The checks that do not apply, each with its reason, in one line; those with the same reason together. */
export const NotApplicable = ({ checks }: { checks: readonly Check[] }) => {
  if (checks.length === 0) return null;
  const byReason = new Map<string, string[]>();
  for (const check of checks) {
    const reason = check.reasonText ?? '';
    byReason.set(reason, [...(byReason.get(reason) ?? []), inSentence(check.title)]);
  }
  return (
    <p class="not-applicable">
      <span>Not applicable: </span>
      {[...byReason].map(([reason, names], at) => (
        <>
          {at > 0 && '; '}
          {names.join(', ')}
          {reason && (
            <>
              {' ('}
              <RichText text={reason} />)
            </>
          )}
        </>
      ))}
      .
    </p>
  );
};
