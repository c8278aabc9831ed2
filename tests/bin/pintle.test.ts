import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { explainFinding, recipeSchema, samples } from '@/compiler';
import { runPintle } from '../support/pintle';

const root = fileURLToPath(new URL('../..', import.meta.url));
let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'pintle-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const pintle = (...parameters: string[]) => runPintle(folder, parameters);

function write(name: string, text: string): string {
  writeFileSync(join(folder, name), text);
  return name;
}

const hare = () => write('hare.recipe.yaml', samples.find(({ id }) => id === 'hare')?.text ?? '');

describe('pintle check', () => {
  it('ends with 0 when nothing is wrong', () => {
    const { status, stdout } = pintle('check', hare());
    expect(stdout).toBe('hare.recipe.yaml: nothing is wrong, 12 trials passed\n');
    expect(status).toBe(0);
  });

  it('ends with 1 for errors, and shows file, line, column, the line itself and help', () => {
    const file = write('broken.recipe.yaml', 'format: 1\nrecipe: broken\nparts:\n  root: { kind: roof }\n');
    const { status, stdout } = pintle('check', file);
    expect(status).toBe(1);
    expect(stdout).toContain('broken.recipe.yaml:4:17 error not-one-of "roof" is not allowed');
    expect(stdout).toContain('    4 |   root: { kind: roof }\n      |                 ^^^^\n');
    expect(stdout).toContain('Did you mean "root"?');
  });

  it('ends with 1 when a trial fails, and says which', () => {
    // The wrong recipe of the finding's own page: a guide line to a joint that its control does not move.
    const page = explainFinding('trial-guide')?.page ?? '';
    const file = write('astray.recipe.yaml', /```yaml\n([\s\S]*?)```/.exec(page)?.[1] ?? '');
    const { status, stdout } = pintle('check', file);
    expect(status).toBe(1);
    expect(stdout).toContain(' error trial-guide ');
    expect(stdout).toContain('11 of 12 trials passed (not guide)');
  });

  it('gives findings as data with --json', () => {
    const file = write('broken.recipe.yaml', 'format: 1\nrecipe: broken\nparts:\n  root: { kind: roof }\n');
    const [result] = JSON.parse(pintle('check', file, '--json').stdout) as {
      file: string;
      findings: { code: string }[];
    }[];
    expect(result?.file).toBe(file);
    expect(result?.findings.map(({ code }) => code)).toEqual(['not-one-of']);
  });

  it('finds the versions a recipe extends beside it', () => {
    write('walker@4.recipe.yaml', 'format: 1\nrecipe: walker\nparts:\n  root: { kind: root }\n');
    const file = write('child.recipe.yaml', 'format: 1\nrecipe: child\nextends: walker@4\n');
    expect(pintle('check', file).status).toBe(0);
    const orphan = write('orphan.recipe.yaml', 'format: 1\nrecipe: orphan\nextends: walker@5\n');
    expect(pintle('check', orphan).stdout).toContain('base-not-found');
  });
});

describe('pintle upgrade and kit', () => {
  it('makes the script that leads from one version to another', () => {
    const first = write(
      'walker_1.recipe.yaml',
      'format: 1\nrecipe: walker\nparts:\n  root: { kind: root }\n',
    );
    const second = write(
      'walker_2.recipe.yaml',
      'format: 1\nrecipe: walker\nparts:\n  root: { kind: root, joint: true }\n',
    );
    const { stdout, status } = pintle('upgrade', first, second);
    expect(status).toBe(0);
    expect(stdout).toMatch(/^slipway-upgrade 1\nupgrade "versions" from="[0-9a-f]{64}" to="[0-9a-f]{64}"\n/);
    expect(stdout).toMatch(/^joint "walker_c_root_joint_skin" /m);
    expect(pintle('upgrade', first).status).toBe(2);
    expect(pintle('upgrade', first, write('wrong.recipe.yaml', 'format: 1\n')).status).toBe(1);
  });

  it('writes the conformance kit', () => {
    expect(pintle('kit', '--out', 'adapter_kit').status).toBe(0);
    expect(readdirSync(join(folder, 'adapter_kit')).sort()).toEqual(['README.md', 'adapter.mjs', 'features']);
    expect(readdirSync(join(folder, 'adapter_kit/features'))).toContain('two_bone.slip');
    expect(pintle('kit').status).toBe(2);
  });
});

