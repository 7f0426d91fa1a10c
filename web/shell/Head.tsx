import { Verdict } from '../ladder/index.ts';
import { FieldLink } from '../order/FieldLink.tsx';
import { entry, listing } from '../state/bench.ts';
import { carried } from '../state/carried.ts';
import { textOf } from '../state/entry.ts';
import { titled } from '../state/rules.ts';
import { beginEmpty } from './beginEmpty.ts';

/** Longer marks are set smaller, so that they stay on their line. */
const LONG = 9;

const Mark = () => {
  const mark = textOf(entry.value, 'mark');
  return (
    <h1 class={`bench-mark${mark.length > LONG ? ' long' : ''}`}>
      <FieldLink path="mark" kind="plain">
        {mark || 'End'}
      </FieldLink>
    </h1>
  );
};

const Job = () => {
  const job = textOf(entry.value, 'sheet.job');
  const known = listing.value;
  return (
    <div class="bench-job">
      <p class="job-name">
        <FieldLink path="sheet.job" kind="plain">
          {job || 'No job named'}
        </FieldLink>
      </p>
      <p class="job-line">
        <FieldLink path="standard" kind="value">
          {known ? titled(known) : textOf(entry.value, 'standard') || 'standard?'}
        </FieldLink>
        <button type="button" class="button" onClick={() => void carried(({ issueSheet }) => issueSheet())}>
          Issue sheet
        </button>
        {job.endsWith('(demo)') && (
          <span class="demo">
            An invented end:{' '}
            <button type="button" class="inline-button" onClick={beginEmpty}>
              begin your own
            </button>
          </span>
        )}
      </p>
    </div>
  );
};

/** Mark, job and verdict in one line over the three columns. */
export const Head = () => (
  <div class="bench-head">
    <Mark />
    <Job />
    <div class="bench-verdict">
      <Verdict />
    </div>
  </div>
);
