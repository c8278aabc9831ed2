import { createPoser } from '@/compiler/pose/createPoser';
import type { PoseValues, Rig } from '@/compiler/rig/Rig';

type Values = Readonly<Record<string, unknown>>;
type Mutable = Record<string, unknown>;

/** Names as the script writes them, for the few that a rig spells otherwise. */
const SPELLED: Readonly<Record<string, string>> = {
  recipe_hash: 'recipeHash',
  house_hash: 'houseHash',
  keep_offset: 'keepOffset',
  up_axis: 'upAxis',
  stretch_limit: 'stretchLimit',
};

function spelled(values: Values): Mutable {
  return Object.fromEntries(Object.entries(values).map(([key, value]) => [SPELLED[key] ?? key, value]));
}

/** A 3D program in memory: it keeps what the adapter makes, and evaluates it with the reference evaluation. */
export class MemoryHost {
  readonly calls: string[] = [];
  #scene: Mutable = {};
  readonly #nodes: Mutable[] = [];
  readonly #links: Record<string, Mutable[]> = {
    constraints: [],
    solvers: [],
    spaces: [],
    drivers: [],
    skins: [],
    shapes: [],
  };

  #node(name: string): Mutable {
    const node = this.#nodes.find((one) => one.name === name);
    if (node === undefined) throw new Error(`no node "${name}"`);
    return node;
  }

  scene(name: string, values: Values): void {
    this.calls.push('scene');
    this.#scene = { character: name, ...spelled(values) };
  }

  node(kind: string, name: string, values: Values): void {
    this.calls.push('node');
    const extra =
      kind === 'control'
        ? { channels: {}, attributes: [] }
        : kind === 'joint'
          ? { limits: {} }
          : kind === 'note'
            ? { entries: [] }
            : {};
    this.#nodes.push({ kind, name, ...spelled(values), shown: true, selectable: true, ...extra });
  }

  attribute(control: string, values: Values): void {
    this.calls.push('attribute');
    (this.#node(control).attributes as Mutable[]).push({ ...values });
  }

  limit(name: string, { channel, min, max }: Values): void {
    this.calls.push('limit');
    const node = this.#node(name);
    const rules = (node.kind === 'joint' ? node.limits : node.channels) as Record<string, Mutable>;
    const locked = node.kind === 'joint' ? {} : { locked: rules[channel as string]?.locked ?? false };
    rules[channel as string] = { ...locked, min, max };
  }

  lock(name: string, { channels }: Values): void {
    this.calls.push('lock');
    const rules = this.#node(name).channels as Record<string, Mutable>;
    for (const channel of channels as readonly string[]) {
      rules[channel] = { min: null, max: null, ...rules[channel], locked: true };
    }
  }

  show(name: string, values: Values): void {
    this.calls.push('show');
    Object.assign(this.#node(name), values);
  }

  entry(name: string, values: Values): void {
    this.calls.push('entry');
    (this.#node(name).entries as Mutable[]).push({ ...values });
  }

  constrain(name: string, values: Values): void {
    this.calls.push('constrain');
    const { sources, weights, axis, upAxis, up, ...rest } = spelled(values);
    const weighed = (sources as readonly string[]).map((node, index) => ({
      node,
      weight: (weights as readonly number[])[index],
    }));
    const aim = rest.kind === 'aim' ? { axis, upAxis, up } : {};
    this.#links.constraints?.push({ name, ...rest, ...aim, sources: weighed });
  }

  #link(list: string, name: string, values: Values): void {
    this.#links[list]?.push({ name, ...spelled(values) });
  }

  space(name: string, values: Values): void {
    this.calls.push('space');
    this.#link('spaces', name, values);
  }

  drive(name: string, values: Values): void {
    this.calls.push('drive');
    this.#link('drivers', name, values);
  }

  solve(kind: string, name: string, values: Values): void {
    this.calls.push('solve');
    this.#link('solvers', name, { ...values, kind });
  }

  skin(name: string, values: Values): void {
    this.calls.push('skin');
    this.#link('skins', name, values);
  }

  shape(name: string, values: Values): void {
    this.calls.push('shape');
    this.#link('shapes', name, values);
  }

  done(): void {
    this.calls.push('done');
  }

  /** What was made, as the compiler's own type. */
  get rig(): Rig {
    return { scene: this.#scene, nodes: this.#nodes, ...this.#links } as unknown as Rig;
  }

  /** World matrices by node and weights by shape in a pose. */
  evaluate(pose: PoseValues): {
    readonly world: ReadonlyMap<string, readonly number[]>;
    readonly weights: ReadonlyMap<string, number>;
  } {
    const { rig } = this;
    const poser = createPoser(rig);
    poser.evaluate(pose);
    return {
      world: new Map(
        rig.nodes.map(({ name }, index) => [name, [...poser.world.subarray(index * 16, index * 16 + 16)]]),
      ),
      weights: new Map(rig.shapes.map(({ name }, index) => [name, poser.weights[index] ?? 0])),
    };
  }
}
