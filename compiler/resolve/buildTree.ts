import type { ChainSpecification, ControlSpecification, ExpandedRecipe } from '../expand/types';
import { orderByReads } from '../order/orderByReads';
import type { Side } from '../rig/Rig';
import type { Path } from '../syntax/types';
import type { Owner } from './checkParentRings';
import type { LinkedRecipe } from './checkReferences';
import { CARRIER_ROLE } from './findCarrier';
import { resolveFindings } from './findings';
import { containerNodeId, NOTE_ID, seatId } from './ids';
import type { NodeNamer } from './NodeNamer';
import { type ResolveContext, reportUnknown } from './Reporter';
import { RIG_CONTAINER } from './resolveContainers';
import type { ResolvedContainer, ResolvedNode, ResolvedRole, Seat } from './types';

interface Draft {
  readonly id: string;
  readonly kind: ResolvedNode['kind'];
  readonly role: string;
  readonly side: Side | null;
  readonly container: string;
  readonly parent: string | null;
  readonly path: Path;
}

interface TreeInput {
  readonly linked: LinkedRecipe;
  readonly notes: ExpandedRecipe['notes'];
  readonly containers: ReadonlyMap<string, ResolvedContainer>;
  readonly roles: ReadonlyMap<string, ResolvedRole>;
  readonly carrier: ControlSpecification | null;
  /** Owners on a ring, whose parents are not followed. */
  readonly onRing: ReadonlySet<Owner>;
  readonly context: ResolveContext;
  readonly namer: NodeNamer;
}

/** The tree of nodes, parents first, and the seats that were put in. */
export interface Tree {
  readonly nodes: readonly ResolvedNode[];
  readonly seats: readonly Seat[];
}

/**
 * Puts every thing into the container of its role. A thing hangs directly on its recipe parent when both lie in
 * one container; otherwise it sits in a seat inside its own container that follows the parent, so that hiding,
 * showing or exporting a container always takes exactly the things of its class. Carried containers hang beneath
 * the carrier, which thereby moves each thing in them exactly once.
 */
