import type { StepOf } from './Step';
import type { SolverVerb } from './verbs';

/** What is wrong with the lists of a constraint, in one sentence; null when nothing is. */
export function constraintFault({ values }: StepOf<'constrain'>): string | null {
  const { kind, sources, weights, blend, axis, up_axis: upAxis, up } = values;
  if (sources.length === 0) return 'There are no sources.';
  if (sources.length !== weights.length) {
    return `There are ${sources.length} sources and ${weights.length} weights.`;
  }
  if (weights.some((weight) => weight < 0)) return 'A weight is below 0.';
  if (blend !== null && sources.length !== 2) return `There is a blend, and ${sources.length} sources.`;
  if (kind === 'aim') {
    if (axis === null || upAxis === null) return 'An aim constraint has an axis and an up_axis.';
    return axis[1] === upAxis[1] ? 'The axis and the up_axis lie on one line.' : null;
  }
  if (axis !== null || upAxis !== null || up !== null) {
    return 'Only an aim constraint has an axis, an up_axis and an up.';
  }
  return null;
}

/** What is wrong with the curve of a driver; null when nothing is. */
export function driverFault({ values }: StepOf<'drive'>): string | null {
  const { inputs, outputs } = values;
  if (inputs.length < 2) return 'There are fewer than two inputs.';
  if (inputs.length !== outputs.length) {
    return `There are ${inputs.length} inputs and ${outputs.length} outputs.`;
  }
  const rises = inputs.every((input, index) => index === 0 || input > (inputs[index - 1] ?? input));
  return rises ? null : 'The inputs do not rise.';
}

/** What is wrong with the numbers of a skin; null when nothing is. */
export function skinFault({ values }: StepOf<'skin'>): string | null {
  const { joints, influences } = values;
  if (joints.length === 0) return 'There are no joints.';
  return Number.isInteger(influences) && influences >= 1
    ? null
    : 'The influences are no whole number from 1.';
}

/** What is wrong with the lists and numbers of a solver; null when nothing is. */
export function solverFault({ verb, values }: StepOf<SolverVerb>): string | null {
  switch (verb) {
    case 'two_bone':
    case 'reach':
      if (verb === 'reach' && values.joints.length < 4) return 'There are fewer than four joints.';
      if (!(values.stretch_limit >= 1)) return 'The stretch_limit is below 1.';
      return values.soft >= 0 && values.soft <= 1 ? null : 'The softness does not lie between 0 and 1.';
    case 'spline':
      if (values.joints.length < 2) return 'There are fewer than two joints.';
      return values.controls.length < 2 ? 'There are fewer than two controls.' : null;
    case 'twist':
      if (values.joints.length === 0) return 'There are no joints.';
      return values.joints.length === values.shares.length
        ? null
        : `There are ${values.joints.length} joints and ${values.shares.length} shares.`;
    case 'aim':
    case 'foot_roll':
      return null;
    default:
      return verb satisfies never;
  }
}
