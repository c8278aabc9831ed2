import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { FindingList } from '@/compiler/findings/FindingList';
import { parseDocument } from '@/compiler/syntax/parseDocument';

/**
 * Source: the YAML test suite (github.com/yaml/yaml-test-suite), MIT, copied to tests/data/yaml/suite with its
 * licence. Each file holds one or more cases.
 */
interface SuiteCase {
  readonly name?: string;
  readonly yaml: string;
  readonly json?: string;
  readonly fail?: boolean;
  /** The suite itself asks readers to pass over the cases of such a file. */
  readonly skip?: boolean | undefined;
}

const folder = new URL('../../data/yaml/suite/', import.meta.url);

/** The suite shows white space by visible marks; see the comment at the head of its own reader. */
function unmark(text: string): string {
  return text
    .replaceAll('␣', ' ')
    .replace(/—*»/g, '\t')
    .replaceAll('⇔', '\uFEFF')
    .replaceAll('↵', '')
    .replaceAll('←', '\r')
    .replace(/∎\n$/, '');
}

const cases = readdirSync(folder)
  .filter((name) => name.endsWith('.yaml'))
  .flatMap((file) => {
    const entries = parse(readFileSync(new URL(file, folder), 'utf8')) as SuiteCase[];
    return entries.map((entry, index) => ({ ...entry, skip: entries[0]?.skip, title: `${file} ${index}` }));
  })
  .filter(({ skip }) => skip !== true);

/** What recipes refuse although it is YAML, each by its own finding. */
const REFUSED_ON_PURPOSE = new Set([
  'tag-refused',
  'key-not-text',
  'several-documents',
  'document-empty',
  'hidden-character',
  'merge-key',
  'look-alike-name',
]);

function read(text: string) {
  const findings = new FindingList();
  const { value } = parseDocument({ name: 'case.yaml', text }, findings);
  return { value, codes: findings.all.map(({ code }) => code) };
}

describe('the YAML test suite', () => {
  it('has its cases here', () => expect(cases.length).toBeGreaterThan(200));

  it.each(cases.filter(({ fail }) => fail).map((item) => [item.title, item] as const))(
    'gives a finding for the invalid %s',
    (_, { yaml }) => {
      expect(read(unmark(yaml)).codes.length).toBeGreaterThan(0);
    },
  );

  it.each(cases.filter(({ fail }) => !fail).map((item) => [item.title, item] as const))(
    'reads the valid %s, or refuses it by name',
    (_, { yaml, json }) => {
      const { value, codes } = read(unmark(yaml));
      if (codes.length > 0) {
        expect(codes.filter((code) => !REFUSED_ON_PURPOSE.has(code))).toEqual([]);
        return;
      }
      if (json !== undefined && json.trim() !== '') expect(value).toEqual(JSON.parse(json));
    },
  );
});
