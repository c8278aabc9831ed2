import type { ErrorObject } from 'ajv';
import { closestNames } from '../findings/closestNames';
import type { FindingList } from '../findings/FindingList';
import type { MergedDocument } from '../merge/types';
import type { JsonValue, Path } from '../syntax/types';
import { schemaFindings } from './findings';
import { partKinds, schemaAt } from './schemaAt';
import { kindOf, patternWords, placeWords, typeWords } from './shapeWords';

/** A validator's error with the path it is about, and what the schema and the document hold there. */
export interface ShapeError {
  readonly error: ErrorObject;
  readonly path: Path;
  readonly value: JsonValue | undefined;
  readonly schema: unknown;
}

const LISTED_KEYS = 12;

function quoteList(values: readonly unknown[]): string {
  const shown = values
    .slice(0, LISTED_KEYS)
    .map((value) => (typeof value === 'string' ? `"${value}"` : String(value)));
  return values.length > LISTED_KEYS
    ? `${shown.join(', ')} and ${values.length - LISTED_KEYS} more`
    : shown.join(', ');
}

function didYouMean(close: readonly string[]): string {
  return `Did you mean ${close.map((name) => `"${name}"`).join(' or ')}?`;
}

/** Turns one validator error into a finding in words at its exact place. */
export function reportShapeError(shape: ShapeError, document: MergedDocument, findings: FindingList): void {
  const { error, path, value, schema } = shape;
  const parameters = error.params as Readonly<Record<string, unknown>>;
  const what = placeWords(path);
  const span = () => document.spanAt(path);

  const reportChoice = (
    chosen: string,
    allowed: readonly unknown[],
    at: Path,
    part: 'key' | 'value',
  ): void => {
    const place = document.spanAt(at, part);
    const names = allowed.filter((item): item is string => typeof item === 'string');
    const close = closestNames(chosen, names);
    const [only] = close;
    findings.report(
      schemaFindings,
      'not-one-of',
      place,
      { value: chosen, what: placeWords(part === 'key' ? path : at), allowed: quoteList(allowed) },
      only !== undefined && close.length === 1
        ? {
            help: `${didYouMean(close)} Allowed are ${quoteList(allowed)}.`,
            fix: { title: `Write "${only}"`, safe: false, edits: [{ span: place, newText: only }] },
          }
        : {},
    );
  };

  if (error.propertyName !== undefined) {
    const at = [...path, error.propertyName];
    if (error.keyword === 'enum') {
      reportChoice(error.propertyName, parameters.allowedValues as readonly unknown[], at, 'key');
    } else if (error.keyword === 'maxLength') {
      const limit = parameters.limit as number;
      findings.report(schemaFindings, 'text-too-long', document.spanAt(at, 'key'), {
        what: `The key "${error.propertyName.slice(0, 20)}…"`,
        limit,
      });
    } else if (error.keyword === 'pattern') {
      const wanted = patternWords(parameters.pattern as string);
      findings.report(schemaFindings, 'text-not-legal', document.spanAt(at, 'key'), {
        value: error.propertyName,
        wanted,
      });
    }
    return;
  }

  switch (error.keyword) {
    case 'additionalProperties': {
      const key = String(parameters.additionalProperty);
      const known = Object.keys(schemaAt(schema, document.value, path).properties ?? {});
      const close = closestNames(key, known);
      const [only] = close;
      const place = document.spanAt([...path, key], 'key');
      findings.report(
        schemaFindings,
        'unknown-key',
        place,
        { key, known: quoteList(known) },
        only === undefined
          ? {}
          : {
              help: didYouMean(close),
              ...(close.length === 1
                ? {
                    fix: {
                      title: `Rename to "${only}"`,
                      safe: true,
                      edits: [{ span: place, newText: only }],
                    },
                  }
                : {}),
            },
      );
      return;
    }
    case 'required': {
      const key = String(parameters.missingProperty);
      findings.report(schemaFindings, 'missing-key', document.spanAt(path, 'key'), { what, key });
      return;
    }
    case 'discriminator': {
      const key = String(parameters.tag);
      const at = [...path, key];
      if (parameters.error !== 'tag') {
        reportChoice(String(parameters.tagValue), partKinds(), at, 'value');
      } else if (parameters.tagValue === undefined) {
        findings.report(schemaFindings, 'missing-key', document.spanAt(path, 'key'), { what, key });
      } else {
        findings.report(schemaFindings, 'wrong-type', document.spanAt(at), {
          what: placeWords(at),
          found: kindOf(parameters.tagValue as JsonValue),
          wanted: typeWords('string'),
        });
      }
      return;
    }
    case 'type':
      findings.report(schemaFindings, 'wrong-type', span(), {
        what,
        found: kindOf(value),
        wanted: typeWords(parameters.type as string | readonly string[]),
      });
      return;
    case 'enum':
      reportChoice(String(value), parameters.allowedValues as readonly unknown[], path, 'value');
      return;
    case 'const':
      reportChoice(String(value), [parameters.allowedValue], path, 'value');
      return;
    case 'pattern':
      findings.report(schemaFindings, 'text-not-legal', span(), {
        value: String(value).slice(0, 80),
        wanted: patternWords(parameters.pattern as string),
      });
      return;
    case 'maxLength':
      findings.report(schemaFindings, 'text-too-long', span(), {
        what,
        limit: parameters.limit as number,
      });
      return;
    case 'minItems':
    case 'maxItems':
    case 'minProperties': {
      const limit = parameters.limit as number;
      const side = error.keyword === 'maxItems' ? 'at most' : 'at least';
      const found = Array.isArray(value) ? value.length : 0;
      findings.report(schemaFindings, 'list-size', span(), {
        what,
        found: `${found} entries`,
        wanted: `${side} ${limit}`,
      });
      return;
    }
    case 'minimum':
    case 'maximum': {
      const side = error.keyword === 'maximum' ? 'at most' : 'at least';
      findings.report(schemaFindings, 'out-of-range', span(), {
        what,
        value: String(value),
        wanted: `${side} ${String(parameters.limit)}`,
      });
      return;
    }
    case 'anyOf':
      reportPlace(what, value, schemaAt(schema, document.value, path).title === 'Place', span(), findings);
      return;
    default:
      findings.report(schemaFindings, 'wrong-type', span(), {
        what,
        found: kindOf(value),
        wanted: error.message ?? 'another value',
      });
  }
}

/** Points and places are the only values with two spellings: a list of three numbers, or a text. */
function reportPlace(
  what: string,
  value: JsonValue | undefined,
  mayBeNamed: boolean,
  span: ReturnType<MergedDocument['spanAt']>,
  findings: FindingList,
): void {
  if (Array.isArray(value)) {
    if (value.length === 3) return; // its items have findings of their own
    findings.report(schemaFindings, 'list-size', span, {
      what,
      found: `${value.length} numbers`,
      wanted: 'three numbers',
    });
  } else if (typeof value === 'string') {
    findings.report(schemaFindings, 'text-not-legal', span, {
      value: value.slice(0, 80),
      wanted: mayBeNamed
        ? 'three numbers in brackets, a landmark or joint, or an expression that begins with ='
        : 'three numbers in brackets, or an expression that begins with =',
    });
  } else {
    findings.report(schemaFindings, 'wrong-type', span, {
      what,
      found: kindOf(value),
      wanted: 'three numbers in brackets',
    });
  }
}
