import { closestNames } from '../findings/closestNames';
import type { FindingList } from '../findings/FindingList';
import type { Span } from '../source/SourceText';
import { slipwayFindings } from './findings';
import { describeKind, readValue } from './readValue';
import type { Step } from './Step';
import type { Pair, Statement } from './Value';
import { type KeyRule, VERBS, type Verb } from './verbs';

/** A step with the places it was written at. */
export interface PlacedStep<S extends Step = Step> {
  readonly step: S;
  readonly line: number;
  readonly nameSpan: Span;
  /** Span of the whole line. */
  readonly span: Span;
  /** Span of a key's value; of the line when the key was left out. */
  spanOf(key: string): Span;
}

function suggestion(
  word: string,
  candidates: readonly string[],
  otherwise: string,
): { readonly help?: string } {
  const close = closestNames(word, candidates);
  return close.length === 0
    ? {}
    : { help: `Did you mean ${close.map((name) => `"${name}"`).join(' or ')}? ${otherwise}` };
}

function isVerb(word: string): word is Verb {
  return Object.hasOwn(VERBS, word);
}

function readPair(verb: Verb, pair: Pair, values: Record<string, unknown>, findings: FindingList): boolean {
  const keys: Readonly<Record<string, KeyRule>> = VERBS[verb].keys;
  const rule = Object.hasOwn(keys, pair.key) ? keys[pair.key] : undefined;
  if (rule === undefined) {
    const names = Object.keys(keys);
    const parameters = { verb, key: pair.key, keys: names.join(', ') };
    const more = suggestion(pair.key, names, `The keys of "${verb}" are: ${names.join(', ')}.`);
    findings.report(slipwayFindings, 'script-key-unknown', pair.keySpan, parameters, more);
    return false;
  }
  if (Object.hasOwn(values, pair.key)) {
    findings.report(slipwayFindings, 'script-key-repeated', pair.keySpan, { key: pair.key });
    return false;
  }
  const value = readValue(rule.kind, pair.value);
  // Noted even when wrong, so that it is not also reported as missing.
  values[pair.key] = value;
  if (value !== undefined) return true;
  const parameters = { key: pair.key, expected: describeKind(rule.kind) };
  findings.report(slipwayFindings, 'script-value-wrong', pair.value.span, parameters);
  return false;
}

function fillMissing(
  verb: Verb,
  statement: Statement,
  values: Record<string, unknown>,
  findings: FindingList,
): boolean {
  const keys: Readonly<Record<string, KeyRule>> = VERBS[verb].keys;
  let complete = true;
  for (const [key, rule] of Object.entries(keys)) {
    if (Object.hasOwn(values, key)) continue;
    values[key] = null;
    if (rule.optional) continue;
    complete = false;
    const parameters = { verb, key, expected: describeKind(rule.kind) };
    findings.report(slipwayFindings, 'script-key-missing', statement.verbSpan, parameters);
  }
  return complete;
}

/** Reads a statement by the table of verbs; null, with every fault of its keys and values found, when it has one. */
export function readStep(statement: Statement, findings: FindingList): PlacedStep | null {
  const { verb, name, pairs, line, nameSpan, span } = statement;
  if (!isVerb(verb)) {
    const verbs = Object.keys(VERBS);
    const parameters = { verb, verbs: verbs.join(', ') };
    const more = suggestion(verb, verbs, `The verbs are: ${parameters.verbs}.`);
    findings.report(slipwayFindings, 'script-verb-unknown', statement.verbSpan, parameters, more);
    return null;
  }
  const values: Record<string, unknown> = {};
  const sound = pairs.map((pair) => readPair(verb, pair, values, findings));
  const complete = fillMissing(verb, statement, values, findings);
  if (!complete || sound.includes(false)) return null;
  const spanOf = (key: string): Span => pairs.find((pair) => pair.key === key)?.value.span ?? span;
  // Every key of the verb was read by the table from which the type of the step is made.
  return { step: { verb, name, values } as unknown as Step, line, nameSpan, span, spanOf };
}
