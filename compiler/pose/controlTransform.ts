import { ORDER_AXES, RADIANS_PER_DEGREE } from '../math/euler';
import type { RotationOrder } from '../rig/Rig';

/**
 * Writes translate × rotate × scale of nine channel values (degrees, scene units, factors) as a column-major matrix;
 * nothing is allocated.
 */
export function writeChannelMatrix(order: RotationOrder, values: Float64Array, out: Float64Array): void {
  const axes = ORDER_AXES[order];
  const i = axes[0];
  const j = axes[1];
  const k = axes[2];
  const toRadians = axes[3] * RADIANS_PER_DEGREE;
  const a = toRadians * (values[3 + i] as number);
  const b = toRadians * (values[3 + j] as number);
  const c = toRadians * (values[3 + k] as number);
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
