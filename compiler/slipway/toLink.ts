import type { RigConstraint, RigDriver, RigShape, RigSkin, RigSolver, RigSpace } from '../rig/Rig';
import type { StepOf } from './Step';
import type { SolverVerb } from './verbs';

/** The constraint that a checked step makes. */
export function toConstraint({ name, values }: StepOf<'constrain'>): RigConstraint {
  const { id, kind, target, sources, weights, keep_offset: keepOffset, blend, axis, up } = values;
  const weighed = sources.map((node, index) => ({ node, weight: weights[index] ?? 0 }));
  const base = { id, name, target, sources: weighed, blend, keepOffset };
  return kind === 'aim'
    ? { ...base, kind, axis: axis ?? '+x', upAxis: values.up_axis ?? '+y', up }
    : { ...base, kind };
}

/** The space that a checked step makes. */
export function toSpace({ name, values }: StepOf<'space'>): RigSpace {
  return { name, ...values };
}

/** The driver that a checked step makes. */
export function toDriver({ name, values }: StepOf<'drive'>): RigDriver {
  return { name, ...values };
}

/** The skin that a checked step makes. */
export function toSkin({ name, values }: StepOf<'skin'>): RigSkin {
  return { name, ...values };
}

/** The shape that a checked step makes. */
export function toShape({ name, values }: StepOf<'shape'>): RigShape {
  return { name, ...values };
}

/** The solver that a checked step makes. */
export function toSolver({ verb, name, values }: StepOf<SolverVerb>): RigSolver {
  switch (verb) {
    case 'two_bone':
    case 'reach': {
      const { stretch_limit: stretchLimit, ...rest } = values;
      return { kind: verb, name, ...rest, stretchLimit } as RigSolver;
    }
    default:
      return { kind: verb, name, ...values } as RigSolver;
  }
}
