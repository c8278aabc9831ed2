import { invariant } from '../findings/invariant';
import type { Rig } from '../rig/Rig';
import { nodesRead, nodesWritten } from '../rig/solverNodes';

/** `own`: parent, space, channels and constraints of a node; `solve`: a solver writing the nodes it steers. */
export type EvaluationTask =
  | { readonly kind: 'own'; readonly node: number }
  | { readonly kind: 'solve'; readonly solver: number };

export type EvaluationOrder =
  | { readonly kind: 'order'; readonly tasks: readonly EvaluationTask[] }
  /** Names of nodes and solvers; each waits for the next and the last for the first. */
  | { readonly kind: 'ring'; readonly path: readonly string[] };

/** Index of every node by name. */
export function indexNodes(rig: Rig): ReadonlyMap<string, number> {
  return new Map(rig.nodes.map((node, index) => [node.name, index]));
}

/** For each task (nodes first, then solvers) the tasks whose results it reads. */
function collectNeeds(rig: Rig): readonly (readonly number[])[] {
  const byName = indexNodes(rig);
  const indexOf = (name: string): number => {
    const index = byName.get(name);
    invariant(index !== undefined, `every reference of a rig names a node ("${name}")`);
    return index;
  };
  // A node that a solver writes is final only after it; everyone else waits for that, only the solver itself must not.
  const finalTask = rig.nodes.map((_, index) => index);
  rig.solvers.forEach((solver, index) => {
    for (const name of nodesWritten(solver)) finalTask[indexOf(name)] = rig.nodes.length + index;
  });
  const final = (index: number): number => finalTask[index] as number;

  const needs: number[][] = rig.nodes.map((node, index) => {
    if (node.parent === null) return [];
    const parent = indexOf(node.parent);
    const sharesSolver = final(index) !== index && final(index) === final(parent);
    return [sharesSolver ? parent : final(parent)];
  });
  for (const { target, sources, ...constraint } of rig.constraints) {
    const reads = needs[indexOf(target)] as number[];
    for (const { node } of sources) reads.push(final(indexOf(node)));
    if (constraint.kind === 'aim' && constraint.up !== null) reads.push(final(indexOf(constraint.up)));
  }
  for (const { control, sources } of rig.spaces) {
    for (const node of sources) (needs[indexOf(control)] as number[]).push(final(indexOf(node)));
  }
  for (const solver of rig.solvers) {
    needs.push([
      ...nodesWritten(solver).map(indexOf),
      ...nodesRead(solver).map((name) => final(indexOf(name))),
    ]);
  }
  return needs;
}

/**
 * Puts nodes and solvers in an order in which everything is evaluated after what it reads: parents, constraint
 * sources, spaces, and for solvers their goals and the own transforms of what they steer. The same rig always gives
 * the same order.
 */
export function orderEvaluation(rig: Rig): EvaluationOrder {
  const needs = collectNeeds(rig);
  const nameOf = (task: number): string =>
    (rig.nodes[task] ?? rig.solvers[task - rig.nodes.length])?.name ?? String(task);
  const state = new Uint8Array(needs.length); // 0 untouched, 1 being visited, 2 done
  const nextNeed = new Uint32Array(needs.length);
  const order: number[] = [];
  for (let root = 0; root < needs.length; root += 1) {
    if (state[root] !== 0) continue;
    // A stack of our own: chains may be thousands of joints long.
    const stack = [root];
    state[root] = 1;
    while (stack.length > 0) {
      const task = stack[stack.length - 1] as number;
      const need = needs[task]?.[nextNeed[task] as number];
      if (need === undefined) {
        state[task] = 2;
        order.push(task);
        stack.pop();
        continue;
      }
      nextNeed[task] = (nextNeed[task] as number) + 1;
      if (state[need] === 1) return { kind: 'ring', path: stack.slice(stack.indexOf(need)).map(nameOf) };
      if (state[need] === 0) {
        state[need] = 1;
        stack.push(need);
      }
    }
  }
  const count = rig.nodes.length;
  const tasks = order.map(
    (task): EvaluationTask =>
      task < count ? { kind: 'own', node: task } : { kind: 'solve', solver: task - count },
  );
  return { kind: 'order', tasks };
}

/**
 * A ring of things that wait for each other, as names of nodes and solvers: each waits for the next, the last for
 * the first. Null when the rig can be evaluated. Every reference must name a node.
 */
export function findEvaluationRing(rig: Rig): readonly string[] | null {
  const order = orderEvaluation(rig);
  return order.kind === 'ring' ? order.path : null;
}
