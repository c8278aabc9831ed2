import type { EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import { fillTemplate } from '../findings/FindingList';
import type { ResolveContext } from '../resolve/Reporter';
import type { ResolvedRecipe } from '../resolve/types';
import type { SolvedRecipe } from '../solve/types';
import { type ExpressionNames, namesInExpressions } from './namesInExpressions';
import { RULES } from './rules/index';

/** Runs every rule over the resolved recipe in one walk. */
export function runRules(
  recipe: EvaluatedRecipe,
  resolved: ResolvedRecipe,
  solved: SolvedRecipe,
  stage: ResolveContext,
): void {
  let names: ExpressionNames | null = null;
  const expressionNames = (): ExpressionNames => {
    names ??= namesInExpressions(stage.document.value);
    return names;
  };
  const handlers = RULES.map((rule) =>
    rule.create({
      recipe,
      resolved,
      solved,
      stage,
      isWhole: stage.poisoned.size === 0,
      expressionNames,
      report(path, parameters, more = {}) {
        stage.findings.add({
          code: rule.code,
          severity: rule.severity,
          message: fillTemplate(rule.message, parameters),
          span: stage.document.spanAt(path, more.part ?? 'value'),
          related: more.related ?? [],
          help: fillTemplate(rule.help, parameters),
          ...(more.fix ? { fix: more.fix } : {}),
        });
      },
    }),
  );
  const written = <Entry>(
    collection: string,
    entries: Readonly<Record<string, Entry>> | undefined,
    visit: (name: string, entry: Entry) => void,
  ): void => {
    for (const [name, entry] of Object.entries(entries ?? {}))
      if (!stage.poisoned.has(`${collection}/${name}`)) visit(name, entry);
  };
  written('params', recipe.params, (name, entry) => {
    for (const handler of handlers) handler.parameter?.(name, entry);
  });
  written('landmarks', recipe.landmarks, (name, entry) => {
    for (const handler of handlers) handler.landmark?.(name, entry);
  });
  written('roles', recipe.roles, (id, entry) => {
    for (const handler of handlers) handler.role?.(id, entry);
  });
  written('containers', recipe.containers, (id, entry) => {
    for (const handler of handlers) handler.container?.(id, entry);
  });
  written('parts', recipe.parts, (id, entry) => {
    for (const handler of handlers) handler.part?.(id, entry);
  });
  written('controls', recipe.controls, (id, entry) => {
    for (const handler of handlers) handler.controlEntry?.(id, entry);
  });
  for (const chain of resolved.chains) for (const handler of handlers) handler.chain?.(chain);
  for (const control of resolved.controls) for (const handler of handlers) handler.control?.(control);
  for (const solver of resolved.solvers) for (const handler of handlers) handler.solver?.(solver);
  for (const constraint of resolved.constraints)
    for (const handler of handlers) handler.constraint?.(constraint);
  for (const driver of resolved.drivers) for (const handler of handlers) handler.driver?.(driver);
  for (const mesh of resolved.geometry) for (const handler of handlers) handler.geometry?.(mesh);
  for (const skin of resolved.skins) for (const handler of handlers) handler.skin?.(skin);
  for (const shape of resolved.shapes) for (const handler of handlers) handler.shape?.(shape);
  for (const line of resolved.guideLines) for (const handler of handlers) handler.guideLine?.(line);
  for (const handler of handlers) handler.finish?.();
}
