import { CodeWriter } from './codeWriter.ts';
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

/**
 * Writes groups of formulas as one program, and says where their values stand after a run. What several groups lean on is worked out once, at
 * the head; what several formulas of one group lean on, once behind its gates; what only one leans on, within the branch that the facts take.
 * A solver runs when it is first needed, and once a run.
 */
export const programOf = (
  groups: readonly Group[],
  { kind = '', changing }: Known = {},
): { readonly program: Program; readonly places: readonly Place[] } => {
  const read = changing?.op === 'given' ? changing.read : undefined;
  const nodes = new Nodes(kind, read);
  const ask = (one: Asked, uses = 1): Node | undefined => {
    const node = one && nodes.of(one);
    if (node) node.uses += uses;
    return node;
  };
  const asked = groups.map(({ gates: all, of, always }) => {
    // A gate is looked at in a row with others, so its condition is settled at the head.
    const gates = all
      .map(({ when, closes }, number) => ({ when: ask(when, 2)!, closes, number }))
      .filter(({ when }) => when.is !== 0);
    const [first] = gates;
    const shut = first?.closes && first.when.is === 1 ? nodes.literal(first.number) : undefined;
    const free = always.map((one) => ask(one));
    return shut ? { shut, always: free, gates: [], of: [] } : { always: free, gates, of: of.map((one) => ask(one)) };
  });
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
  const owners = ownersOf(
    nodes.all.length,
    asked.flatMap(({ gates, always }) => [...gates.map(({ when }) => when), ...there(always)]),
    asked.map(({ of }, at) => there([...of, ...afters[at]!])),
  );
  const common = commonOf(nodes.all.slice(0, run), owners);
  const settle = (owner: number): void => {
    for (const node of common.get(owner) ?? []) if (!cellOf.has(node)) writer.settle(node);
  };
  settle(SHARED);

  const values = (of: Nodal) => of.map((one) => one && writer.value(one));
  const places = asked.map(({ shut, gates, of, always }, at) => {
    const free = values(always);
    if (shut) return { gate: cellOf.get(shut)!, of: [], always: free };
    let cells: Place['of'] = [];
    const gate = writer.behind(gates, () => {
      settle(at);
      cells = values(of);
    });
    return { gate, of: cells, always: free };
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
  return { program, places: places.map((one, at) => ({ ...one, ...later[at]! })) };
};
