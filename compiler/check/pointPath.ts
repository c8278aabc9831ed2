import type { ChainSpecification } from '../expand/types';
import type { Path } from '../syntax/types';

/** Where a joint's place was written: its own point, or all points when joints are spread along them. */
export function pointPath(chain: ChainSpecification, index: number): Path {
  return chain.count === null ? [...chain.path, 'points', index] : [...chain.path, 'points'];
}
