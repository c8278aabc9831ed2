import type { NumberOrAttribute, Rig, RigSolver } from '../rig/Rig';
import { nodesRead, nodesWritten } from '../rig/solverNodes';
import type { TrialBench } from './TrialBench';

/** Names of controls whose attributes a solver's numbers are. */
function controlsOfAmounts(solver: RigSolver): readonly string[] {
  return Object.values(solver).flatMap((value: unknown) =>
    typeof value === 'object' && value !== null && 'attribute' in value && 'control' in value
      ? [String((value as Exclude<NumberOrAttribute, number>).control)]
      : [],
  );
}

/** By name, the nodes whose motion or values can move a node directly. */
function directInfluences(rig: Rig): ReadonlyMap<string, ReadonlySet<string>> {
  const direct = new Map(
    rig.nodes.map(({ name, parent }) => [name, new Set(parent === null ? [] : [parent])]),
  );
  const add = (target: string, sources: readonly string[]): void => {
    for (const source of sources) direct.get(target)?.add(source);
  };
  for (const constraint of rig.constraints) {
    add(
      constraint.target,
      constraint.sources.map(({ node }) => node),
    );
    if (constraint.kind === 'aim' && constraint.up !== null) add(constraint.target, [constraint.up]);
    if (constraint.blend !== null && typeof constraint.blend !== 'number') {
      add(constraint.target, [constraint.blend.control]);
    }
  }
  for (const { control, sources } of rig.spaces) add(control, sources);
  for (const { target, control } of rig.drivers) add(target, [control]);
  for (const solver of rig.solvers) {
    const sources = [...nodesRead(solver), ...nodesWritten(solver), ...controlsOfAmounts(solver)];
    for (const target of nodesWritten(solver))
      add(
        target,
        sources.filter((name) => name !== target),
      );
  }
  return direct;
}

/** Tells whether any of some nodes, by name, can move another one, near or far, or is that one. */
export function findInfluences({
  rig,
}: Pick<TrialBench, 'rig'>): (name: string, sources: ReadonlySet<string>) => boolean {
  const direct = directInfluences(rig);
  return (name, sources) => {
    const seen = new Set([name]);
    const pending = [name];
    for (let next = pending.pop(); next !== undefined; next = pending.pop()) {
      if (sources.has(next)) return true;
      for (const source of direct.get(next) ?? []) {
        if (seen.has(source)) continue;
        seen.add(source);
        pending.push(source);
      }
    }
    return false;
  };
}
