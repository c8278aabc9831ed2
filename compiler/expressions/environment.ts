import { Environment } from '@marcbachmann/cel-js';

/** A point inside an expression. */
export interface ExpressionPoint {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** Whether a value can be read as a point: a landmark, or the result of mix or mid. */
export function isPoint(value: unknown): value is ExpressionPoint {
  if (typeof value !== 'object' || value === null) return false;
  const { x, y, z } = value as Partial<Record<'x' | 'y' | 'z', unknown>>;
  return typeof x === 'number' && typeof y === 'number' && typeof z === 'number';
}

function point(value: unknown): ExpressionPoint {
  if (isPoint(value)) return value;
  throw new TypeError('a point is needed here');
}

function number(value: unknown): number {
  if (typeof value === 'number') return value;
  throw new TypeError('a number is needed here');
}

function mixNumbers(a: number, b: number, t: number): number {
  return a * (1 - t) + b * t;
}

function mix(a: unknown, b: unknown, share: unknown): unknown {
  const t = number(share);
  if (typeof a === 'number') return mixNumbers(a, number(b), t);
  const [from, to] = [point(a), point(b)];
  return { x: mixNumbers(from.x, to.x, t), y: mixNumbers(from.y, to.y, t), z: mixNumbers(from.z, to.z, t) };
}

function dist(a: unknown, b: unknown): number {
  const [from, to] = [point(a), point(b)];
  const [x, y, z] = [to.x - from.x, to.y - from.y, to.z - from.z];
  return Math.sqrt(x * x + y * y + z * z);
}

/**
 * CEL as recipes use it: `params` and `landmarks` to read, a few geometric functions, and small bounds. It has no
 * loops and no way to anything else. It is built once and never changed.
 */
export const recipeEnvironment = new Environment({
  homogeneousAggregateLiterals: false,
  limits: { maxAstNodes: 400, maxDepth: 40, maxListElements: 16, maxMapEntries: 16, maxCallArguments: 8 },
})
  .registerVariable('params', 'map')
  .registerVariable('landmarks', 'map')
  .registerOperator('double % double', (a: number, b: number) => a % b)
  .registerFunction('dist(dyn, dyn): dyn', dist)
  .registerFunction('mix(dyn, dyn, dyn): dyn', mix)
  .registerFunction('mid(dyn, dyn): dyn', (a: unknown, b: unknown) => mix(a, b, 0.5))
  .registerFunction('min(dyn, dyn): dyn', (a: unknown, b: unknown) => Math.min(number(a), number(b)))
  .registerFunction('max(dyn, dyn): dyn', (a: unknown, b: unknown) => Math.max(number(a), number(b)))
  .registerFunction('abs(dyn): dyn', (a: unknown) => Math.abs(number(a)))
  .registerFunction('sqrt(dyn): dyn', (a: unknown) => Math.sqrt(number(a)))
  .registerFunction('clamp(dyn, dyn, dyn): dyn', (a: unknown, low: unknown, high: unknown) =>
    Math.min(Math.max(number(a), number(low)), number(high)),
  );
