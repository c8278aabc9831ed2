import fc from 'fast-check';
import { findEvaluationRing } from '@/compiler/pose/evaluationOrder';
import type {
  Axis,
  Channel,
  ChannelRule,
  JointNode,
  NumberOrAttribute,
  Rig,
  RigAttribute,
  RigConstraint,
  RigNode,
  RigScene,
  RigSolver,
} from '@/compiler/rig/Rig';
import { CHANNEL_NAMES, SHAPE_NAMES } from '@/compiler/slipway/verbs';
import { order, rotation } from '../math/arbitraries';

/** Texts that have ended strings, started lines or reordered screens somewhere before. */
const HOSTILE: readonly string[] = [
  '',
  ' ',
  '"',
  '\\',
  '\\"',
  '"\nend steps=1 sha256=""\n',
  'a\r\nb',
  'nul\u0000bell\u0007del\u007fc1\u0085',
  '\u2028\u2029',
  '\u202eevil\u202c\u2066\u2069\u200f\u061c',
  '\ufeff\u200b\u00ad',
  '\u{e0041}tagged',
  '__proto__',
  'constructor',
  'toString',
  '{{7*7}}',
  '{{{name}}}',
  '{{#each this}}',
  '<script>alert(1)</script>',
  "'; DROP TABLE nodes; --",
  '$(reboot)',
  '#',
  '//',
  'none',
  'attr("a" "b")',
  '\ud800lone',
  '👩‍🚀 ñ Ω 漢字',
  'x'.repeat(10_000),
];

export const text: fc.Arbitrary<string> = fc.oneof(
  { weight: 2, arbitrary: fc.constantFrom(...HOSTILE) },
  { weight: 3, arbitrary: fc.string({ unit: 'binary', maxLength: 20 }) },
  { weight: 3, arbitrary: fc.stringMatching(/^[a-z][a-z0-9_]{0,12}$/) },
);

/** Any finite double; −0 has no place in a rig. */
export const number: fc.Arbitrary<number> = fc
  .double({ noNaN: true, noDefaultInfinity: true })
  .map((value) => value + 0);

const optionalNumber = fc.option(number);

interface Range {
  readonly min: number | null;
  readonly max: number | null;
}

const range: fc.Arbitrary<Range> = fc
  .tuple(optionalNumber, optionalNumber)
  .map(([a, b]) => (a !== null && b !== null && a > b ? { min: b, max: a } : { min: a, max: b }));

const rule: fc.Arbitrary<ChannelRule> = fc
  .tuple(fc.boolean(), range)
  .map(([locked, limits]) => ({ locked, ...limits }))
  .filter(({ locked, min, max }) => locked || min !== null || max !== null);

const channels = fc
  .array(fc.tuple(fc.constantFrom(...CHANNEL_NAMES), rule), { maxLength: 4 })
  .map((entries): Readonly<Partial<Record<Channel, ChannelRule>>> => Object.fromEntries(entries));

const limits = fc
  .array(fc.tuple(fc.constantFrom('rx', 'ry', 'rz'), range), { maxLength: 2 })
  .map((entries): JointNode['limits'] => Object.fromEntries(entries));

const attributes: fc.Arbitrary<readonly RigAttribute[]> = fc.uniqueArray(
  fc
    .tuple(text, range, number, fc.option(fc.array(text, { maxLength: 3 })), fc.option(text))
    .map(([name, { min, max }, value, labels, note]) => ({
      name,
      default: Math.min(Math.max(value, min ?? -Infinity), max ?? Infinity),
      min,
      max,
      labels,
      note,
    })),
  { maxLength: 3, selector: ({ name }) => name },
);

const entries = fc.uniqueArray(fc.record({ key: text, value: fc.oneof(text, number, fc.boolean()) }), {
  maxLength: 4,
  selector: ({ key }) => key,
});

const axis = fc.constantFrom<Axis>('+x', '-x', '+y', '-y', '+z', '-z');

const scene: fc.Arbitrary<RigScene> = fc.record({
  character: text,
  recipe: text,
  house: text,
  up: axis,
  forward: axis,
  unit: fc.constantFrom('mm', 'cm', 'm'),
  recipeHash: text,
  houseHash: text,
  compiler: text,
});

const seed = fc.record({
  kind: fc.constantFrom<RigNode['kind']>('group', 'joint', 'control', 'line', 'note', 'geometry'),
  name: text,
  id: text,
  above: fc.nat(),
  container: text,
  role: text,
  side: fc.constantFrom('left', 'right', 'centre'),
  at: fc.tuple(number, number, number),
  turn: rotation.map((q) => q.map((value) => value + 0) as unknown as typeof q),
  shown: fc.boolean(),
  selectable: fc.boolean(),
  order,
  shape: fc.constantFrom(...SHAPE_NAMES),
  size: number,
  channels,
  limits,
  attributes,
  entries,
  ends: fc.tuple(fc.nat(), fc.nat()),
  style: fc.constantFrom('dotted', 'dashed', 'solid'),
});

