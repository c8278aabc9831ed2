/**
 * How far matrix `i` of `a` lies from matrix `j` of `b`, in scene units: the greater of the distance between their
 * positions and of that between the tips of their axes, taken `reach` long, so that a turn counts as what it moves
 * at the other end of the rig.
 */
export function displacement(
  a: ArrayLike<number>,
  i: number,
  b: ArrayLike<number>,
  j: number,
  reach: number,
): number {
  let most = 0;
  for (let column = 0; column < 16; column += 4) {
    const x = (a[i * 16 + column] as number) - (b[j * 16 + column] as number);
    const y = (a[i * 16 + column + 1] as number) - (b[j * 16 + column + 1] as number);
    const z = (a[i * 16 + column + 2] as number) - (b[j * 16 + column + 2] as number);
    const apart = Math.sqrt(x * x + y * y + z * z) * (column === 12 ? 1 : reach);
    // Written so that NaN is kept.
    if (!(apart <= most)) most = apart;
  }
  return most;
}
