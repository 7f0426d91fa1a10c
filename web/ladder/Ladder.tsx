import type { Numbers } from '../../core/check/report.ts';
import { plain } from '../../core/units/figures.ts';
import { unitOf } from '../../core/units/systems.ts';
import { chosen } from '../state/bench.ts';
import { axisOf, shareOn } from './axis.ts';
import { besideParts } from './besideParts.ts';
import { CloseUp } from './CloseUp.tsx';
import { Heading } from './Heading.tsx';
import { Rung } from './Rung.tsx';
import { rungsOf } from './rungs.ts';
import { Scale } from './Scale.tsx';
import { shown, stale } from './shown.ts';
import { onRungKey, reached } from './touch.ts';

/** All ways of failing on one kN axis, the weakest at the foot. */
export const Ladder = () => {
  const report = shown.value?.report;
  const Beside = besideParts();
  return (
    <section class={`ladder${stale.value ? ' stale' : ''}`} aria-labelledby="ladder-heading">
      <Heading id="ladder-heading" level={2} title="Ladder">
        the end reaction at which each way fails
      </Heading>
      {Beside && <Beside.BesideVerdict />}
      {report && <Rungs report={report} />}
    </section>
  );
};

const Rungs = ({ report }: { report: Numbers }) => {
  const Beside = besideParts();
  const { rungs, unmeasured, alone } = Beside ? Beside.pairedRungs(report) : rungsOf(report);
  const { reaction, units } = report;
  const force = unitOf('0,1', units).name;
  const weakest = rungs.findLast(({ state }) => state !== 'notApplicable');
  const axis = axisOf(reaction, weakest?.reactionAtFailure ?? null);
  const all = [...rungs, ...alone, ...unmeasured];
  const first = all.find(({ id }) => id === reached.value) ?? weakest ?? all[0];
  const open = all.some(({ id }) => id === chosen.value);
  const row = (check: (typeof all)[number]) => (
    <Rung key={check.id} check={check} axis={axis} force={force} weakest={check === weakest} first={check === first} />
  );
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: the keys go from one button inside to the next.
    <div class={`rungs${open ? ' rungs-open' : ''}${Beside ? ' rungs-paired' : ''}`} onKeyDown={onRungKey}>
      <div class="rungs-head" aria-hidden="true">
        <span class="rungs-flag">
          {axis.line !== null && (
            <b style={{ left: `${100 * shareOn(axis, axis.line)}%` }}>
              <i class="symbol">V</i> = {plain(reaction)} {force}
            </b>
          )}
        </span>
        <span>{force}</span>
        <span>ratio</span>
      </div>
      <ol aria-label="Ways of failing, the weakest last">{rungs.map(row)}</ol>
      <div class="rungs-foot" aria-hidden="true">
        <Scale axis={axis} />
      </div>
      {weakest && <CloseUp weakest={weakest} reaction={reaction} force={force} />}
      {alone.length > 0 && (
        <ol class="rungs-apart" aria-label="By something other than the reaction">
          {alone.map(row)}
        </ol>
      )}
      {unmeasured.length > 0 && (
        <ol class="rungs-apart" aria-label="Refer, without a number">
          {unmeasured.map(row)}
        </ol>
      )}
    </div>
  );
};
