import {
  addScaledInto,
  copyVec,
  distanceOf,
  dotOf,
  type Mutable,
  makeVec,
  normaliseInto,
  perpendicularInto,
  rejectInto,
  subInto,
} from '../math/inPlace';

/** Straight pieces that the curve is measured by, for each span between its knots. */
const PIECES_PER_SPAN = 16;

/**
 * A clamped uniform B-spline of degree 3 (fewer for fewer than four control points) with its length and its
 * rotation-minimising frames measured at even parameters. Made once; measured again for every pose.
 */
export class SplineCurve {
  /** Control points in the world, to be written before `measure`. */
  readonly points: readonly Mutable[];
  /** Length of the curve, as the sum of its straight pieces. */
  length = 0;
  readonly #degree: number;
  readonly #spans: number;
  readonly #pieces: number;
  readonly #work: readonly Mutable[];
  /** At each sample: place, unit tangent, unit normal, and length run so far. */
  readonly #places: readonly Mutable[];
  readonly #tangents: readonly Mutable[];
  readonly #normals: readonly Mutable[];
  readonly #runs: Float64Array;
  readonly #difference = makeVec();

  constructor(count: number) {
    this.points = Array.from({ length: count }, () => makeVec());
    this.#degree = Math.min(3, count - 1);
    this.#spans = count - this.#degree;
    this.#pieces = this.#spans * PIECES_PER_SPAN;
    this.#work = Array.from({ length: this.#degree + 1 }, () => makeVec());
    const samples = { length: this.#pieces + 1 };
    this.#places = Array.from(samples, () => makeVec());
    this.#tangents = Array.from(samples, () => makeVec());
    this.#normals = Array.from(samples, () => makeVec());
    this.#runs = new Float64Array(this.#pieces + 1);
  }

  #knot(index: number): number {
    return Math.min(this.#spans, Math.max(0, index - this.#degree));
  }

  /** Place and direction (not of length one) at parameter 0 … spans, by de Boor's algorithm. */
  #evaluate(parameter: number, place: Mutable, direction: Mutable): void {
    const degree = this.#degree;
    const span = Math.min(this.#spans - 1, Math.floor(parameter));
    const knotIndex = span + degree;
    for (let i = 0; i <= degree; i += 1) copyVec(this.#work[i] as Mutable, this.points[span + i] as Mutable);
    for (let level = 1; level <= degree; level += 1) {
      if (level === degree) {
        // The last two points lie on the tangent; their distance scales with the last knot interval, here one.
        subInto(direction, this.#work[degree] as Mutable, this.#work[degree - 1] as Mutable);
      }
      for (let i = degree; i >= level; i -= 1) {
        const low = this.#knot(i + knotIndex - degree);
        const high = this.#knot(i + 1 + knotIndex - level);
        const share = (parameter - low) / (high - low);
        const here = this.#work[i] as Mutable;
        const before = this.#work[i - 1] as Mutable;
        subInto(this.#difference, here, before);
        addScaledInto(here, before, this.#difference, share);
      }
    }
    copyVec(place, this.#work[degree] as Mutable);
  }

  /** Measures the curve through `points`; its normals start from the part of `side` at right angles to it. */
  measure(side: Mutable): void {
    for (let i = 0; i <= this.#pieces; i += 1) {
      const place = this.#places[i] as Mutable;
      const tangent = this.#tangents[i] as Mutable;
      const normal = this.#normals[i] as Mutable;
      this.#evaluate((i * this.#spans) / this.#pieces, place, tangent);
      normaliseInto(tangent, tangent);
      if (i === 0) {
        this.#runs[0] = 0;
        rejectInto(normal, side, tangent);
        if (dotOf(normal, normal) > NORMAL_NOISE) normaliseInto(normal, normal);
        else perpendicularInto(normal, tangent);
        continue;
      }
      const before = i - 1;
      // Where control points coincide the curve may stand still and has no direction: it keeps the one before.
      if (dotOf(tangent, tangent) === 0) copyVec(tangent, this.#tangents[before] as Mutable);
      this.#runs[i] = (this.#runs[before] as number) + distanceOf(place, this.#places[before] as Mutable);
      doubleReflectInto(
        normal,
        this.#places[before] as Mutable,
        this.#tangents[before] as Mutable,
        this.#normals[before] as Mutable,
        place,
        tangent,
      );
    }
    this.length = this.#runs[this.#pieces] as number;
  }

  /** Writes the unit tangent and normal at the end of the curve. */
  endInto(tangent: Mutable, normal: Mutable): void {
    copyVec(tangent, this.#tangents[this.#pieces] as Mutable);
    copyVec(normal, this.#normals[this.#pieces] as Mutable);
  }

  /** Writes place, unit tangent and normal where the curve has run `run` of its length; beyond its end, straight on. */
  atLengthInto(run: number, place: Mutable, tangent: Mutable, normal: Mutable): void {
    let low = 0;
    let high = this.#pieces;
    if (run >= this.length) {
      this.endInto(tangent, normal);
      addScaledInto(place, this.#places[high] as Mutable, tangent, run - this.length);
      return;
    }
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if ((this.#runs[middle] as number) <= run) low = middle;
      else high = middle;
    }
    const from = this.#runs[low] as number;
    const size = (this.#runs[high] as number) - from;
    const share = size > 0 ? (run - from) / size : 0;
    this.#evaluate(((low + share) * this.#spans) / this.#pieces, place, tangent);
    normaliseInto(tangent, tangent);
    if (dotOf(tangent, tangent) === 0) copyVec(tangent, this.#tangents[low] as Mutable);
    doubleReflectInto(
      normal,
      this.#places[low] as Mutable,
      this.#tangents[low] as Mutable,
      this.#normals[low] as Mutable,
      place,
      tangent,
    );
  }
}

/** Squared length below which a start direction lies along the curve. */
const NORMAL_NOISE = 1e-12;

const reflection = makeVec();
const reflectedTangent = makeVec();

/**
 * Writes the rotation-minimising normal at the second place by double reflection (Wang, Jüttler, Zheng and Liu 2008):
 * reflect the first frame in the plane between both places, then in the plane between the reflected and the second
 * tangent. Places that coincide leave out the first reflection, tangents that then agree the second. `out` may be no
 * other argument.
 */
export function doubleReflectInto(
  out: Mutable,
  from: Mutable,
  fromTangent: Mutable,
  fromNormal: Mutable,
  to: Mutable,
  toTangent: Mutable,
): void {
  copyVec(out, fromNormal);
  copyVec(reflectedTangent, fromTangent);
  subInto(reflection, to, from);
  let square = dotOf(reflection, reflection);
  if (square > 0) {
    addScaledInto(out, out, reflection, (-2 * dotOf(reflection, fromNormal)) / square);
    addScaledInto(reflectedTangent, fromTangent, reflection, (-2 * dotOf(reflection, fromTangent)) / square);
  }
  subInto(reflection, toTangent, reflectedTangent);
  square = dotOf(reflection, reflection);
  if (square > 0) addScaledInto(out, out, reflection, (-2 * dotOf(reflection, out)) / square);
  // Rounding adds up along a curve; the normal is brought back to a right angle at every step.
  rejectInto(out, out, toTangent);
  normaliseInto(out, out);
}
