/** Lines of one station, as riggers write them out: three landmarks, a limb on both sides, an ear of its own adjustments. */
function station(index: number): readonly string[] {
  const id = `s${String(index).padStart(3, '0')}`;
  const z = index * 6;
  return [
    `  ${id}_root:`,
    '    side: left',
    '    at:',
    `      - "=params.width * 0.35 + ${index % 7}"`,
    '      - "=params.height * 0.5"',
    `      - ${z}`,
    `  ${id}_bend:`,
    '    side: left',
    '    at:',
    `      - "=landmarks.${id}_root.x + params.reach * 0.5"`,
    `      - "=landmarks.${id}_root.y + 4"`,
    `      - ${z + 1.5}`,
    `  ${id}_tip:`,
    '    side: left',
    '    at:',
    `      - "=landmarks.${id}_root.x + params.reach"`,
    '      - 0',
    `      - ${z}`,
  ];
}

function part(index: number): readonly string[] {
  const id = `s${String(index).padStart(3, '0')}`;
  return [
    `  ${id}:`,
    '    kind: limb',
    '    side: both',
    '    parent: body',
    '    points:',
    `      - ${id}_root`,
    `      - ${id}_bend`,
    `      - ${id}_tip`,
    '    names: [root, bend, tip]',
    '    goal: step',
    '    goal_parent: root',
    '    pole:',
    '      distance: 0.8',
    '      guide_line: true',
  ];
}

function adjustments(index: number): readonly string[] {
  const id = `s${String(index).padStart(3, '0')}`;
  return [
    `  ${id}.left.step:`,
    '    side: both',
    '    shape: diamond',
    '    size: 0.8',
    '    rotation_order: zxy',
    '    channels:',
    '      scale:',
    '        locked: true',
  ];
}

/** A recipe of about `lines` lines, with six joints for every forty of them. */
export function makeLargeRecipe(lines: number): string {
  const count = Math.max(1, Math.round((lines - 30) / 40));
  const stations = Array.from({ length: count }, (_, index) => index);
  return [
    'format: 1',
    'recipe: long_row',
    'title: A long row of limbs',
    'house: tidewrack@1',
    'params:',
    '  width: { default: 60, min: 10, max: 200, unit: cm, note: across the body }',
    '  height: { default: 40, min: 10, max: 200, unit: cm, note: floor to the back }',
    '  reach: { default: 30, min: 10, max: 100, unit: cm, note: root to tip of a limb }',
    'landmarks:',
    '  heart: { at: [0, "=params.height * 0.6", 0] }',
    ...stations.flatMap(station),
    'parts:',
    '  root: { kind: root }',
    ...stations.flatMap(part),
    'controls:',
    '  body:',
    '    at: heart',
    '    parent: root',
    '    shape: square',
    '    size: 4',
    '    channels:',
    '      scale:',
    '        locked: true',
    ...stations.flatMap(adjustments),
    'notes:',
    '  purpose: measuring',
    '',
  ].join('\n');
}
