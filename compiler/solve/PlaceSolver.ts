import {
  type ChainSpecification,
  type ControlSpecification,
  type FootRollSpecification,
  type PlaceReference,
  SOLE_POINTS,
  type SolePoint,
  type Specification,
} from '../expand/types';
import { IDENTITY_QUAT } from '../math/quat';
import { distance, mix } from '../math/vec3';
import { orderByReads } from '../order/orderByReads';
import { type ResolveContext, reportUnknown } from '../resolve/Reporter';
import type { ResolvedRecipe } from '../resolve/types';
import type { Quat, Vec3 } from '../rig/Rig';
import type { Path } from '../syntax/types';
import { spreadByArcLength } from './arcLength';
import { chainFrames } from './chainFrames';
import { solveFindings } from './findings';
import { footPoints } from './footPoints';
import { polePosition } from './polePosition';
import type { FootPoints, RestPlace } from './types';

type Owner = ChainSpecification | ControlSpecification;

/**
 * Finds where chains and controls stand, each once, whatever order they are written in. A place that depends on
 * itself is a finding; what depends on a missing place is left out silently, since the cause was reported.
 */
export class PlaceSolver {
  readonly places = new Map<string, RestPlace>();
  readonly feet = new Map<string, FootPoints>();
  readonly #chainOfJoint = new Map<string, ChainSpecification>();
  readonly #controls: ReadonlyMap<string, ControlSpecification>;

  constructor(
    private readonly recipe: ResolvedRecipe,
    private readonly context: ResolveContext,
  ) {
    for (const chain of recipe.chains) for (const id of chain.jointIds) this.#chainOfJoint.set(id, chain);
    this.#controls = new Map(recipe.controls.map((control) => [control.id, control]));
  }

  solveAll(): void {
    const owners: readonly Owner[] = [...this.recipe.chains, ...this.recipe.controls];
    const { order, rings } = orderByReads(owners, (owner) => this.#ownersRead(owner));
    for (const ring of rings) {
      const span = this.context.document.spanAt(ring[0]?.path ?? [], 'key');
      const words = ring.map(({ id }) => `"${id}"`).join(' → ');
      this.context.findings.report(solveFindings, 'place-ring', span, { ring: words });
    }
    for (const owner of order) {
      if ('jointIds' in owner) this.#placeChain(owner);
      else this.#placeControl(owner);
    }
    for (const solver of this.recipe.solvers) if (solver.kind === 'foot_roll') this.#placeFoot(solver);
  }

  #placeFoot(solver: FootRollSpecification): void {
    const foot = this.places.get(solver.foot);
    const points = SOLE_POINTS.map((name) => this.#positionOf(solver.sole[name], solver, [name]));
    if (!foot || points.some((point) => point === null)) return;
    const sole = Object.fromEntries(
      SOLE_POINTS.map((name, index) => [name, points[index]]),
    ) as unknown as Readonly<Record<SolePoint, Vec3>>;
    const placed = footPoints(solver, sole, foot, this.recipe.scene.up, this.context);
    if (placed) this.feet.set(solver.id, placed);
  }

  /** The chains and controls that must be placed before this one. */
  #ownersRead(owner: Owner): readonly Owner[] {
    const named = (id: string): Owner | undefined =>
      this.recipe.landmarks.has(id) ? undefined : this.#chainOfJoint.get(id);
    const joints = (reference: PlaceReference): readonly (Owner | undefined)[] => {
      if (typeof reference === 'string') return [named(reference)];
      return 'from' in reference ? [named(reference.from), named(reference.to)] : [];
    };
    const thing = (id: string): Owner | undefined => this.#chainOfJoint.get(id) ?? this.#controls.get(id);
    const read: (Owner | undefined)[] = [];
    if ('jointIds' in owner) {
      read.push(...owner.points.flatMap(joints));
      if (owner.orient.like !== null) read.push(thing(owner.orient.like));
    } else {
      const { place, align } = owner;
      if (place.kind === 'place') read.push(...joints(place.at));
      else read.push(...place.joints.map(thing));
      if (align !== null) read.push(thing(align));
    }
    return read.filter((item) => item !== undefined);
  }

