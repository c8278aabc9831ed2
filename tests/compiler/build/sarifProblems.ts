import { readFileSync } from 'node:fs';
import Ajv from 'ajv';
import addFormats from 'ajv-formats';
import { expect } from 'vitest';

/**
 * Source: OASIS SARIF 2.1.0 schema (tests/data/sarif/SOURCE). It names draft 4, of which this validator knows only
 * the successors; the schema uses nothing that changed since, but for the name of its own identifier.
 */
function sarifValidator() {
  const text = readFileSync(new URL('../../data/sarif/sarif-schema-2.1.0.json', import.meta.url), 'utf8');
  const { $schema, id, ...schema } = JSON.parse(text) as Record<string, unknown>;
  expect($schema).toBe('http://json-schema.org/draft-04/schema#');
  expect(String(id)).toContain('sarif-schema-2.1.0.json');
  expect(text).not.toMatch(/"exclusive(Minimum|Maximum)"/);
  const ajv = new Ajv({ strict: false, allErrors: true });
  addFormats(ajv);
  return ajv.compile(schema);
}

const validate = sarifValidator();

/** What the official schema finds wrong in a log; an empty list for a valid one. */
export const sarifProblems = (log: unknown): unknown => (validate(log) ? [] : validate.errors);
