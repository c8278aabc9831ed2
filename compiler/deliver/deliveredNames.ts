import type { DeliveryProfile } from './DeliveryProfile';
import type { DeliveredJoint } from './skeleton';

/** The name of each delivered joint in a file: the receiver's own for a bone it knows, else the scene's name. */
export function deliveredNames(
  joints: readonly DeliveredJoint[],
  profile: DeliveryProfile,
): readonly string[] {
  const boneOf = new Map([...profile.bones].map(([bone, { joint }]) => [joint, bone]));
  return joints.map(({ node }) => boneOf.get(node.id) ?? node.name);
}