type Seed = typeof seed extends fc.Arbitrary<infer T> ? T : never;

function nodeOf(one: Seed, before: readonly RigNode[]): RigNode {
  const { name, id, container, role, side, at, turn, shown, selectable, order: rotationOrder } = one;
  const pick = (index: number): string => before[index % before.length]?.name ?? name;
  const parent = before.length === 0 || one.above % 5 === 0 ? null : pick(one.above);
  const base = { id, name, parent, container, role, side, at, turn, shown, selectable };
  switch (one.kind) {
    case 'joint':
      return { ...base, kind: 'joint', order: rotationOrder, limits: one.limits };
    case 'control': {
      const { shape, size, channels: rules, attributes: own } = one;
      return {
        ...base,
        kind: 'control',
        order: rotationOrder,
        shape,
        size,
        channels: rules,
        attributes: own,
      };
    }
    case 'note':
      return { ...base, kind: 'note', entries: one.entries };
    case 'line':
      if (before.length === 0) return { ...base, kind: 'group' };
      return { ...base, kind: 'line', from: pick(one.ends[0]), to: pick(one.ends[1]), style: one.style };
    case 'geometry':
      return { ...base, kind: 'geometry', mesh: one.container };
    default:
      return { ...base, kind: 'group' };
  }
}

const linkSeed = fc.record({
  name: text,
  id: text,
  kind: fc.constantFrom<RigConstraint['kind']>('parent', 'point', 'orient', 'scale', 'aim'),
  axes: fc.tuple(axis, axis).filter(([first, second]) => first[1] !== second[1]),
  target: fc.nat(),
  sources: fc.array(
    fc.tuple(
      fc.nat(),
      fc.double({ min: 0, max: 1e6, noNaN: true }).map((value) => value + 0),
    ),
    {
      minLength: 1,
      maxLength: 3,
    },
  ),
  keepOffset: fc.boolean(),
  blend: fc.oneof(number, fc.nat()),
  byAttribute: fc.boolean(),
});

type LinkSeed = typeof linkSeed extends fc.Arbitrary<infer T> ? T : never;

/** A number, or an attribute of some control when there is one. */
function blendOf({ blend, byAttribute }: LinkSeed, nodes: readonly RigNode[]): NumberOrAttribute {
  const choices = nodes.flatMap((node) =>
    node.kind === 'control'
      ? node.attributes.map(({ name }) => ({ control: node.name, attribute: name }))
      : [],
  );
  return (
    (byAttribute ? choices[Math.abs(Math.trunc(blend)) % Math.max(1, choices.length)] : undefined) ?? blend
  );
}

/** Constraints whose sources were made before their targets, so that nothing can follow itself. */
function constraintsOf(seeds: readonly LinkSeed[], nodes: readonly RigNode[]): readonly RigConstraint[] {
  return seeds.flatMap((one) => {
    const target = 1 + (one.target % Math.max(1, nodes.length - 1));
    const node = nodes[target];
    if (node === undefined) return [];
    const sources = one.sources.map(([index, weight]) => ({
      node: nodes[index % target]?.name ?? '',
      weight,
    }));
    const blend = sources.length === 2 && one.blend !== 0 ? blendOf(one, nodes) : null;
    const { id, name, kind, keepOffset } = one;
    const base = { id, name, target: node.name, sources, blend, keepOffset };
    const [main, upAxis] = one.axes;
    const up = one.byAttribute ? null : (sources[0]?.node ?? null);
    return [kind === 'aim' ? { ...base, kind, axis: main, upAxis, up } : { ...base, kind }];
  });
}

type OtherLinks = Pick<Rig, 'spaces' | 'drivers' | 'skins' | 'shapes'>;

