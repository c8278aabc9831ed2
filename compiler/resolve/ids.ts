/** Containers' nodes have ids of their own, so that a container and a control may share a word. */
export const CONTAINER_ID_PREFIX = 'container.';

/** Id of the node that carries the notes. */
export const NOTE_ID = 'notes';

/** Id of a container's node. */
export function containerNodeId(container: string): string {
  return `${CONTAINER_ID_PREFIX}${container}`;
}

/** Id of the group in which a thing sits that follows something in another container. */
export function seatId(occupant: string): string {
  return `${occupant}.seat`;
}

/** Id of the constraint by which a seat follows. */
export function seatFollowId(seat: string): string {
  return `${seat}_follow`;
}

/** Id of the link that lets an animator choose a control's space. */
export function spaceId(control: string): string {
  return `${control}_space`;
}

/** Collections of what links nodes; an id is one of its own in each. */
export type LinkCollection = 'constraints' | 'solvers' | 'spaces' | 'drivers' | 'skins' | 'shapes';

/** Key of a link's name. */
export function linkKey(collection: LinkCollection, id: string): string {
  return `${collection}/${id}`;
}
