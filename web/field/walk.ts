/** Sent by a field when Enter is pressed in the last (or, going back, the first) field of its region. */
export const WALK_END = 'walk-end';

export interface WalkEnd {
  readonly back: boolean;
}

const reachable = (region: Element): HTMLElement[] =>
  [...region.querySelectorAll<HTMLElement>('[data-field]:not([disabled])')].filter((it) => it.offsetParent !== null);

/** Focuses the next field of the region that the element stands in; at its end the region decides. */
export const walk = (from: HTMLElement, back: boolean): void => {
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