export function buildTree(input: TreeInput): Tree {
  const { linked, notes, containers, roles, carrier, onRing, context, namer } = input;
  const drafts = new Map<string, Draft>();
  const seats: Seat[] = [];
  const carrierContainer = roles.get(CARRIER_ROLE)?.container ?? null;

  const containerOf = (role: string, path: Path): string => {
    const resolved = roles.get(role);
    if (!resolved)
      reportUnknown(context, context.document.spanAt([...path, 'role']), 'role', role, roles.keys());
    return resolved?.container ?? RIG_CONTAINER;
  };

  const addContainers = (): void => {
    const rig = containerNodeId(RIG_CONTAINER);
    drafts.set(rig, {
      id: rig,
      kind: 'group',
      role: 'container',
      side: null,
      container: RIG_CONTAINER,
      parent: null,
      path: [],
    });
    for (const { id, parent, carried } of containers.values()) {
      const beneathCarrier =
        carrier !== null &&
        carried &&
        id !== carrierContainer &&
        (parent === null || parent === carrierContainer);
      drafts.set(containerNodeId(id), {
        id: containerNodeId(id),
        kind: 'group',
        role: 'container',
        side: null,
        container: parent ?? RIG_CONTAINER,
        parent: beneathCarrier ? carrier.id : containerNodeId(parent ?? RIG_CONTAINER),
        path: ['containers', id],
      });
    }
  };

  /** Where a chain's first joint or a control hangs; makes the seat when its parent lies elsewhere. */
  const hang = (
    occupant: string,
    parent: string | null,
    container: string,
    side: Side,
    path: Path,
  ): string => {
    const group = containerNodeId(container);
    const parentDraft = parent === null ? undefined : drafts.get(parent);
    if (parent === null || !parentDraft) return group;
    if (parentDraft.container === container) return parent;
    const alreadyCarried = carrier?.id === parent && containers.get(container)?.carried === true;
    if (alreadyCarried) return group;
    const seat = seatId(occupant);
    drafts.set(seat, { id: seat, kind: 'group', role: 'seat', side, container, parent: group, path });
    seats.push({ id: seat, occupant, follows: parent });
    return seat;
  };

  const addChain = (chain: ChainSpecification, parent: string | null): void => {
    const container = containerOf(chain.role, chain.path);
    const [first] = chain.jointIds;
    if (first === undefined) return;
    let above = hang(first, parent, container, chain.side, chain.path);
    for (const id of chain.jointIds) {
      if (drafts.has(id)) continue;
      drafts.set(id, {
        id,
        kind: 'joint',
        role: chain.role,
        side: chain.side,
        container,
        parent: above,
        path: chain.path,
      });
      above = id;
    }
  };

  const addControl = (control: ControlSpecification, parent: string | null): void => {
    const container = containerOf(control.role, control.path);
    if (containers.get(container)?.carried === false) {
      const span = context.document.spanAt(control.path, 'key');
      context.findings.report(resolveFindings, 'control-in-parked-container', span, {
        id: control.id,
        container,
      });
    }
    const above = hang(control.id, parent, container, control.side, control.path);
    drafts.set(control.id, {
      id: control.id,
      kind: 'control',
      role: control.role,
      side: control.side,
      container,
      parent: above,
      path: control.path,
    });
  };

  const addJointsAndControls = (): void => {
    const { chains, controls } = linked;
    const owners = new Map<string, Owner>();
    for (const chain of chains) for (const id of chain.jointIds) owners.set(id, chain);
    for (const control of controls) owners.set(control.id, control);
    const parentOf = (owner: Owner): string | null => (onRing.has(owner) ? null : owner.parent);
    // A parent must be drafted before its children ask for its container, whatever order they are written in.
    const written = new Set<Owner>([...(carrier ? [carrier] : []), ...chains, ...controls]);
    const { order } = orderByReads([...written], (owner) => {
      const parent = owners.get(parentOf(owner) ?? '');
      return parent ? [parent] : [];
    });
    for (const owner of order) {
      if ('jointIds' in owner) addChain(owner, parentOf(owner));
      else addControl(owner, parentOf(owner));
    }
  };

  const addGeometry = (): void => {
    for (const { id, role, side, path } of linked.geometry) {
      const container = containerOf(role, path);
      const parent = containerNodeId(container);
      drafts.set(id, { id, kind: 'geometry', role, side, container, parent, path });
    }
  };

  const addLinesAndNotes = (): void => {
    for (const line of linked.guideLines) {
      const container = containerOf('guide_line', line.path);
      const parent = containerNodeId(container);
      drafts.set(line.id, {
        id: line.id,
        kind: 'line',
        role: 'guide_line',
        side: line.side,
        container,
        parent,
        path: line.path,
      });
    }
    if (notes.length > 0) {
      const container = containerOf('note', ['notes']);
      drafts.set(NOTE_ID, {
        id: NOTE_ID,
        kind: 'note',
        role: 'note',
        side: null,
        container,
        parent: containerNodeId(container),
        path: ['notes'],
      });
    }
  };

  const resolveNode = (draft: Draft): ResolvedNode => {
    const role = roles.get(draft.role);
    const place = containers.get(
      draft.kind === 'group' && draft.role === 'container' ? ownContainer(draft.id) : draft.container,
    );
    return {
      id: draft.id,
      name: namer.name(draft),
      kind: draft.kind,
      parent: draft.parent,
      container: draft.container,
      role: draft.role,
      side: draft.side ?? 'centre',
      shown: (role?.shown ?? true) && (place?.shown ?? true),
      selectable: role?.selectable ?? true,
      path: draft.path,
    };
  };

  addContainers();
  addJointsAndControls();
  addGeometry();
  addLinesAndNotes();
  return { nodes: parentsFirst(drafts).map(resolveNode), seats };
}

function ownContainer(nodeId: string): string {
  return nodeId.slice(containerNodeId('').length);
}

/**
 * Orders drafts depth first from the rig's group, children in the order they were added; guide lines last, so that
 * both ends of each come before it.
 */
function parentsFirst(drafts: ReadonlyMap<string, Draft>): readonly Draft[] {
  const children = new Map<string | null, Draft[]>();
  for (const draft of drafts.values()) {
    const siblings = children.get(draft.parent);
    if (siblings) siblings.push(draft);
    else children.set(draft.parent, [draft]);
  }
  const ordered: Draft[] = [];
  const pending = [...(children.get(null) ?? [])];
  for (let draft = pending.pop(); draft; draft = pending.pop()) {
    ordered.push(draft);
    const below = children.get(draft.id) ?? [];
    for (let index = below.length - 1; index >= 0; index -= 1) pending.push(below[index] as Draft);
  }
  return [...ordered.filter(({ kind }) => kind !== 'line'), ...ordered.filter(({ kind }) => kind === 'line')];
}
