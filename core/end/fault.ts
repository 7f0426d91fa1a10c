/** Why an end cannot be computed, as data; words for people are made in core/words. */
export interface Fault {
  /** Short name of the kind of fault, such as `hole-outside-web`. */
  readonly code: string;
  /** Where in the JSON of the end, such as `joint.bolts.pitch`. */
  readonly path: string;
  /** What was given there, in the file's own units. */
  readonly given: unknown;
  /** What would be accepted: a bound, a list of values, or the nearest known names. */
  readonly limit: unknown;
}

export const fault = (code: string, path: string, given: unknown, limit: unknown): Fault => ({
  code,
  path,
  given,
  limit,
});
