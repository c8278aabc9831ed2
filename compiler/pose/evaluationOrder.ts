import { invariant } from '../findings/invariant';
import type { Rig } from '../rig/Rig';

/** `own`: parent and constraints of a node; `solve`: a solver turning the joints it steers. */
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
  // A steered joint is final only after its solver; everyone else waits for that, only the solver itself must not.
  const finalTask = rig.nodes.map((_, index) => index);
  rig.solvers.forEach((solver, index) => {
    finalTask[indexOf(solver.start)] = rig.nodes.length + index;
    finalTask[indexOf(solver.mid)] = rig.nodes.length + index;
  });
  const startOfMid = new Map(rig.solvers.map((solver) => [solver.mid, solver.start]));
  const final = (name: string): number => finalTask[indexOf(name)] as number;

  const needs: number[][] = rig.nodes.map((node) => {
    if (node.parent === null) return [];
    return [startOfMid.get(node.name) === node.parent ? indexOf(node.parent) : final(node.parent)];
  });
  for (const constraint of rig.constraints) {
    const target = needs[indexOf(constraint.target)] as number[];
    for (const source of constraint.sources) target.push(final(source.node));
  }
  for (const solver of rig.solvers) {
    needs.push([indexOf(solver.start), indexOf(solver.mid), final(solver.goal), final(solver.pole)]);
  }
  return needs;
}

/**
 * Puts nodes and solvers in an order in which everything is evaluated after what it reads: parents, constraint
 * sources, and goal, pole and own pose of solved joints. The same rig always gives the same order.
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
