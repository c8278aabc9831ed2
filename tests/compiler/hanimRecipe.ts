/** One joint of the standard's tables; metres, Y up, the figure faces +Z, its left is +X. */
export interface StandardJoint {
  readonly name: string;
  readonly parent: string | null;
  readonly center: readonly [number, number, number];
}

const isLeft = (name: string): boolean => name.startsWith('l_');
const isRight = (name: string): boolean => name.startsWith('r_');
const sideOf = (name: string): string => (isLeft(name) || isRight(name) ? name.slice(0, 1) : 'centre');
const leafOf = (name: string): string => (sideOf(name) === 'centre' ? name : name.slice(2));

/** Rows of joints, each below the one before, of one side; every joint is in exactly one. Right sides are left out. */
function rowsOf(joints: readonly StandardJoint[]): readonly (readonly StandardJoint[])[] {
  const taken = new Set<string>();
  const rows: (readonly StandardJoint[])[] = [];
  for (const first of joints) {
    if (isRight(first.name)) continue;
    const row: StandardJoint[] = [];
    let next: StandardJoint | undefined = first;
    while (next && !taken.has(next.name)) {
      const name: string = next.name;
      taken.add(name);
      row.push(next);
      next = joints.find((joint) => joint.parent === name && sideOf(joint.name) === sideOf(first.name));
    }
    if (row.length > 0) rows.push(row);
  }
  return rows;
}

/**
 * A recipe that makes the given joints by landmarks and chains with the frames of the scene: every row of joints is a
 * chain, and the right side is the mirror image of the left. Parents stand before their children.
 */
export function hanimRecipe(name: string, joints: readonly StandardJoint[]): string {
  const rows = rowsOf(joints);
  const chainOf = new Map(
    rows.flatMap((row) => row.map((joint) => [joint.name, `row_${leafOf(row[0]?.name ?? '')}`])),
  );
  const jointId = (joint: string): string =>
    `${chainOf.get(joint)}${isLeft(joint) ? '.left' : ''}.${leafOf(joint)}`;
  const landmarks = rows
    .flat()
    .map(({ name: joint, center }) => {
      const side = isLeft(joint) ? 'side: left, ' : '';
      return `  ${leafOf(joint)}: { ${side}at: [${center.join(', ')}] }\n`;
    })
    .join('');
  const chains = rows
    .map((row) => {
      const [first] = row;
      if (!first) return '';
      const parent = first.parent === null ? '' : `, parent: ${jointId(first.parent)}`;
      const side = isLeft(first.name) ? ', side: both, mirror: world' : '';
      const points = row.map((joint) => leafOf(joint.name)).join(', ');
      return `  ${chainOf.get(first.name)}: { points: [${points}], orient: { rule: world }${parent}${side} }\n`;
    })
    .join('');
  return `format: 1
recipe: ${name}
house: hanim@1
scene: { up: +y, forward: +z, unit: m }
landmarks:
${landmarks}parts:
  root: { kind: root }
chains:
${chains}`;
}
