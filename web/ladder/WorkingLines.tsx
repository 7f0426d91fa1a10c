import { RichText } from './RichText.tsx';
import type { WorkingLine } from './workingLines.ts';

const Line = ({ symbol, expression, numbers, value, unit, clause, note, result }: WorkingLine) => {
  const Value = result ? 'b' : 'span';
  return (
    <li>
      <span class="working-symbol">
        <RichText text={symbol} manner="formula" />
      </span>
      <span class="working-terms">
        {expression && (
          <span class="term">
            {'= '}
            <RichText text={expression} manner="formula" />{' '}
          </span>
        )}
        <span class="term">
          {numbers && `= ${numbers} `}
          {'= '}
          <Value class="working-value">{unit ? `${value} ${unit}` : value}</Value>
          {clause && <span class="working-clause"> {clause}</span>}
        </span>
        {note && (
          <span class="working-note">
            <RichText text={note} />
          </span>
        )}
      </span>
    </li>
  );
};

/** A working, set line by line. */
export const WorkingLines = ({ lines }: { readonly lines: readonly WorkingLine[] }) => (
  <ol class="working-lines">
    {lines.map((one, at) => (
      <Line key={at} {...one} />
    ))}
  </ol>
);
