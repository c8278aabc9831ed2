import { readFileSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';
import ts from 'typescript';
import { listSources, projectRoot } from './sourceTree';

/** One import, re-export, `import()` or `require()` of a file. */
export interface Import {
  readonly from: string;
  /** Path from the root for a file of the project, else the package's name. */
  readonly to: string;
  readonly isOwn: boolean;
  readonly isTypeOnly: boolean;
}

/** Every code file below a folder, as a path from the root. */
export function codeBelow(folder: string): readonly string[] {
  return listSources(folder).filter((path) => /\.(tsx?|mts|mjs|js)$/.test(path) && !path.endsWith('.d.ts'));
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

/** What a node of the syntax tree names as a module; undefined for every other node. */
function findModule(node: ts.Node): { readonly name: string; readonly isTypeOnly: boolean } | undefined {
  if (ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) {
    const specifier = node.moduleSpecifier;
    if (!specifier || !ts.isStringLiteral(specifier)) return undefined;
    return { name: specifier.text, isTypeOnly: isTypeOnly(node) };
  }
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
    const { literal } = node.argument;
    return ts.isStringLiteral(literal) ? { name: literal.text, isTypeOnly: true } : undefined;
  }
  if (!ts.isCallExpression(node)) return undefined;
  const isLoading =
    node.expression.kind === ts.SyntaxKind.ImportKeyword ||
    (ts.isIdentifier(node.expression) && node.expression.text === 'require');
  const [argument] = node.arguments;
  if (!isLoading) return undefined;
  // A module named by a value cannot be checked, so it is shown as what it is.
  const name = argument && ts.isStringLiteralLike(argument) ? argument.text : '(named by a value)';
  return { name, isTypeOnly: false };
}

/** Every import of a file, read by the TypeScript parser. */
export function importsOf(file: string): readonly Import[] {
  const text = readFileSync(join(projectRoot, file), 'utf8');
  const found: Import[] = [];
  const visit = (node: ts.Node): void => {
    const module = findModule(node);
    if (module) {
      const { name } = module;
      const isOwn = name.startsWith('.') || name.startsWith('@/');
      const path = name.startsWith('@/') ? name.slice(2) : normalize(join(dirname(file), name));
      found.push({ from: file, to: isOwn ? path : name, isOwn, isTypeOnly: module.isTypeOnly });
    }
    ts.forEachChild(node, visit);
  };
  visit(ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true));
  return found;
}

export const importsBelow = (folder: string): readonly Import[] => codeBelow(folder).flatMap(importsOf);