describe('pintle compile and run', () => {
  it('writes every file, and the script runs to the rig that was asked for', () => {
    const compiled = pintle(
      'compile',
      hare(),
      '--out',
      'build',
      '--character',
      'quill',
      '--params',
      'stature=120',
      '--params',
      'ear=40',
    );
    expect(compiled.stderr).toBe('');
    expect(compiled.status).toBe(0);
    expect(readdirSync(join(folder, 'build')).sort()).toEqual([
      'quill.chart.csv',
      'quill.chart.html',
      'quill.film.usda',
      'quill.findings.sarif',
      'quill.manifest.json',
      'quill.realtime.glb',
      'quill.rig.json',
      'quill.slip',
    ]);
    const { nodes } = JSON.parse(pintle('run', 'build/quill.slip', '--json').stdout) as {
      nodes: {
        id: string;
        world: number[];
        container: string;
        role: string;
        shown: boolean;
        selectable: boolean;
      }[];
    };
    const crown = nodes.find(({ id }) => id === 'head.head.crown');
    expect(crown?.world).toHaveLength(16);
    expect(crown).toMatchObject({ container: 'bones', role: 'skin', shown: false, selectable: true });
    expect(crown?.world[13]).toBeCloseTo(120 * (0.039 + 0.491 * 0.96 + 0.288 + 0.052 + 0.13), 6);
  });

  it('poses by a file of control values', () => {
    pintle('compile', hare(), '--out', 'build');
    const pose = write('pose.json', JSON.stringify({ hare_root_mid_helm: { tx: 10 } }));
    const at = (...more: string[]) => {
      const { nodes } = JSON.parse(pintle('run', 'build/hare.slip', '--json', ...more).stdout) as {
        nodes: { id: string; world: number[] }[];
      };
      return nodes.find(({ id }) => id === 'head.head.crown')?.world[12] ?? Number.NaN;
    };
    expect(at('--pose', pose) - at()).toBeCloseTo(10, 9);
  });

  it('says what is wrong with a pose or a script, and ends with 1', () => {
    pintle('compile', hare(), '--out', 'build');
    const pose = write('pose.json', '{ "nobody": { "tx": 1 } }');
    expect(pintle('run', 'build/hare.slip', '--pose', pose)).toMatchObject({ status: 1 });
    const script = readFileSync(join(folder, 'build/hare.slip'), 'utf8');
    const cut = write('cut.slip', script.slice(0, script.length / 2));
    expect(pintle('run', cut).stdout).toContain('script-truncated');
    expect(pintle('run', cut).status).toBe(1);
  });

  it('writes only the findings of a recipe with errors', () => {
    const file = write('broken.recipe.yaml', 'format: 1\nrecipe: broken\nparts:\n  root: { kind: roof }\n');
    expect(pintle('compile', file, '--out', 'broken-build').status).toBe(1);
    expect(readdirSync(join(folder, 'broken-build'))).toEqual(['broken.findings.sarif']);
  });

  it('follows the house rules of a file', () => {
    const house = readFileSync(join(root, 'compiler/house/tidewrack.house.yaml'), 'utf8').replace(
      'token: bone',
      'token: knochen',
    );
    write('own.house.yaml', house);
    pintle('compile', hare(), '--out', 'housed', '--house', 'own.house.yaml');
    expect(readFileSync(join(folder, 'housed/hare.slip'), 'utf8')).toContain('_knochen"');
  });

  it('makes the folders it writes into', () => {
    expect(pintle('compile', hare(), '--out', 'show/reel/hare').status).toBe(0);
    expect(readdirSync(join(folder, 'show/reel/hare'))).toHaveLength(8);
  });

  it('says when a recipe follows other house rules than those of the file', () => {
    const house = readFileSync(join(root, 'compiler/house/tidewrack.house.yaml'), 'utf8');
    write('other.house.yaml', house.replace('house: tidewrack', 'house: sandbar'));
    const { status, stderr } = pintle('check', hare(), '--house', 'other.house.yaml');
    expect(stderr).toBe('hare.recipe.yaml follows tidewrack@1; other.house.yaml was not used for it.\n');
    expect(status).toBe(0);
  });
});

describe('pintle schema and explain', () => {
  it('prints the schema the editor uses', () => {
    expect(JSON.parse(pintle('schema').stdout)).toEqual(JSON.parse(JSON.stringify(recipeSchema)));
  });

  it('prints the page of a finding', () => {
    const { status, stdout } = pintle('explain', 'limit-inverted');
    expect(status).toBe(0);
    expect(stdout).toMatch(/^# limit-inverted\n/);
  });
});

describe('wrong use', () => {
  it.each([
    [[]],
    [['dance']],
    [['check']],
    [['check', 'nowhere.yaml']],
    [['check', '--loud', 'x.yaml']],
    [['compile', 'hare.recipe.yaml']],
    [['compile', 'hare.recipe.yaml', '--out', 'x', '--params', 'stature']],
    [['compile', 'hare.recipe.yaml', '--out', 'x', '--profile', 'film']],
    [['run']],
    [['explain', 'nothing-like-this']],
    [['schema', 'pose']],
  ])('%j ends with 2 and says how it is used', (parameters) => {
    hare();
    const { status, stderr, stdout } = pintle(...parameters);
    expect(status).toBe(2);
    expect(stderr + stdout).toContain('sage: pintle');
  });
});
