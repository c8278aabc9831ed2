import { withoutSide } from '../expand/sides';
import type { Side } from '../rig/Rig';
import type { HouseRules } from '../schema/generated/houseTypes';
import type { Path } from '../syntax/types';
import { resolveFindings } from './findings';
import { CONTAINER_ID_PREFIX } from './ids';
import type { ResolveContext } from './Reporter';
import type { ResolvedRole } from './types';

interface Naming {
  readonly pattern: readonly string[];
  readonly separator: string;
  readonly digits: number;
  readonly longest: number;
  readonly sides: Readonly<Record<Side, string>>;
}

function readNaming(rules: HouseRules['naming']): Naming {
  return {
    pattern: rules.pattern,
    separator: rules.separator ?? '_',
    digits: rules.index_digits ?? 2,
    longest: rules.longest ?? 64,
    sides: {
      left: rules.sides?.left ?? 'l',
      right: rules.sides?.right ?? 'r',
      centre: rules.sides?.centre ?? '',
    },
  };
}

const ALL_DIGITS = /^[0-9]+$/;
const LEGAL_START = /^[A-Za-z_]/;

/** What is named; `side` null leaves the side out (containers, notes). */
export interface Nameable {
  readonly id: string;
  readonly role: string;
  readonly side: Side | null;
  readonly path: Path;
}

/**
 * Gives every id its name in the scene by the naming pattern, and reports names that are taken, too long or not
 * legal. Names hold only letters, digits and underscores, because every token does.
 */
export class NodeNamer {
  readonly #naming: Naming;
  readonly #owners = new Map<string, Nameable>();

  constructor(
    private readonly context: ResolveContext,
    private readonly character: string,
    private readonly roles: ReadonlyMap<string, ResolvedRole>,
  ) {
    this.#naming = readNaming(context.house.rules.naming);
  }

  #compose(thing: Nameable): string {
    const { pattern, separator, digits, sides } = this.#naming;
    const bare = thing.id.startsWith(CONTAINER_ID_PREFIX)
      ? thing.id.slice(CONTAINER_ID_PREFIX.length)
      : thing.id;
    const segments = withoutSide(bare).split('.');
    const last = segments[segments.length - 1] ?? '';
    const counted = segments.length > 1 && ALL_DIGITS.test(last);
    const token = (name: string): string => {
      switch (name) {
        case 'character':
          return this.character;
        case 'role':
          return this.roles.get(thing.role)?.token ?? '';
        case 'side':
          return thing.side === null ? '' : sides[thing.side];
        case 'path':
          return (counted ? segments.slice(0, -1) : segments).join('_');
        case 'leaf':
          return last;
        default:
          return counted ? last.padStart(digits, '0') : '';
      }
    };
    return pattern.map(token).filter(Boolean).join(separator);
  }

  /** The thing's name; findings about it point at where the thing was written. */
  name(thing: Nameable): string {
    const name = this.#compose(thing);
    const span = () => this.context.document.spanAt(thing.path, 'key');
    const { findings } = this.context;
    const owner = this.#owners.get(name);
    if (owner) {
      findings.report(
        resolveFindings,
        'name-taken',
        span(),
        { first: owner.id, second: thing.id, name },
        { related: [{ span: this.context.document.spanAt(owner.path, 'key'), label: `"${owner.id}"` }] },
      );
    } else {
      this.#owners.set(name, thing);
    }
    const { longest } = this.#naming;
    if (name.length > longest) {
      findings.report(resolveFindings, 'name-too-long', span(), {
        id: thing.id,
        name,
        length: name.length,
        longest,
      });
    }
    if (!LEGAL_START.test(name)) {
      findings.report(resolveFindings, 'name-not-legal', span(), { id: thing.id, name });
    }
    return name;
  }
}
