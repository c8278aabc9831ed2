import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';

setFlagsFromString('--expose-gc');
const collect = runInNewContext('gc') as () => void;

/** Bytes of the heap in use once everything that can be collected is. */
export function heapInUse(): number {
  collect();
  return process.memoryUsage().heapUsed;
}
