import type { Mat4 } from '../math/mat4';
import type { PoseValues, RigSpace } from '../rig/Rig';
import { channelsToward, withoutChannels, withValues } from './matchControl';
import type { RigReader } from './RigReader';

/**
 * The pose in which a control follows another of its spaces and stands in the world as it did: the attribute takes
 * `choice`, the control's channels make up for it. Exact where its channels are free and no driver moves it.
 */
export function matchSpace(
  reader: RigReader,
  space: RigSpace,
  choice: number,
  pose: PoseValues = {},
): PoseValues {
  const { control, attribute } = space;
  const [before] = reader.worldOf(pose, [control]);
  const switched = withValues(withoutChannels(pose, control), control, { [attribute]: choice });
  const [bare] = reader.worldOf(switched, [control]);
  const values = channelsToward(reader.control(control), bare as Mat4, before as Mat4);
  return withValues(switched, control, values);
}
