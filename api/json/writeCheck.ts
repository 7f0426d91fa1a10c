import type { Check } from '../../core/check/report.ts';
import { type JsonWriter, part } from './jsonWriter.ts';

/** What stands round the numbers of a check: the same for all checks that differ in numbers only. */
interface Frame {
  readonly like: Check;
  readonly toDemand: Uint8Array;
  readonly toUtilisation: Uint8Array;
  readonly after: Uint8Array;
}

const RESISTANCE = part(',"resistance":');
const REACTION = part(',"reactionAtFailure":');
const END = part('}');

/** Fields of an object, without what opens and closes it. */
const fields = (of: object): string => JSON.stringify(of).slice(1, -1);

const frameOf = (like: Check): Frame => {
  const { id, part: of, title, clause, basis, symbol, unit, state, verified } = like;
  const { reason, reasonText, of: way, ofText } = like;
  return {
    like,
    toDemand: part(`{${fields({ id, part: of, title, clause, basis, symbol })},"demand":`),
    toUtilisation: part(`,${fields({ unit })},"utilisation":`),
    after: part(`,${fields({ state, verified, reason, reasonText, of: way, ofText })}`),
  };
};

const alike = (a: Check, b: Check): boolean =>
  a.clause === b.clause &&
  a.title === b.title &&
  a.state === b.state &&
  a.unit === b.unit &&
  a.symbol === b.symbol &&
  a.part === b.part &&
  a.basis === b.basis &&
  a.verified === b.verified &&
  a.reason === b.reason &&
  a.reasonText === b.reasonText &&
  a.of === b.of &&
  a.ofText === b.ofText;

/** Words of checks are the program's own: there are so many and no more. */
const frames = new Map<Check['id'], Frame[]>();

const frameFor = (check: Check): Frame => {
  const known = frames.get(check.id);
  if (known) for (let at = 0; at < known.length; at += 1) if (alike(known[at]!.like, check)) return known[at]!;
  const frame = frameOf(check);
  if (known) known.push(frame);
  else frames.set(check.id, [frame]);
  return frame;
};

/** A check without its working. */
export const writeCheck = (writer: JsonWriter, check: Check): void => {
  const { toDemand, toUtilisation, after } = frameFor(check);
  writer.put(toDemand);
  writer.number(check.demand);
  writer.put(RESISTANCE);
  writer.number(check.resistance);
  writer.put(toUtilisation);
  writer.number(check.utilisation);
  writer.put(after);
  if (check.reactionAtFailure !== undefined) {
    writer.put(REACTION);
    writer.number(check.reactionAtFailure);
  }
  writer.put(END);
};
