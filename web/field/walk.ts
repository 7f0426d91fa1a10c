import { confirm } from '../state/edits.ts';

/** Sent by a field when Enter is pressed in the last (or, going back, the first) field of its region. */
export const WALK_END = 'walk-end';

export interface WalkEnd {
  readonly back: boolean;
}

const reachable = (region: Element): HTMLElement[] =>
  [...region.querySelectorAll<HTMLElement>('[data-field]:not([disabled])')].filter((it) => it.offsetParent !== null);

/**
 * Enter in a field takes its value over, if the bench put it in, and focuses the next field of the region that it stands in; at its end the
 * region decides. `back` only goes to the field before.
 */
export const walk = (from: HTMLElement, back: boolean): void => {
  if (!back && from.dataset.field !== undefined) confirm([from.dataset.field]);
  const region = from.closest('[data-walk]') ?? document.body;
  const fields = reachable(region);
  const next = fields[fields.indexOf(from) + (back ? -1 : 1)];
  if (next) next.focus();
  else region.dispatchEvent(new CustomEvent<WalkEnd>(WALK_END, { bubbles: true, detail: { back } }));
};

/** Focuses the first or last field of a region. */
export const enter = (region: Element, back = false): void =>
  reachable(region)
    .at(back ? -1 : 0)
    ?.focus();
