import { readdirSync, readFileSync } from 'node:fs';
import Handlebars from 'handlebars';

/** Verbs that have a template, sorted. */
export function templateNames(): readonly string[] {
  return readdirSync('templates/slipway')
    .filter((name) => name.endsWith('.hbs'))
    .map((name) => name.slice(0, -'.hbs'.length))
    .sort();
}

/** The templates of the build language, compiled beforehand so that no text is turned into code at run time. */
export function templatesModule(): string {
  const entries = templateNames().map((name) => {
    const text = readFileSync(`templates/slipway/${name}.hbs`, 'utf8');
    const compiled = Handlebars.precompile(text, {
      strict: true,
      noEscape: true,
      knownHelpersOnly: true,
      data: false,
    });
    return `  ${JSON.stringify(name)}: Handlebars.template(${String(compiled)}),`;
  });
  return [
    '// Made by bin/generate.ts from templates/slipway. Change those, not this.',
    "import Handlebars from 'handlebars/runtime.js';",
    '',
    'export const templates = {',
    ...entries,
    '};',
    '',
  ].join('\n');
}

/** Declarations of the templates' module. */
export function templateDeclarations(): string {
  const verbs = templateNames()
    .map((name) => JSON.stringify(name))
    .join(' | ');
  return [
    '// Made by bin/generate.ts from templates/slipway.',
    `export type TemplateName = ${verbs};`,
    'export declare const templates: Readonly<',
    '  Record<TemplateName, (view: Readonly<Record<string, string | null>>) => string>',
    '>;',
    '',
  ].join('\n');
}
