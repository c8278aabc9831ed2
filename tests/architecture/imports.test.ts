import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { codeBelow, type Import, importsBelow, importsOf } from '../support/imports';
import { projectRoot } from '../support/sourceTree';

const words = ({ from, to }: Import): string => `${from} → ${to}`;

/** Packages the compiler may use: pure ones, for what is not its own subject. */
const COMPILER_PACKAGES = new Set([
  'yaml',
  'ajv',
  'sarif',
  'canonicalize',
  'fastest-levenshtein',
  '@marcbachmann/cel-js',
  '@gltf-transform/core',
  '@noble/hashes/sha2.js',
  '@noble/hashes/utils.js',
  // What generated validators and templates need to run.
  'ajv/dist/runtime/ucs2length',
  'handlebars/runtime.js',
]);

/**
 * The stages in the order of the story, those that share a rank in one line. What is not listed (findings, source,
 * mathematics, the build language, evaluation) serves several stages.
 */
const STAGES: readonly (readonly string[])[] = [
  ['syntax'],
  ['merge'],
  ['schema'],
  ['expressions', 'expand', 'parts'],
  ['resolve'],
  ['solve'],
  ['check'],
  ['assemble'],
  ['plan'],
  ['emit'],
  ['trials'],
  ['build'],
];
const rankOf = (path: string): number =>
  STAGES.findIndex((names) => names.includes(path.split('/')[1] ?? ''));

describe('import directions', () => {
  it('keeps the compiler pure: nothing but itself and its listed packages', () => {
    const strange = importsBelow('compiler').filter(({ to, isOwn }) =>
      isOwn ? !to.startsWith('compiler/') : !COMPILER_PACKAGES.has(to),
    );
    expect(strange.map(words)).toEqual([]);
  });

  it('lets nothing in the compiler read a clock, chance or the environment', () => {
    const impure = codeBelow('compiler').filter((file) =>
      /\bMath\.random\b|\bDate\.now\b|\bnew Date\b|\bperformance\.|\bprocess\.|\bfetch\(|\bnew Function\b|\beval\(/.test(
        readFileSync(join(projectRoot, file), 'utf8'),
      ),
    );
    expect(impure).toEqual([]);
  });

  it('lets the rest of the project enter the compiler by its door alone', () => {
    const sides = ['app', 'components', 'db', 'bin'].flatMap(importsBelow);
    const through = sides.filter(
      ({ to, isOwn }) => isOwn && to.startsWith('compiler/') && to !== 'compiler/index',
    );
    expect(through.map(words)).toEqual([]);
  });

  it('lets components know neither data nor pages, only what the API agrees on', () => {
    const strange = importsBelow('components').filter(
      ({ to, isOwn }) =>
        isOwn &&
        (to.startsWith('db/') || (to.startsWith('app/') && !to.startsWith('app/api/v1/_contracts/'))),
    );
    expect(strange.map(words)).toEqual([]);
  });

  it('lets nothing but the executables and pages themselves know pages', () => {
    const strange = ['compiler', 'db', 'templates']
      .flatMap(importsBelow)
      .filter(({ to, isOwn }) => isOwn && (to.startsWith('app/') || to.startsWith('components/')));
    expect(strange.map(words)).toEqual([]);
  });

  it('lets the data know the compiler by its types alone, and no pages', () => {
    const strange = importsBelow('db').filter(
      ({ to, isOwn, isTypeOnly: typeOnly }) =>
        (isOwn &&
          (to.startsWith('app/') ||
            to.startsWith('components/') ||
            (to.startsWith('compiler') && !typeOnly))) ||
        /^(next|react)/.test(to),
    );
    expect(strange.map(words)).toEqual([]);
  });

  it('lets pages and routes ask operations, never the database', () => {
    const strange = importsBelow('app').filter(
      ({ from, to, isOwn }) =>
        !from.startsWith('app/_server/') && ((isOwn && to.startsWith('db/')) || to === 'knex' || to === 'pg'),
    );
    expect(strange.map(words)).toEqual([]);
  });

  it('lets no stage of the compiler know a later one', () => {
    const backward = importsBelow('compiler').filter(
      ({ from, to, isOwn }) => isOwn && rankOf(from) >= 0 && rankOf(to) > rankOf(from),
    );
    expect(backward.map(words)).toEqual([]);
  });

  it('has no ring among the compiler’s modules', () => {
    const edges = new Map<string, readonly string[]>();
    for (const file of codeBelow('compiler')) {
      edges.set(
        file.replace(/\.tsx?$/, ''),
        importsOf(file)
          .filter(({ isOwn, isTypeOnly: typeOnly }) => isOwn && !typeOnly)
          .map(({ to }) => to),
      );
    }
    const state = new Map<string, 'open' | 'done'>();
    const rings: string[] = [];
    const walk = (file: string, path: readonly string[]): void => {
      if (state.get(file) === 'done') return;
      if (state.get(file) === 'open') {
        rings.push([...path.slice(path.indexOf(file)), file].join(' → '));
        return;
      }
      state.set(file, 'open');
      for (const next of edges.get(file) ?? []) walk(next, [...path, file]);
      state.set(file, 'done');
    };
    for (const file of edges.keys()) walk(file, []);
    expect(rings).toEqual([]);
  });
});
