import type { JsonValue } from '../syntax/types';

/** What a value is, in words. */
export function kindOf(value: JsonValue | undefined): string {
  if (value === undefined || value === null) return 'nothing';
  if (Array.isArray(value)) return 'a list';
  switch (typeof value) {
    case 'object':
      return 'a map';
    case 'string':
      return 'text';
    case 'number':
      return 'a number';
    default:
      return 'true or false';
  }
}

const TYPE_WORDS: Readonly<Record<string, string>> = {
  object: 'a map',
  array: 'a list',
  string: 'text',
  number: 'a number',
  integer: 'a whole number',
  boolean: 'true or false',
  null: 'nothing',
};

const WORD = 'a word of lower-case letters, digits and underscores that begins with a letter';
const ID = 'an id of lower-case letters, digits and underscores, with dots between its parts';

const PATTERN_WORDS: Readonly<Record<string, string>> = {
  '^=': 'a number, or an expression that begins with =',
  '^[a-z][a-z0-9_]*$': WORD,
  '^[a-z0-9_]+$': 'a word of lower-case letters, digits and underscores',
  '^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$': ID,
  '^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$)': 'a landmark, a joint, or an expression that begins with =',
  '^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$)': 'a number, an expression that begins with =, or control.attribute',
  '^[a-z][a-z0-9_]*@[1-9][0-9]*$': 'a name and a version, such as walker@4',
  '^[A-Za-z0-9_]*$': 'letters, digits and underscores only',
  '^[A-Za-z0-9_]{0,3}$': 'at most three letters, digits or underscores',
};

/** What a pattern of the schemas asks for, in words. */
export function patternWords(pattern: string): string {
  return PATTERN_WORDS[pattern] ?? `text that matches ${pattern}`;
}

/** What a JSON Schema `type` asks for, in words. */
export function typeWords(type: string | readonly string[]): string {
  const types = typeof type === 'string' ? [type] : type;
  if (types.includes('number') && types.includes('string') && !types.includes('boolean')) {
    return patternWords('^=');
  }
  return types.map((name) => TYPE_WORDS[name] ?? name).join(' or ');
}

/** A place in words: its last key in quotes, with the entry it belongs to. */
export function placeWords(path: readonly (string | number)[]): string {
  const last = path[path.length - 1];
  if (last === undefined) return 'The document';
  const owner = path[path.length - 2];
  if (typeof last === 'number') return `Item ${last + 1} of "${owner ?? ''}"`;
  return owner === undefined || path.length < 3 ? `"${last}"` : `"${last}" of "${owner}"`;
}
