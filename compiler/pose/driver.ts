import type { RigDriver } from '../rig/Rig';
import { CHANNELS } from './channelValues';

/** A driver made ready: reads a value and adds what its curve gives to one of nine channels. */
export type Drive = (channels: Float64Array) => void;

/**
 * Prepares a driver. Between two keys the output runs straight (`linear`) or as 3t² − 2t³ (`smooth`), level at both
 * keys. Beyond the end keys it stays (`hold`) or runs on along the straight line through the last two (`extend`).
 */
export function prepareDriver(driver: RigDriver, values: Float64Array, inputSlot: number): Drive {
  const inputs = Float64Array.from(driver.inputs);
  const outputs = Float64Array.from(driver.outputs);
  const channel = CHANNELS.indexOf(driver.channel);
  const last = inputs.length - 1;
  const isSmooth = driver.curve === 'smooth';
  const runsOn = driver.beyond === 'extend';
  return (channels) => {
    const input = values[inputSlot] as number;
    let piece = 0;
    while (piece < last - 1 && input > (inputs[piece + 1] as number)) piece += 1;
    const from = inputs[piece] as number;
    const low = outputs[piece] as number;
    const high = outputs[piece + 1] as number;
    let t = (input - from) / ((inputs[piece + 1] as number) - from);
    const isBeyond = t < 0 || t > 1;
    if (isBeyond && !runsOn) t = t < 0 ? 0 : 1;
    else if (isSmooth && !isBeyond) t = t * t * (3 - 2 * t);
    channels[channel] = (channels[channel] as number) + low + (high - low) * t;
  };
}
