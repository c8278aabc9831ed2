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

type RecipeFunction = (...given: readonly unknown[]) => unknown;

/** The functions of expressions: how many values each takes, and what it gives. */
const FUNCTIONS: Readonly<Record<string, { readonly takes: number; readonly give: RecipeFunction }>> = {
  dist: { takes: 2, give: (a, b) => dist(a, b) },
  mix: { takes: 3, give: (a, b, share) => mix(a, b, share) },
  mid: { takes: 2, give: (a, b) => mix(a, b, 0.5) },
  min: { takes: 2, give: (a, b) => Math.min(number(a), number(b)) },
  max: { takes: 2, give: (a, b) => Math.max(number(a), number(b)) },
  abs: { takes: 1, give: (a) => Math.abs(number(a)) },
  sqrt: { takes: 1, give: (a) => Math.sqrt(number(a)) },
  clamp: {
    takes: 3,
    give: (a, low, high) => Math.min(Math.max(number(a), number(low)), number(high)),
  },
};

/** Names of all functions that an expression may call. */
export const recipeFunctionNames: readonly string[] = Object.keys(FUNCTIONS);

function createEnvironment(): Environment {
  const environment = new Environment({
    homogeneousAggregateLiterals: false,
    limits: { maxAstNodes: 400, maxDepth: 40, maxListElements: 16, maxMapEntries: 16, maxCallArguments: 8 },
  })
    .registerVariable('params', 'map')
    .registerVariable('landmarks', 'map')
    .registerOperator('double % double', (a: number, b: number) => a % b);
  for (const [name, { takes, give }] of Object.entries(FUNCTIONS)) {
    environment.registerFunction(`${name}(${Array(takes).fill('dyn').join(', ')}): dyn`, give);
  }
  return environment;
}

/**
 * CEL as recipes use it: `params` and `landmarks` to read, a few geometric functions, and small bounds. It has no
 * way to anything else; that recipes call no function of CEL's own is seen to where they are parsed. It is built
 * once and never changed.
 */
export const recipeEnvironment = createEnvironment();
