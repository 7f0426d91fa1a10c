import { computed } from '@preact/signals';
import { useEffect, useRef } from 'preact/hooks';
import type { Numbers } from '../../core/check/report.ts';
import { unitOf } from '../../core/units/systems.ts';
import { Heading } from '../ladder/Heading.tsx';
import { OpenWorking } from '../ladder/OpenWorking.tsx';
import { shown, stale } from '../ladder/shown.ts';
import { type Figure, figure, spoken, topOf } from '../piece/figure.ts';
import { TITLE } from '../piece/fitRoom.ts';
import { chosen } from '../state/bench.ts';
import { ProfileDrawn } from './ProfileDrawn.tsx';
import { ProfileCaption, ProfileName } from './ProfileWords.tsx';
import { profilesOf, reachOf } from './profile.ts';
import { GAP, isBeside, LEAST, LEFT, measureShared, profileWidth, shared } from './shared.ts';

/** Room for a name over a profile, px. */
const NAME = 24;

const titleOver = ({ views }: Figure): number => (views.length > 1 ? TITLE : 0);

const profiles = computed(() => (shown.value && spoken.value ? profilesOf(shown.value, spoken.value) : []));

/** Elastic shear stress over the depth of the full and the cut section, on the levels of the piece; for information. */
export const Stress = () => {
  const section = useRef<HTMLElement>(null);
  useEffect(() => (section.current ? measureShared(section.current) : undefined), []);
  const it = figure.value;
  const report = shown.value?.report;
  const open = profiles.value.find(({ check }) => check && check.id === chosen.value)?.check;
  return (
    <>
      <section
        ref={section}
        class={`stress${isBeside(profiles.value.length) ? ' stress-beside' : ''}${stale.value ? ' stale' : ''}`}
        aria-labelledby="stress-heading"
      >
        <Heading id="stress-heading" level={2} title="Stress">
          {report && (
            <>
              <i class="symbol">V Q</i>/(<i class="symbol">I t</i>), {unitOf('-2,1', report.units).name}
            </>
          )}
        </Heading>
        {it && report && shared.value >= LEAST && <Profiles it={it} report={report} />}
      </section>
      {open && (
        <div class="stress-working">
          <OpenWorking check={open} labelledBy={`rung-${open.id}`} />
        </div>
      )}
    </>
  );
};

/** An option makes the elastic stress a way of failing: then it has its rungs. */
const isJudged = ({ checks }: Numbers): boolean =>
  checks.some(({ id, state }) => id === 'stress-full' && state !== 'information');

const Profiles = ({ it, report }: { it: Figure; report: Numbers }) => {
  const all = profiles.value;
  const count = all.length;
  const beside = isBeside(count);
  const column = profileWidth(count);
  const scale = it.scale * it.shrink;
  const reach = reachOf(all);
  // Beside the piece the levels stand where they stand on the piece; below it the air over top of steel is left out.
  const above = beside ? titleOver(it) - topOf(it) * scale : NAME;
  const deepest = Math.max(...all.map(({ bottom }) => bottom));
  const y = (level: number): number => above + level * scale;
  const leftOf = (at: number): number => LEFT + at * (column + GAP);
  const width = leftOf(count) - GAP;
  return (
    <div class="profiles" style={{ width: `${width}px` }}>
      <svg
        width={width}
        height={Math.ceil(y(deepest) + 6)}
        role="img"
        aria-label="Shear stress over the depth"
        aria-describedby="stress-sentences"
      >
        {all.map((profile, at) => (
          <ProfileDrawn profile={profile} left={leftOf(at)} width={column} reach={reach} y={y} />
        ))}
      </svg>
      {all.map((profile, at) => (
        <ProfileName profile={profile} left={leftOf(at)} top={above - NAME} width={column} />
      ))}
      <div class="profile-captions" id="stress-sentences" style={{ paddingLeft: `${LEFT}px`, gap: `${GAP}px` }}>
        {all.map((profile) => (
          <ProfileCaption profile={profile} width={column} />
        ))}
      </div>
      <p class="profile-note">{isJudged(report) ? 'judged on the ladder' : 'information, no verdict'}</p>
    </div>
  );
};