  #spanOf(owner: Specification, keys: Path) {
    return this.context.document.spanAt([...owner.path, ...keys]);
  }

  /** The world position of a landmark (on the owner's side), a joint or a literal point. */
  #positionOf(reference: PlaceReference, owner: Specification, keys: Path): Vec3 | null {
    if (typeof reference !== 'string') {
      if (!('from' in reference)) return reference;
      const from = this.#positionOf(reference.from, owner, [...keys, 'from']);
      const to = this.#positionOf(reference.to, owner, [...keys, 'to']);
      return from && to ? mix(from, to, reference.share ?? 0.5) : null;
    }
    const landmark = this.recipe.landmarks.get(reference);
    if (landmark) return owner.side === 'right' ? landmark.right : landmark.left;
    if (this.#chainOfJoint.has(reference)) return this.places.get(reference)?.position ?? null;
    const span = this.#spanOf(owner, keys);
    const candidates = [...this.recipe.landmarks.keys(), ...this.#chainOfJoint.keys()];
    reportUnknown(this.context, span, 'landmark or joint', reference, candidates);
    return null;
  }

  #placeChain(chain: ChainSpecification): void {
    const points = chain.points.map((point, index) => this.#positionOf(point, chain, ['points', index]));
    if (points.some((point) => point === null)) return;
    const positions = this.#jointPositions(chain, points as Vec3[]);
    if (!positions) return;
    const like = chain.orient.like === null ? undefined : this.places.get(chain.orient.like)?.turn;
    // A frame that could not be found was reported where it is missing.
    if (chain.orient.like !== null && !like) return;
    const frames = like ? positions.map(() => like) : chainFrames(chain, positions, this.recipe.scene);
    chain.jointIds.forEach((id, index) => {
      const position = positions[index];
      if (position) this.places.set(id, { position, turn: frames[index] ?? IDENTITY_QUAT });
    });
  }

  #jointPositions(chain: ChainSpecification, points: readonly Vec3[]): readonly Vec3[] | null {
    if (chain.count !== null) {
      const spread = spreadByArcLength(points, chain.count, chain.curve);
      if (!spread) {
        const span = this.#spanOf(chain, ['points']);
        this.context.findings.report(solveFindings, 'chain-without-length', span, {
          id: chain.id,
          count: chain.count,
        });
      }
      return spread;
    }
    const twin = points.findIndex(
      (point, index) => index > 0 && distance(point, points[index - 1] as Vec3) === 0,
    );
    if (twin < 0) return points;
    this.context.findings.report(solveFindings, 'zero-length-bone', this.#spanOf(chain, ['points', twin]), {
      first: chain.jointIds[twin - 1] ?? '',
      second: chain.jointIds[twin] ?? '',
    });
    return null;
  }

  #placeControl(control: ControlSpecification): void {
    const position = this.#controlPosition(control);
    const turn = this.#controlTurn(control);
    if (position && turn) this.places.set(control.id, { position, turn });
  }

  #controlTurn(control: ControlSpecification): Quat | null {
    return control.align === null ? IDENTITY_QUAT : (this.places.get(control.align)?.turn ?? null);
  }

  #controlPosition(control: ControlSpecification): Vec3 | null {
    const { place } = control;
    if (place.kind === 'place') return this.#positionOf(place.at, control, ['at']);
    const [start, mid, end] = place.joints.map((id) => this.places.get(id)?.position);
    if (!start || !mid || !end) return null;
    const pole = polePosition(start, mid, end, place.distance, place.bend);
    if (typeof pole !== 'string') return pole;
    const [startId, midId, endId] = place.joints;
    const parameters = { start: startId, mid: midId, end: endId };
    if (pole === 'straight') {
      const span = this.#spanOf(control, [control.part === null ? 'pole_of' : 'points']);
      this.context.findings.report(solveFindings, 'pole-undecided', span, parameters);
    } else {
      const span = this.#spanOf(control, control.part === null ? ['pole_of', 'bend'] : ['bend']);
      this.context.findings.report(solveFindings, 'bend-along-limb', span, parameters);
    }
    return null;
  }
}
