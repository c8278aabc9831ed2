import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, normalize, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));

interface Import {
  readonly from: string;
  /** Path from the root for a file of the project, else the package's name. */
  readonly to: string;
  readonly isOwn: boolean;
  readonly isTypeOnly: boolean;
}

function filesBelow(folder: string): readonly string[] {
  return readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
    .filter((path) => /\.tsx?$/.test(path) && !path.endsWith('.d.ts') && !path.includes('generated'))
    .map((path) => join(folder, path));
}

function isTypeOnly(node: ts.ImportDeclaration | ts.ExportDeclaration): boolean {
  if (ts.isExportDeclaration(node)) return node.isTypeOnly;
  const clause = node.importClause;
  if (!clause) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  const named = clause.namedBindings;
  return (
    !clause.name &&
    named !== undefined &&
    ts.isNamedImports(named) &&
    named.elements.every((element) => element.isTypeOnly)
  );
}

/** Every import and re-export of a file, read by the TypeScript parser. */
function importsOf(file: string): readonly Import[] {
  const source = ts.createSourceFile(
    file,
    readFileSync(join(root, file), 'utf8'),
    ts.ScriptTarget.Latest,
    true,
  );
  return source.statements.flatMap((node) => {
    if (!(ts.isImportDeclaration(node) || ts.isExportDeclaration(node))) return [];
    const specifier = node.moduleSpecifier;
    if (!specifier || !ts.isStringLiteral(specifier)) return [];
    const name = specifier.text;
    const isOwn = name.startsWith('.') || name.startsWith('@/');
    const to = name.startsWith('@/')
      ? name.slice(2)
      : isOwn
        ? relative('.', normalize(join(dirname(file), name)))
        : name;
    return [{ from: file, to, isOwn, isTypeOnly: isTypeOnly(node) }];
  });
}

const importsBelow = (folder: string) => filesBelow(folder).flatMap(importsOf);
const words = ({ from, to }: Import): string => `${from} → ${to}`;

/** Packages the compiler may use: pure ones, for what is not its own subject. */
const COMPILER_PACKAGES = new Set([
  'yaml',
  'ajv',
  'sarif',
  'canonicalize',
  'fastest-levenshtein',
  '@marcbachmann/cel-js',
  '@noble/hashes/sha2.js',
  '@noble/hashes/utils.js',
]);

describe('import directions', () => {
  it('keeps the compiler pure: nothing but itself and its listed packages', () => {
    const strange = importsBelow('compiler').filter(({ to, isOwn }) =>
      isOwn ? !to.startsWith('compiler/') : !COMPILER_PACKAGES.has(to),
    );
    expect(strange.map(words)).toEqual([]);
  });

  it('lets nothing in the compiler read a clock, chance or the environment', () => {
    const impure = filesBelow('compiler').filter((file) =>
      /\bMath\.random\b|\bDate\.now\b|\bnew Date\b|\bperformance\.|\bprocess\.|\bfetch\(|\bnew Function\b|\beval\(/.test(
        readFileSync(join(root, file), 'utf8'),
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

  it('has no ring among the compiler’s modules', () => {
    const edges = new Map<string, readonly string[]>();
    for (const file of filesBelow('compiler')) {
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
