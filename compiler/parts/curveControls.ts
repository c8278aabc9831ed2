import type { ChainEntry, ConstraintEntry, ControlEntry, MadePart, SolverEntry } from '../expand/primitives';
import type { PlaceReference } from '../expand/types';
import type { RotationOrder, ShapeName, Side } from '../rig/Rig';

/** What lays a row of joints along a curve that a few controls shape. */
export interface CurveControlsInput {
  readonly id: string;
  readonly side: Side;
  readonly joints: readonly string[];
  /** Ids of the controls from first to last; two or more. */
  readonly controls: readonly string[];
  readonly parent: string | undefined;
  readonly from: PlaceReference;
  readonly to: PlaceReference;
  readonly shape: ShapeName;
  readonly size: number;
  readonly order: RotationOrder | undefined;
  /** Values at rest of the last control's attributes. */
  readonly stretch: number;
  readonly volume: number;
}

/** Share of the way from an end to the next control at which the end control holds the curve's direction. */
const LEAD = 1 / 3;

/** The joint of the row that stands nearest to a share of the way along it. */
function jointAt(joints: readonly string[], share: number): string {
  return joints[Math.round(share * (joints.length - 1))] ?? '';
}

/**
 * Controls, helper joints and the spline solver that bend a row of joints. Each end control carries a helper a third
 * of the way to its neighbour, which holds the curve's direction there; controls between sit on helpers that follow
 * both ends by their share of the way.
 */
export function curveControls(input: CurveControlsInput): MadePart {
  const { id, side, joints, controls, parent, order, shape, size } = input;
  const last = controls.length - 1;
  const first = controls[0] ?? '';
  const end = controls[last] ?? '';
  const chains: Record<string, ChainEntry> = {};
  const made: Record<string, ControlEntry> = {};
  const constraints: Record<string, ConstraintEntry> = {};
  const hull: string[] = [];

  const control = (
    name: string,
    at: PlaceReference,
    above: string | undefined,
    more: Partial<ControlEntry>,
  ) => {
    made[name] = {
      side,
      at,
      ...(above === undefined ? {} : { parent: above }),
      shape,
      size,
      ...(order === undefined ? {} : { rotation_order: order }),
      channels: { scale: { locked: true } },
      ...more,
    };
  };
  const helper = (name: string, at: PlaceReference, above: string | undefined): string => {
    chains[name] = {
      side,
      role: 'helper',
      points: [at],
      names: ['joint'],
      ...(above === undefined ? {} : { parent: above }),
      orient: { rule: 'world' },
    };
    return `${name}.joint`;
  };

  control(first, input.from, parent, {});
  control(end, input.to, parent, {
    attributes: {
      stretch: {
        default: input.stretch,
        min: 0,
        max: 1,
        note: 'lets the joints spread over the whole curve',
      },
      volume: {
        default: input.volume,
        min: 0,
        max: 1,
        note: 'thickens and thins the joints to keep the volume',
      },
    },
  });
  const placeOf = (index: number): PlaceReference =>
    index === 0 ? input.from : index === last ? input.to : jointAt(joints, index / last);
  const lead = (name: string, share: number, above: string): string =>
    helper(name, jointAt(joints, share), above);

  hull.push(first);
  if (joints.length > 3) hull.push(lead(`${first}_lead`, LEAD / last, first));
  for (let index = 1; index < last; index += 1) {
    const name = controls[index] ?? '';
    const share = index / last;
    const seat = helper(`${name}_base`, placeOf(index), parent);
    constraints[`${name}_follow`] = {
      side,
      kind: 'parent',
      target: seat,
      sources: { [first]: 1 - share, [end]: share },
    };
    control(name, placeOf(index), seat, { size: size * 0.8, channels: { scale: { locked: true } } });
    hull.push(name);
  }
  if (joints.length > 3) hull.push(lead(`${end}_lead`, 1 - LEAD / last, end));
  hull.push(end);

  const solvers: Record<string, SolverEntry> = {
    [`${id}.curve`]: {
      side,
      kind: 'spline',
      joints: [...joints],
      controls: hull,
      stretch: `${end}.stretch`,
      volume: `${end}.volume`,
    },
  };
  return { chains, controls: made, constraints, solvers };
}
