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
    const square = (x * x + y * y + z * z) * (column === 12 ? 1 : reach * reach);
    // Written so that NaN is kept.
    if (!(square <= most)) most = square;
  }
  return Math.sqrt(most);
}

/** How far matrix `i` of `middle` lies from halfway between those of `a` and `b`, measured like a displacement. */
export function bend(
  a: Float64Array,
  middle: Float64Array,
  b: Float64Array,
  i: number,
  reach: number,
): number {
  let most = 0;
  for (let entry = i * 16; entry < i * 16 + 16; entry += 4) {
    let square = 0;
    for (let row = entry; row < entry + 3; row += 1) {
      const off = ((a[row] as number) + (b[row] as number)) / 2 - (middle[row] as number);
      square += off * off;
    }
    if (entry < i * 16 + 12) square *= reach * reach;
    if (!(square <= most)) most = square;
  }
  return Math.sqrt(most);
}
