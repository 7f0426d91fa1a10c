import { CodeWriter, type NodeGate } from './codeWriter.ts';
import { type Flag, type Node, Nodes, type Read } from './nodes.ts';
import { ownersOf, SHARED } from './ownersOf.ts';
import type { Program } from './run.ts';
import type { Condition, Tree } from './tree.ts';

type Asked = Tree | Condition | undefined;

/** Formulas that stand behind the same gates. */
export interface Group {
  /** The first that is met is noted; where it closes, the formulas are not worked out. */
  readonly gates: readonly { readonly when: Condition; readonly closes: boolean }[];
  readonly of: readonly Asked[];
  /** Worked out whatever the gates say. */
  readonly always: readonly Asked[];
  /** Worked out only when asked for after a run, at another value of what may change. */
  readonly after?: readonly Asked[];
}

/** Cells in which a run leaves what a group comes to. */
export interface Place {
  /** Number of the first gate that is met; -1 where none is. */
  readonly gate: number;
  /** The formulas' values, in their order; of a condition 1 or 0. Of no meaning behind a closed gate. */
  readonly of: readonly (number | undefined)[];
  readonly always: readonly (number | undefined)[];
  readonly after: readonly (number | undefined)[];
  /** Where the instructions for `after` begin. */
  readonly from: number;
}

/** What is known of all facts that a program will meet. */
interface Known {
  /** Their kind: what it settles is no part of the program. */
  readonly kind?: string;
  /** The quantity that `after` is asked for at another value. */
  readonly changing?: Tree | undefined;
}

type Nodal = readonly (Node | undefined)[];

const there = (of: Nodal): Node[] => of.filter((one) => one !== undefined);

/** What more than one formula leans on, by its owner; solvers run where they are needed. */
const commonOf = (nodes: readonly Node[], owners: Int32Array): ReadonlyMap<number, readonly Node[]> => {
  const common = new Map<number, Node[]>();
  for (const node of nodes) {
    if (node.uses < 2 || node.solved) continue;
    const owner = owners[node.at]!;
    const known = common.get(owner);
    if (known) known.push(node);
    else common.set(owner, [node]);
  }
  return common;
};

/** What one group comes to in nodes. */
interface AskedGroup {
  /** Number of the gate that is met whatever the facts; none of the formulas is worked out then. */
  readonly shut: Node | undefined;
  readonly gates: readonly NodeGate[];
  readonly of: Nodal;
  readonly always: Nodal;
}

/** Asks for a formula that so many lean on. */
type Ask = (one: Asked, uses?: number) => Node | undefined;

const askedOf = ({ gates: all, of, always }: Group, nodes: Nodes, ask: Ask): AskedGroup => {
  // A gate is looked at in a row with others, so its condition is settled at the head.
  const gates = all
    .map(({ when, closes }, number) => ({ when: ask(when, 2)!, closes, number }))
    .filter(({ when }) => when.is !== 0);
  const [first] = gates;
  const shut = first?.closes && first.when.is === 1 ? nodes.literal(first.number) : undefined;
  const free = always.map((one) => ask(one));
  if (shut) return { shut, always: free, gates: [], of: [] };
  return { shut, always: free, gates, of: of.map((one) => ask(one)) };
};

/** Places of groups behind the very same gates, which are then looked at once for all of them. */
const behindTheSame = (asked: readonly AskedGroup[]): readonly (readonly number[])[] => {
  const sets = new Map<string, number[]>();
  asked.forEach(({ gates, shut }, at) => {
    const key = shut ? 'shut' : gates.map(({ when, closes, number }) => `${when.at} ${closes} ${number}`).join();
    const known = sets.get(key);
    if (known) known.push(at);
    else sets.set(key, [at]);
  });
  return [...sets.values()];
};

/**
 * Writes groups of formulas as one program, and says where their values stand after a run. What groups behind several gates lean on is worked
 * out once, at the head; what several formulas behind the same gates lean on, once behind them; what only one leans on, within the branch that
 * the facts take. A solver runs when it is first needed, and once a run.
 */
export const programOf = (
  groups: readonly Group[],
  { kind = '', changing }: Known = {},
): { readonly program: Program; readonly places: readonly Place[] } => {
  const read = changing?.op === 'given' ? changing.read : undefined;
  const nodes = new Nodes(kind, read);
  const ask: Ask = (one, uses = 1) => {
    const node = one && nodes.of(one);
    if (node) node.uses += uses;
    return node;
  };
  const asked = groups.map((group) => askedOf(group, nodes, ask));
  const run = nodes.all.length;
  const afters = groups.map(({ after = [] }, at) => (asked[at]!.shut ? [] : after.map((one) => ask(one, 0))));
  nodes.literal(0);
  nodes.literal(1);

  const writer = new CodeWriter((value) => nodes.literal(value));
  const { cellOf } = writer;
  const leaves = (op: Node['op']): Node[] => {
    const found = nodes.kind(op);
    for (const one of found) cellOf.set(one, writer.newCell());
    return found;
  };
  const constants = leaves('literal').map(({ is }) => is as number);
  const given = leaves('given');
  const flags = leaves('flag').map(({ is }) => is as Flag);
  const sets = behindTheSame(asked);
  const owners = ownersOf(
    nodes.all.length,
    asked.flatMap(({ gates, always }) => [...gates.map(({ when }) => when), ...there(always)]),
    sets.map((members) => members.flatMap((at) => there([...asked[at]!.of, ...afters[at]!]))),
  );
  const common = commonOf(nodes.all.slice(0, run), owners);
  const settle = (owner: number): void => {
    for (const node of common.get(owner) ?? []) if (!cellOf.has(node)) writer.settle(node);
  };
  settle(SHARED);

  const values = (of: Nodal) => of.map((one) => one && writer.value(one));
  const always = asked.map((one) => values(one.always));
  const gateOf: number[] = [];
  const found: Place['of'][] = asked.map(() => []);
  sets.forEach((members, set) => {
    const { shut, gates } = asked[members[0]!]!;
    if (shut) {
      for (const at of members) gateOf[at] = cellOf.get(asked[at]!.shut!)!;
      return;
    }
    const gate = writer.behind(gates, () => {
      settle(set);
      for (const at of members) found[at] = values(asked[at]!.of);
    });
    for (const at of members) gateOf[at] = gate;
  });
  writer.stop();
  writer.anew = true;
  const later = afters.map((of) => {
    const from = writer.next;
    const after = values(of);
    if (of.length > 0) writer.stop();
    return { from, after };
  });

  const code = writer.finished();
  const cells = new Float64Array(writer.cells);
  cells.set(constants);
  const program: Program = {
    code,
    cells,
    reads: given.map(({ is }) => is as Read),
    flags,
    firstFact: constants.length,
    changing: constants.length + given.findIndex(({ is }) => is === read),
    solvers: writer.solvers,
    solvedAt: new Int32Array(writer.solvers.length),
  };
  return {
    program,
    places: later.map((one, at) => ({ ...one, gate: gateOf[at]!, of: found[at]!, always: always[at]! })),
  };
};