/** Spaces, drivers, skins and shapes on whatever controls and meshes there are. */
function otherLinksOf(
  seeds: readonly LinkSeed[],
  nodes: readonly RigNode[],
  isFree: (link: { readonly name: string }) => boolean,
): OtherLinks {
  const control = nodes.find((node) => node.kind === 'control' && node.attributes.length > 0);
  const geometry = nodes.find(({ kind }) => kind === 'geometry');
  const joints = nodes.filter(({ kind }) => kind === 'joint').map(({ name }) => name);
  const attribute = (control?.kind === 'control' ? control.attributes[0]?.name : undefined) ?? '';
  const links = seeds.map((one) => ({ id: one.id, name: `${one.name}\u0002`, seed: one })).filter(isFree);
  const [space, driver, skin, shape] = links;
  const first = nodes[0]?.name ?? '';
  return {
    spaces:
      space === undefined || control === undefined
        ? []
        : [
            {
              id: space.id,
              name: space.name,
              control: control.name,
              attribute,
              sources: [first],
              follow: space.seed.keepOffset ? 'all' : 'turn',
            },
          ],
    drivers:
      driver === undefined || control === undefined
        ? []
        : [
            {
              id: driver.id,
              name: driver.name,
              control: control.name,
              input: driver.seed.keepOffset ? attribute : 'ty',
              target: first,
              channel: 'rz',
              inputs: [-1, 0.1, 2],
              outputs: driver.seed.sources
                .map(([, weight]) => weight)
                .concat([0, 0, 0])
                .slice(0, 3),
              curve: driver.seed.byAttribute ? 'smooth' : 'linear',
              beyond: driver.seed.keepOffset ? 'hold' : 'extend',
            },
          ],
    skins:
      skin === undefined || geometry === undefined || joints.length === 0
        ? []
        : [{ id: skin.id, name: skin.name, geometry: geometry.name, joints, influences: 4 }],
    shapes:
      shape === undefined || geometry === undefined
        ? []
        : [
            {
              id: shape.id,
              name: shape.name,
              geometry: geometry.name,
              morph: shape.id,
              weight: blendOf(shape.seed, nodes),
            },
          ],
  };
}

/** A solver on the first three joints that hang in a row, when goal and pole can stand before them. */
function solversOf(one: LinkSeed, nodes: readonly RigNode[]): readonly RigSolver[] {
  const byName = new Map(nodes.map((node) => [node.name, node]));
  for (const end of nodes) {
    const mid = byName.get(end.parent ?? '\u0000none');
    const start = byName.get(mid?.parent ?? '\u0000none');
    const goal = nodes[0];
    if (mid === undefined || start === undefined || goal === undefined || nodes.indexOf(start) < 1) continue;
    if (![start, mid, end].every(({ kind }) => kind === 'joint')) continue;
    const joints = { start: start.name, mid: mid.name, end: end.name };
    return [
      {
        kind: 'two_bone',
        id: one.id,
        name: one.name,
        ...joints,
        goal: goal.name,
        pole: goal.name,
        blend: blendOf(one, nodes),
        stretch: blendOf(one, nodes),
        stretchLimit: 1.5,
        soft: 0.25,
        swing: blendOf(one, nodes),
      },
    ];
  }
  return [];
}

/** Three joints in a row below the last node, so that most rigs have something to solve. */
function limbOf(nodes: readonly RigNode[]): readonly RigNode[] {
  const joints: RigNode[] = [];
  for (const name of ['\u0001 start', '\u0001 mid', '\u0001 end']) {
    const parent = joints[joints.length - 1]?.name ?? nodes[nodes.length - 1]?.name ?? null;
    const base = {
      id: name,
      name,
      parent,
      container: '',
      role: '',
      side: 'left',
      at: [1, 0, 0.25],
      turn: [0, 0, 0, 1],
    } as const;
    joints.push({ ...base, shown: true, selectable: true, kind: 'joint', order: 'xyz', limits: {} });
  }
  return joints;
}

/** Any sound rig, with hostile texts and numbers of every size in it. */
export const arbitraryRig: fc.Arbitrary<Rig> = fc
  .record({
    scene,
    seeds: fc.uniqueArray(seed, { minLength: 1, maxLength: 12, selector: ({ name }) => name }),
    withLimb: fc.boolean(),
    links: fc.array(linkSeed, { maxLength: 4 }),
    solver: linkSeed,
  })
  .map(({ scene: opened, seeds, withLimb, links, solver }) => {
    const nodes: RigNode[] = [];
    for (const one of seeds) nodes.push(nodeOf(one, nodes));
    if (withLimb) nodes.push(...limbOf(nodes));
    const taken = new Set(nodes.map(({ name }) => name));
    const isFree = ({ name }: { readonly name: string }): boolean =>
      !taken.has(name) && Boolean(taken.add(name));
    const constraints = constraintsOf(links, nodes).filter(isFree);
    const solvers = solversOf(solver, nodes).filter(isFree);
    const rig: Rig = { scene: opened, nodes, constraints, solvers, ...otherLinksOf(links, nodes, isFree) };
    // A middle joint that follows something the solver has moved would wait for itself.
    return findEvaluationRing(rig) === null ? rig : { ...rig, constraints: [], spaces: [] };
  });
