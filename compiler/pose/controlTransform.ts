import { ORDER_AXES, RADIANS_PER_DEGREE } from '../math/euler';
import type { ControlNode, PoseValues } from '../rig/Rig';
import { CHANNELS, channelValue } from './channelValues';

/** Channel values of one control while it is evaluated; one is reused for all of them. */
export type ChannelBuffer = Float64Array;

/** Reads all nine channels of a control into `buffer`; false, with the buffer of no use, when all read rest. */
export function readChannels(control: ControlNode, pose: PoseValues, buffer: ChannelBuffer): boolean {
  if (!Object.hasOwn(pose, control.name)) return false;
  let moved = false;
  for (let i = 0; i < 9; i += 1) {
    const value = channelValue(control, CHANNELS[i] as (typeof CHANNELS)[number], pose);
    buffer[i] = value;
    if (value !== (i < 6 ? 0 : 1)) moved = true;
  }
  return moved;
}

/** Writes translate × rotate × scale of the channel values as a column-major matrix; nothing is allocated. */
export function writeChannelMatrix(
  order: ControlNode['order'],
  values: ChannelBuffer,
  out: Float64Array,
): void {
  const [i, j, k, parity] = ORDER_AXES[order];
  const a = parity * RADIANS_PER_DEGREE * (values[3 + i] as number);
  const b = parity * RADIANS_PER_DEGREE * (values[3 + j] as number);
  const c = parity * RADIANS_PER_DEGREE * (values[3 + k] as number);
  const sa = Math.sin(a);
  const ca = Math.cos(a);
  const sb = Math.sin(b);
  const cb = Math.cos(b);
  const sc = Math.sin(c);
  const cc = Math.cos(c);
  const si = values[6 + i] as number;
  const sj = values[6 + j] as number;
  const sk = values[6 + k] as number;
  // R = Rk·Rj·Ri written out; column × 4 + row, each column times its scale.
  out[i * 4 + i] = cb * cc * si;
  out[i * 4 + j] = cb * sc * si;
  out[i * 4 + k] = -sb * si;
  out[j * 4 + i] = (sa * sb * cc - ca * sc) * sj;
  out[j * 4 + j] = (sa * sb * sc + ca * cc) * sj;
  out[j * 4 + k] = sa * cb * sj;
  out[k * 4 + i] = (ca * sb * cc + sa * sc) * sk;
  out[k * 4 + j] = (ca * sb * sc - sa * cc) * sk;
  out[k * 4 + k] = ca * cb * sk;
  out[12] = values[0] as number;
  out[13] = values[1] as number;
  out[14] = values[2] as number;
}
