import { readdirSync, readFileSync } from 'node:fs';
import Handlebars from 'handlebars';
import { describe, expect, it } from 'vitest';
import { templates } from '@/compiler/emit/generated/templates';
import { VERBS } from '@/compiler/slipway/verbs';

const folder = new URL('../../../templates/slipway/', import.meta.url);

/** Keys that a template puts into its line, by Handlebars' own reading of it. */
function keysIn(verb: string): readonly string[] {
  const found: string[] = [];
  const text = readFileSync(new URL(`${verb}.hbs`, folder), 'utf8');
  const visitor = new Handlebars.Visitor();
  visitor.MustacheStatement = ({ path }) => {
    found.push((path as hbs.AST.PathExpression).original);
  };
  visitor.accept(Handlebars.parse(text));
  return found;
}

describe('templates', () => {
  it('are there for every verb and for nothing else', () => {
    const files = readdirSync(folder).filter((name) => name.endsWith('.hbs'));
    expect(files.sort()).toEqual(
      Object.keys(VERBS)
        .map((verb) => `${verb}.hbs`)
        .sort(),
    );
    expect(Object.keys(templates).sort()).toEqual(Object.keys(VERBS).sort());
  });

  it.each(Object.entries(VERBS))(
    '%s writes the name and every key once, in the order of the table',
    (verb, rule) => {
      expect(keysIn(verb)).toEqual(['quotedName', ...Object.keys(rule.keys)]);
    },
  );

  it('refuse a view that lacks something', () => {
    expect(() => templates.lock({ quotedName: '"a"' })).toThrow(/channels/);
  });

  it('escape nothing themselves and read nothing as a template', () => {
    const line = templates.lock({ quotedName: '"{{7*7}} <b>"', channels: '(tx)' });
    expect(line).toBe('lock "{{7*7}} <b>" channels=(tx)\n');
  });
});
