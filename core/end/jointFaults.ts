import { type Fault, fault } from './fault.ts';
import { supportBoltsOf } from './jointParts.ts';
import type { End, Joint } from './schema.ts';

type Cleats = Extract<Joint, { cleat: unknown }>;

const missing = (path: string): Fault => fault('missing', path, null, 'number');

/** A web leg is bolted or welded: what each asks for, and what the other would bring along. */
const webLegFaults = ({ bolts, firstRow, endDistance, cleat }: Cleats): Fault[] => {
  const found: Fault[] = [];
  if (bolts && cleat.webWeld) found.push(fault('one-of-two', 'joint.cleat.webWeld', 'an object', 'joint.bolts'));
  if (!bolts && !cleat.webWeld) found.push(fault('missing', 'joint.bolts', null, 'object'));
  if (found.length > 0) return found;
  const bolted = { firstRow, endDistance, 'cleat.topEdge': cleat.topEdge, 'cleat.bottomEdge': cleat.bottomEdge };
  const welded = { 'cleat.top': cleat.top, 'cleat.depth': cleat.depth };
  const [needed, idle] = bolts ? [bolted, welded] : [welded, bolted];
  for (const [name, value] of Object.entries(needed)) if (value === undefined) found.push(missing(`joint.${name}`));
  for (const [name, value] of Object.entries(idle)) {
    if (value === undefined) continue;
    found.push(fault('one-of-two', `joint.${name}`, value, bolts ? 'joint.bolts' : 'joint.cleat.webWeld'));
  }
  return found;
};

/** Legs of a cleat: each bolted or welded, and not both welded, which leaves the end no way to turn. */
const cleatFaults = (joint: Cleats): Fault[] => {
  const { webWeld, supportWeld } = joint.cleat;
  const found = webLegFaults(joint);
  if (supportWeld && joint.supportBolts) {
    found.push(fault('one-of-two', 'joint.cleat.supportWeld', 'an object', 'joint.supportBolts'));
  } else if (supportWeld && webWeld) {
    found.push(fault('both-legs-welded', 'joint.cleat.supportWeld', 'an object', 'joint.cleat.webWeld'));
  } else if (!supportWeld && !joint.supportBolts) found.push(fault('missing', 'joint.supportBolts', null, 'object'));
  return found;
};

/** The beam opposite is told with its reaction, and where its bolts and those of the joint go through one web. */
const oppositeFaults = ({ joint, support }: End): Fault[] => {
  if (!support?.opposite) return [];
  const path = 'support.opposite';
  if (support.kind === 'column-flange') return [fault('opposite-flange', path, 'an object', support.kind)];
  if (!supportBoltsOf(joint)) return [fault('opposite-welded', path, 'an object', joint.kind)];
  return support.otherReaction === undefined ? [missing('support.otherReaction')] : [];
};

/** What a joint leaves out, or says twice. */
export const jointFaults = (end: End): Fault[] => [
  ...('cleat' in end.joint ? cleatFaults(end.joint) : []),
  ...oppositeFaults(end),
];
