import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { describe, expect, it } from 'vitest';
import { type BuildFile, buildFiles, COMPILER_VERSION, compile, samples } from '@/compiler';

const sample = (id: string): string => samples.find((item) => item.id === id)?.text ?? '';
const buildOf = async (text: string, character?: string) => {
  const compilation = compile({
    recipe: { name: 'a.recipe.yaml', text },
    version: 3,
    ...(character ? { character: { name: character } } : {}),
  });
  return { compilation, files: await buildFiles(compilation) };
};
const fileOf = (files: readonly BuildFile[], ending: string) => {
  const file = files.find(({ name }) => name.endsWith(ending));
  if (!file) throw new Error(`no ${ending}`);
  return file;
};

describe('files of a build', () => {
  it('are script, rig, findings and manifest, by the name of the character', async () => {
    const { files } = await buildOf(sample('hare'), 'postmaster');
    expect(files.map(({ name, mediaType }) => [name, mediaType])).toEqual([
      ['postmaster.slip', 'text/plain; charset=utf-8'],
      ['postmaster.rig.json', 'application/json'],
      ['postmaster.film.usda', 'model/vnd.usda'],
      ['postmaster.realtime.glb', 'model/gltf-binary'],
      ['postmaster.chart.html', 'text/html; charset=utf-8'],
      ['postmaster.chart.csv', 'text/csv; charset=utf-8'],
      ['postmaster.findings.sarif', 'application/sarif+json'],
      ['postmaster.manifest.json', 'application/json'],
    ]);
  });

  it.each(['format: 1\nrecipe: hare\ntitel: x\n', 'format: [\n', ''])(
    'are the findings alone where the recipe %j has errors',
    async (text) => {
      const { files } = await buildOf(text);
      expect(files.map(({ mediaType }) => mediaType)).toEqual(['application/sarif+json']);
      expect(JSON.parse(files[0]?.text ?? '').runs[0].results.length).toBeGreaterThan(0);
    },
  );

  it.each(samples.map(({ id }) => id))('%s: hold the rig as canonical JSON (RFC 8785)', async (id) => {
    const { compilation, files } = await buildOf(sample(id));
    const { text } = fileOf(files, '.rig.json');
    expect(text).toBe(`${canonicalize(compilation.rig)}\n`);
    expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(compilation.rig)));
  });

  it.each(samples.map(({ id }) => id))(
    '%s: are listed in the manifest with their bytes and hashes',
    async (id) => {
      const { compilation, files } = await buildOf(sample(id));
      const manifest = JSON.parse(fileOf(files, '.manifest.json').text);
      expect(manifest.files).toEqual(
        files.slice(0, -1).map(({ name, mediaType, text, encoding }) => {
          const content = Buffer.from(text, encoding);
          return {
            name,
            mediaType,
            bytes: content.length,
            sha256: createHash('sha256').update(content).digest('hex'),
          };
        }),
      );
      const nodes = compilation.rig?.nodes ?? [];
      expect(manifest).toMatchObject({
        format: 1,
        character: compilation.character,
        recipe: `${id}@3`,
        compiler: COMPILER_VERSION,
        recipeHash: compilation.recipeHash,
        counts: {
          joints: nodes.filter(({ kind }) => kind === 'joint').length,
          controls: nodes.filter(({ kind }) => kind === 'control').length,
        },
      });
    },
  );

  it('carry their own hashes, and come out the same each time', async () => {
    const [{ files: first }, { files: second }] = [
      await buildOf(sample('eel')),
      await buildOf(sample('eel')),
    ];
    expect(second).toEqual(first);
    for (const { text, encoding, sha256 } of first) {
      expect(sha256).toBe(createHash('sha256').update(Buffer.from(text, encoding)).digest('hex'));
    }
  });

  it('change the recipe hash with the recipe and with the parameters only', () => {
    const hash = (params: Record<string, number>, text = sample('hare')) =>
      compile({ recipe: { name: 'x', text }, character: { name: 'a', params } }).recipeHash;
    expect(hash({ stature: 90 })).not.toBe(hash({ stature: 91 }));
    expect(hash({}, `# a comment\n${sample('hare')}`)).toBe(hash({}));
  });
});
