import type { StageContext } from '../expand/StageContext';
import { closestNames } from '../findings/closestNames';
import type { Parameter, Recipe } from '../schema/generated/recipeTypes';
import type { Span } from '../source/SourceText';
import { expressionFindings } from './findings';

function rangeWords({ min, max }: Parameter): string {
  if (min !== undefined && max !== undefined) return `between ${min} and ${max}`;
  return min === undefined ? `at most ${max}` : `at least ${min}`;
}

function checkValue(
  name: string,
  value: number,
  parameter: Parameter,
  span: Span,
  context: StageContext,
): boolean {
  const isInside = value >= (parameter.min ?? -Infinity) && value <= (parameter.max ?? Infinity);
  if (!isInside) {
    const parameters = { name, value, wanted: rangeWords(parameter) };
    context.findings.report(expressionFindings, 'parameter-out-of-range', span, parameters);
  }
  const isWhole = !parameter.whole || Number.isInteger(value);
  if (!isWhole) context.findings.report(expressionFindings, 'parameter-not-whole', span, { name, value });
  return isInside && isWhole;
}

/**
 * The value of every parameter: the character's where it gives one, else the default. A refused value is a finding,
 * and the default stands in so that the rest can still be checked.
 */
export function readParameters(
  recipe: Recipe,
  given: Readonly<Record<string, number>>,
  context: StageContext,
): Readonly<Record<string, number>> {
  const { document, findings } = context;
  const values: Record<string, number> = {};
  const parameters = recipe.params ?? {};
  for (const [name, parameter] of Object.entries(parameters)) {
    values[name] = parameter.default;
    const { min, max } = parameter;
    if (min !== undefined && max !== undefined && min > max) {
      findings.report(expressionFindings, 'parameter-limits-inverted', document.spanAt(['params', name]), {
        name,
        min,
        max,
      });
      continue;
    }
    checkValue(name, parameter.default, parameter, document.spanAt(['params', name, 'default']), context);
    const value = Object.hasOwn(given, name) ? given[name] : undefined;
    if (value === undefined) continue;
    // What a character gives was not written in the recipe; the parameter itself is the nearest place.
    if (checkValue(name, value, parameter, document.spanAt(['params', name], 'key'), context))
      values[name] = value;
  }
  for (const name of Object.keys(given)) {
    if (Object.hasOwn(parameters, name)) continue;
    const known = Object.keys(parameters);
    const close = closestNames(name, known);
    findings.report(
      expressionFindings,
      'parameter-unknown',
      document.spanAt(['params'], 'key'),
      { name, known: known.length > 0 ? known.join(', ') : 'none' },
      close.length > 0 ? { help: `Did you mean ${close.map((item) => `"${item}"`).join(' or ')}?` } : {},
    );
  }
  return values;
}
