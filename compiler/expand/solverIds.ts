import type { Path } from '../syntax/types';
import type { Amount, SolverSpecification } from './types';

/** An id that a solver refers to, what it must be, and the keys under which it was written. */
export interface SolverReference {
  readonly id: string;
  readonly wants: 'joint' | 'thing';
  readonly keys: Path;
}

function joints(ids: readonly string[]): readonly SolverReference[] {
  return ids.map((id, index) => ({ id, wants: 'joint', keys: ['joints', index] }));
}

function joint(id: string, key: string): SolverReference {
  return { id, wants: 'joint', keys: [key] };
}

function thing(id: string, key: string): SolverReference {
  return { id, wants: 'thing', keys: [key] };
}

/** Everything a solver refers to, in the order in which it is written. */
export function referencesOf(solver: SolverSpecification): readonly SolverReference[] {
  switch (solver.kind) {
    case 'two_bone':
    case 'reach':
      return [...joints(solver.joints), thing(solver.goal, 'goal'), thing(solver.pole, 'pole')];
    case 'spline':
      return [
        ...joints(solver.joints),
        ...solver.controls.map((id, index) => ({ id, wants: 'thing', keys: ['controls', index] }) as const),
      ];
    case 'twist':
      return [
        ...joints(solver.joints),
        joint(solver.bone, 'bone'),
        joint(solver.tip, 'tip'),
        thing(solver.base, 'base'),
        thing(solver.driver, 'driver'),
      ];
    case 'aim':
      return [
        ...joints(solver.joints),
        thing(solver.goal, 'goal'),
        ...(solver.pole === null ? [] : [thing(solver.pole, 'pole')]),
      ];
    case 'foot_roll':
      return [
        thing(solver.foot, 'foot'),
        thing(solver.ankle, 'ankle'),
        ...(solver.toes === null ? [] : [thing(solver.toes, 'toes')]),
      ];
    default:
      return solver satisfies never;
  }
}

/** Ids of what a solver moves or turns, from root to tip. */
export function idsWritten(solver: SolverSpecification): readonly string[] {
  switch (solver.kind) {
    case 'two_bone':
    case 'reach':
      return solver.joints.slice(0, -1);
    case 'spline':
    case 'twist':
    case 'aim':
      return solver.joints;
    case 'foot_roll':
      return solver.toes === null ? [solver.ankle] : [solver.ankle, solver.toes];
    default:
      return solver satisfies never;
  }
}

/** Ids of what steers a solver from outside its joints. */
export function idsRead(solver: SolverSpecification): readonly string[] {
  switch (solver.kind) {
    case 'two_bone':
    case 'reach':
      return [solver.goal, solver.pole];
    case 'spline':
      return solver.controls;
    case 'twist':
      return [solver.bone, solver.base, solver.driver];
    case 'aim':
      return solver.pole === null ? [solver.goal] : [solver.goal, solver.pole];
    case 'foot_roll':
      return [solver.foot];
    default:
      return solver satisfies never;
  }
}

/** Joints that must hang in a row, each the parent of the next. */
export function rowOf(solver: SolverSpecification): readonly string[] {
  return solver.kind === 'two_bone' || solver.kind === 'reach' || solver.kind === 'spline'
    ? solver.joints
    : [];
}

/** The numbers of a solver that may be attributes, by key. */
export function amountsOf(solver: SolverSpecification): readonly (readonly [string, Amount])[] {
  switch (solver.kind) {
    case 'two_bone':
    case 'reach':
      return [
        ['blend', solver.blend],
        ['stretch', solver.stretch],
        ['swing', solver.swing],
        ...(solver.kind === 'reach' ? [['bias', solver.bias] as const] : []),
      ];
    case 'spline':
      return [
        ['stretch', solver.stretch],
        ['volume', solver.volume],
      ];
    case 'aim':
      return [['blend', solver.blend]];
    case 'foot_roll':
      return [
        ['roll', solver.roll],
        ['bank', solver.bank],
        ['break', solver.break],
      ];
    case 'twist':
      return [];
    default:
      return solver satisfies never;
  }
}

/** The control that an amount names; null for a plain number. */
export function controlOfAmount(amount: Amount | null): string | null {
  return typeof amount === 'string' ? amount.slice(0, amount.lastIndexOf('.')) : null;
}
