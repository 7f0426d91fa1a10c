import type { Beside } from '../../core/check/besideOf.ts';
import { plain } from '../../core/units/figures.ts';
import { unitOf } from '../../core/units/systems.ts';
import { RichText } from '../ladder/RichText.tsx';
import { Sign } from '../ladder/Sign.tsx';
import { shown } from '../ladder/shown.ts';
import { type VerdictLine, verdictLine } from '../ladder/verdict.ts';
import { FieldLink } from '../order/FieldLink.tsx';
import { titled } from '../state/rules.ts';
import { otherLevel, secondFaults } from '../state/secondStandard.ts';
import { besideShown } from './beside.ts';
import { secondTitle } from './second.ts';

/** Why there is no second ladder, in one line. */
const Faulty = () => {
  const [first, ...more] = secondFaults.value;
  if (!first) return null;
  return (
    <p class="beside-told">
      No second standard:{' '}
      <FieldLink path={first.path.startsWith('sheet.beside') ? first.path : 'sheet.beside.standard'} kind="value">
        {first.text.replace(/\.$/, '')}
      </FieldLink>
      {more.length > 0 && `, and ${more.length} more`}.
    </p>
  );
};

const wordsOf = ({ lead, first, spare, others }: VerdictLine): string =>
  [lead + first, spare, others].filter(Boolean).join('. ');

const reactionOf = ({ report }: Beside['examined']): string =>
  `${plain(report.reaction)} ${unitOf('0,1', report.units).name}`;

/** What the second says as a whole; strengths alone where no reaction of its level is given. */
const Words = ({ examined, stated }: Beside) => {
  const verdict = verdictLine(examined.report);
  if (!stated) {
    return (
      <p>
        <b>{secondTitle()}</b> Strengths alone: its reaction is at {otherLevel.value} level and{' '}
        <FieldLink path="sheet.beside.reaction" kind="value">
          not given
        </FieldLink>
        . <RichText text={verdict.lead + verdict.first} />.
      </p>
    );
  }
  return (
    <p>
      <Sign mark={verdict.mark} />
      <b>
        {secondTitle()} {verdict.word} {verdict.ratio}
      </b>{' '}
      {otherLevel.value && `at ${reactionOf(examined)} ${otherLevel.value}. `}
      <RichText text={wordsOf(verdict)} />
    </p>
  );
};

/** The verdict of the second said aloud, where it states one. */
export const verdictSaid = (): string => {
  const found = besideShown.value;
  if (!found?.stated) return '';
  const { word, ratio } = verdictLine(found.examined.report);
  return `Beside it ${secondTitle()}: ${word} ${ratio}`;
};

/** Which bars are whose, the verdict of the second standard in words, and what was carried over to it. */
export const BesideVerdict = () => {
  const found = besideShown.value;
  const report = found?.examined.report;
  if (!found || !report || !shown.value) return <Faulty />;
  return (
    <section class="beside" aria-label={`Beside it ${secondTitle()}`}>
      <p class="beside-key">
        <span class="key-first">upper bar {titled(shown.value.report.standard)}</span>
        <span class="key-second">lower bar {secondTitle()}</span>
      </p>
      <Words {...found} />
      {report.notes
        .filter(({ code }) => code === 'strengths-carried')
        .map(({ text }) => (
          <p key={text} class="beside-note">
            <RichText text={text} />
          </p>
        ))}
    </section>
  );
};
