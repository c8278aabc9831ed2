import type { Side, Vec3 } from '../rig/Rig';

/** Reads the side an id states through a segment `left` or `right`; centre when it states none. */
export function sideOfId(id: string): Side {
  for (const segment of id.split('.')) if (segment === 'left' || segment === 'right') return segment;
  return 'centre';
}

/** The id of the mirrored copy: every segment `left` reads `right`. */
export function mirrorId(id: string): string {
  if (!id.includes('left')) return id;
  return id
    .split('.')
    .map((segment) => (segment === 'left' ? 'right' : segment))
    .join('.');
}

/** The id without its side, for names and for pairing both copies. */
export function withoutSide(id: string): string {
  return id
    .split('.')
    .filter((segment) => segment !== 'left' && segment !== 'right')
    .join('.');
}

/** Mirrors a point or direction through the plane at the origin whose normal is the axis-aligned `left`. */
export function mirrorPoint(point: Vec3, left: Vec3): Vec3 {
  const flip = (value: number, normal: number): number => (normal === 0 || value === 0 ? value : -value);
  return [flip(point[0], left[0]), flip(point[1], left[1]), flip(point[2], left[2])];
}
