import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { parse, stringify } from 'yaml';
import { buildFiles, compile, samples } from '@/compiler';

const WRONG = `format: 1
recipe: wrong
titl: No such key
landmarks: { knee: { at: [1, "=landmarks.knee.y", 0] }, hip: { at: [1, 2] } }
parts: { leg: { kind: limb, points: [hip, kne, ankle] } }
`;
/** Milliseconds: each of the two long tests takes some twenty seconds on a machine that is busy with others. */
const PATIENCE = 240_000;
const sample = (id: string): string => samples.find((item) => item.id === id)?.text ?? '';

/** Everything that a compile gives, as one text. */
async function outcomeOf(text: string): Promise<string> {
  const compilation = compile({ recipe: { name: 'a.recipe.yaml', text } });
  const { findings, trials, script, recipeHash } = compilation;
  const files = await buildFiles(compilation);
  return JSON.stringify({ findings, trials, script, recipeHash, files });
}

describe('the same recipe', () => {
  it(
    'gives the same bytes a hundred times over, whatever is compiled between',
    async () => {
      const wanted = { cart: await outcomeOf(sample('mail_cart')), wrong: await outcomeOf(WRONG) };
      expect(wanted.cart).toContain('.rig.json');
      expect(JSON.parse(wanted.wrong)).toMatchObject({ script: null });
      for (let run = 0; run < 100; run += 1) {
        // Compared as booleans: a difference of this size printed as such would end nobody's search.
        expect((await outcomeOf(sample('mail_cart'))) === wanted.cart, `cart, run ${run}`).toBe(true);
        expect((await outcomeOf(WRONG)) === wanted.wrong, `wrong, run ${run}`).toBe(true);
      }
    },
    PATIENCE,
  );

  it(
    'gives the same bytes in processes of other languages and time zones',
    () => {
      const root = fileURLToPath(new URL('../..', import.meta.url));
      const printed = (language: string, timeZone: string): readonly string[] => {
        const { stdout, stderr } = spawnSync(
          `${root}/node_modules/.bin/tsx`,
          [`${root}/tests/compiler/printBuildHashes.ts`],
          {
            cwd: root,
            encoding: 'utf8',
            env: { ...process.env, LANG: language, LC_ALL: language, TZ: timeZone },
          },
        );
        expect(stderr).toBe('');
        return stdout.trim().split('\n');
      };
      const [english, ...plain] = printed('en_GB.UTF-8', 'UTC');
      const [turkish, ...other] = printed('tr_TR.UTF-8', 'Asia/Kathmandu');
      // Both settings must have arrived, or this would compare a thing with itself; ICU spells the city both ways.
      expect(english).toBe('en-GB UTC');
      expect(turkish).toMatch(/^tr-TR Asia\/Kath?mandu$/);
      expect(plain.length).toBeGreaterThan(4 * samples.length);
      expect(other).toEqual(plain);
    },
    PATIENCE,
  );
});

type Entries = Record<string, unknown>;
const isMap = (value: unknown): value is Entries =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
const turnedOver = (map: Entries): Entries => Object.fromEntries(Object.entries(map).reverse());

/** Turns over the order of every map within, but of those that a part's own option orders. */
function turnedOverWithin(value: unknown, key = ''): unknown {
  if (Array.isArray(value)) return value.map((item) => turnedOverWithin(item));
  if (!isMap(value)) return value;
  const inner = Object.fromEntries(
    Object.entries(value).map(([name, item]) => [name, turnedOverWithin(item, name)]),
  );
  // The schema of the hand: "Digits by name, in their order across the hand."
  return key === 'digits' ? inner : turnedOver(inner);
}

/** Lines of a script in alphabetical order, without the last, which holds the hash of those before it. */
function stepsOf(text: string): readonly string[] {
  const { script } = compile({ recipe: { name: 'a.recipe.yaml', text }, trials: false });
  expect(script).not.toBeNull();
  return (script ?? '')
    .split('\n')
    .filter((line) => !line.startsWith('end '))
    .sort();
}

describe.each(samples.map(({ id, text }) => [id, text] as const))(
  'the keys of %s in another order',
  (_, text) => {
    const recipe = parse(text) as Entries;
    const same = stringify(recipe);
    const scriptOf = (document: unknown) =>
      compile({ recipe: { name: 'a.recipe.yaml', text: stringify(document) }, trials: false }).script;

    it('leave every byte alone at the top, and among params, landmarks and what an entry says', () => {
      const script = scriptOf(recipe);
      expect(scriptOf(turnedOver(recipe))).toBe(script);
      for (const key of ['params', 'landmarks', 'scene']) {
        const map = recipe[key];
        if (isMap(map)) expect(scriptOf({ ...recipe, [key]: turnedOver(map) }), key).toBe(script);
      }
    });

    it('change the order of steps and no step, where things are made in the order they are written', () => {
      expect(stepsOf(stringify(turnedOverWithin(recipe)))).toEqual(stepsOf(same));
    });

    it('keep the hash of the recipe', () => {
      const hashOf = (document: unknown) =>
        compile({ recipe: { name: 'a.recipe.yaml', text: stringify(document) }, trials: false }).recipeHash;
      expect(hashOf(turnedOverWithin(recipe))).toBe(hashOf(recipe));
    });
  },
);
