/** For sizes `demand` is what is required and `resistance` what is given. Absent where there is no number. */
export interface Answer {
  readonly state: 'holds' | 'fails' | 'refer' | 'notApplicable' | 'information';
  readonly reason?: string | undefined;
  readonly demand?: number | undefined;
  readonly resistance?: number | undefined;
  readonly reactionAtFailure?: number | undefined;
  readonly utilisation?: number | undefined;
  /** Parts that are used up at the same reaction, or share the nearest bound: the numbers may be those of any. */
  readonly level?: readonly Answer[];
}

export const no = (reason: string): Answer => ({ state: 'notApplicable', reason });
const rank = ({ state }: Answer): number => ['holds', 'refer', 'fails'].indexOf(state);
const worst = (parts: readonly Answer[]): Answer => parts.reduce((a, b) => (rank(b) > rank(a) ? b : a));

/** One section, leg or direction: demand for each newton of reaction, resistance, and the limits it may lie outside of. */
export interface Part {
  readonly per: number;
  readonly resistance: number;
  /** Refers where the number holds. */
  readonly limit?: string | false | undefined;
  /** Refers whatever the number. */
  readonly always?: string | false | undefined;
}

const partAt = (V: number, { per, resistance, limit, always }: Part): Answer => {
  if (Number.isNaN(resistance)) return { state: 'refer', reason: always || '' };
  if (resistance <= 0) return { state: 'fails', reason: 'nothing-left', resistance, reactionAtFailure: 0 };
  const reactionAtFailure = resistance / per;
  const numbers = { demand: per * V, resistance, reactionAtFailure, utilisation: V / reactionAtFailure };
  if (always) return { state: 'refer', reason: always, ...numbers };
  if (V > reactionAtFailure) return { state: 'fails', ...numbers };
  return limit ? { state: 'refer', reason: limit, ...numbers } : { state: 'holds', ...numbers };
};

/** The worst state of the parts with the numbers of the part used up first. */
export const strength = (V: number, ...parts: readonly Part[]): Answer => {
  const all = parts.map((one) => partAt(V, one));
  const numbered = all.filter((one) => one.reactionAtFailure !== undefined);
  const least = Math.min(...numbered.map((one) => one.reactionAtFailure!));
  const level = numbered.filter((one) => one.reactionAtFailure! <= least * (1 + 1e-9));
  const { state, reason } = worst(all);
  return { ...level[0], state, reason, level };
};

/** A size against its bounds; `breach` is what breaking one means. */
export const size = (
  breach: 'fails' | 'refer',
  given: number,
  least: number,
  most = Number.POSITIVE_INFINITY,
): Answer => {
  const used = given > 0 ? least / given : least > 0 ? Number.POSITIVE_INFINITY : 0;
  const low = used >= given / most;
  const utilisation = low ? used : given / most;
  const broken = utilisation > 1 + 1e-9;
  const reason = broken ? (low ? 'too-little' : 'too-much') : undefined;
  return { state: broken ? breach : 'holds', reason, demand: low ? least : most, resistance: given, utilisation };
};
export const sizes = (...parts: readonly Answer[]): Answer => {
  const same = parts.filter((one) => rank(one) === rank(worst(parts)));
  const most = Math.max(...same.map((one) => one.utilisation!));
  const level = same.filter((one) => one.utilisation! >= most * (1 - 1e-9));
  return { ...level[0]!, level };
};
