import { describe, expect, it } from 'vitest';
import { compile, type Rig } from '@/compiler';

const HEAD = 'format: 1\nrecipe: demo\n';
const LANDMARKS = `landmarks:
  hips: { at: [0, 50, 0] }
  shoulder: { side: left, at: [10, 80, 0] }
  elbow: { side: left, at: [20, 78, -2], right: [-21, 77, -3] }
  wrist: { side: left, at: [30, 80, 0] }
`;

function build(body: string, more: Partial<Parameters<typeof compile>[0]> = {}): Rig {
  const { rig, findings } = compile({
    recipe: { name: 'demo.recipe.yaml', text: `${HEAD}${LANDMARKS}${body}` },
    ...more,
  });
  if (!rig) throw new Error(findings.map(({ message }) => message).join('\n'));
  return rig;
}

const ids = (rig: Rig, kind?: string): readonly string[] =>
  rig.nodes.filter((node) => kind === undefined || node.kind === kind).map(({ id }) => id);

const PARTS = `parts:
  root: { kind: root }
  arm: { kind: limb, side: both, points: [shoulder, elbow, wrist], goal: hand }
`;

describe('parts', () => {
  it('make joints, controls, a solver and a guide line on both sides', () => {
    const rig = build(PARTS);
    expect(ids(rig, 'joint')).toEqual(
      ['left', 'right'].flatMap((side) =>
        ['shoulder', 'elbow', 'wrist'].map((name) => `arm.${side}.${name}`),
      ),
    );
    expect(ids(rig, 'line')).toEqual(['arm.left.pole_line', 'arm.right.pole_line']);
    expect(rig.solvers.map(({ id }) => id)).toEqual(['arm.left.bend', 'arm.right.bend']);
  });

  it('can be adjusted by id, on one side or on both', () => {
    const sizes = (body: string) => {
      const rig = build(`${PARTS}${body}`);
      return ['left', 'right'].map((side) => {
        const node = rig.nodes.find(({ id }) => id === `arm.${side}.hand`);
        return node?.kind === 'control' ? node.shape : null;
      });
    };
    expect(sizes('')).toEqual(['box', 'box']);
    expect(sizes('controls:\n  arm.left.hand: { shape: ball }\n')).toEqual(['ball', 'box']);
    expect(sizes('controls:\n  arm.left.hand: { shape: ball, side: both }\n')).toEqual(['ball', 'ball']);
  });

  it('can be made to leave something out', () => {
    const rig = build(`${PARTS}guide_lines:\n  arm.left.pole_line: { omit: true }\n`);
    expect(ids(rig, 'line')).toEqual(['arm.right.pole_line']);
  });

  it('mix with primitives written by hand', () => {
    const rig = build(
      `${PARTS}chains:\n  cuff: { side: both, points: [wrist, [33, 80, 0]], names: [a, b], parent: arm.left.wrist }\n`,
    );
    expect(ids(rig, 'joint')).toContain('cuff.right.b');
    const cuff = rig.nodes.find(({ id }) => id === 'cuff.right.a');
    expect(cuff?.parent).toBe(rig.nodes.find(({ id }) => id === 'arm.right.wrist')?.name);
  });

  it('take the right landmark where the model is not symmetrical', () => {
    const rig = build(PARTS);
    const elbow = rig.nodes.find(({ id }) => id === 'arm.right.elbow');
    expect(Math.hypot(...(elbow?.at ?? []))).toBeCloseTo(Math.hypot(-21 + 10, 77 - 80, -3), 9);
  });
});

describe('merging', () => {
  const base = {
    name: 'walker.recipe.yaml',
    text: `${HEAD}${LANDMARKS}params: { n: { default: 4, min: 2, max: 9 } }\n${PARTS}`,
  };
  const own = {
    name: 'hare.recipe.yaml',
    text: 'format: 1\nrecipe: hare\nextends: walker@4\nparts: { arm: { goal: paw } }\nlandmarks: { wrist: { at: ["=28 + params.n * 0.5", 80, 0] } }\n',
  };
  const bases = { 'walker@4': base };

  it('lays a recipe on the version it extends, and a character on that', () => {
    const { rig, findings } = compile({
      recipe: own,
      bases,
      character: {
        name: 'old_hare',
        params: { n: 6 },
        patch: { name: 'patch.yaml', text: 'parts: { arm: { pole: { guide_line: false } } }\n' },
      },
    });
    expect(findings.filter(({ severity }) => severity === 'error')).toEqual([]);
    expect(rig?.scene.character).toBe('old_hare');
    expect(rig && ids(rig)).toContain('arm.left.paw');
    expect(rig && ids(rig, 'line')).toEqual([]);
    const paw = rig?.nodes.find(({ id }) => id === 'arm.left.paw');
    expect(paw?.at[0]).toBeCloseTo(31, 9);
  });

  it('points at the document that wrote the fault', () => {
    const faulty = { ...base, text: base.text.replace('kind: limb', 'kind: limp') };
    const { findings } = compile({ recipe: own, bases: { 'walker@4': faulty } });
    expect(findings[0]).toMatchObject({ code: 'not-one-of', span: { source: 'walker.recipe.yaml' } });
  });

  it('refuses parameters outside their range, and unknown ones', () => {
    const codes = (params: Record<string, number>) =>
      compile({ recipe: own, bases, character: { name: 'hare', params } }).findings.map(({ code }) => code);
    expect(codes({ n: 20 })).toContain('parameter-out-of-range');
    expect(codes({ m: 3 })).toContain('parameter-unknown');
  });

  it('finds a ring of recipes', () => {
    const ring = compile({
      recipe: own,
      bases: { 'walker@4': { name: 'walker', text: `${base.text}extends: walker@4\n` } },
    });
    expect(ring.findings.map(({ code }) => code)).toContain('extends-ring');
  });

  it('names a character only by a word', () => {
    const { findings, rig } = compile({ recipe: own, bases, character: { name: 'Old "Hare"\n' } });
    expect(findings.map(({ code }) => code)).toContain('character-name');
    expect(rig).toBeNull();
  });
});

describe('scenes with other axes', () => {
  it('mirrors across the plane of up and forward', () => {
    const rig = build('', {
      recipe: {
        name: 'z_up.recipe.yaml',
        text: `${HEAD}scene: { up: +z, forward: -y, unit: m }\nlandmarks:\n  ear: { side: left, at: [0.1, 0.2, 1.5] }\n  tip: { side: left, at: [0.2, 0.2, 1.8] }\nparts:\n  root: { kind: root }\nchains:\n  ear: { side: both, points: [ear, tip], orient: { rule: world }, mirror: world }\n`,
      },
    });
    expect(rig.scene).toMatchObject({ up: '+z', forward: '-y', unit: 'm' });
    expect(rig.nodes.find(({ id }) => id === 'ear.right.ear')?.at).toEqual([-0.1, 0.2, 1.5]);
  });
});
