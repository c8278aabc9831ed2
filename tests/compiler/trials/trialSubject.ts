import { assembleRig } from '@/compiler/assemble/assembleRig';
import { readHouse } from '@/compiler/documents/readHouse';
import { readRecipe } from '@/compiler/documents/readRecipe';
import { expandRecipe } from '@/compiler/expand/expandRecipe';
import { evaluateRecipe } from '@/compiler/expressions/evaluateRecipe';
import { FindingList } from '@/compiler/findings/FindingList';
import { resolveRecipe } from '@/compiler/resolve/resolveRecipe';
import type { Rig } from '@/compiler/rig/Rig';
import { checkRecipeShape } from '@/compiler/schema/checkShape';
import { solveRecipe } from '@/compiler/solve/solveRecipe';
import { readIntent } from '@/compiler/trials/readIntent';
import type { TrialIntent } from '@/compiler/trials/TrialIntent';

/** A sound rig with what its recipe asks of it, so that a test can break the one and keep the other. */
export function trialSubject(text: string): { readonly rig: Rig; readonly intent: TrialIntent } {
  const findings = new FindingList();
  const merged = readRecipe({ name: 'trial.recipe.yaml', text }, {}, undefined, findings);
  const shape = checkRecipeShape(merged, findings);
  if (!shape.value) throw new Error(findings.all.map(({ message }) => message).join('\n'));
  const found = readHouse(shape.value.house, merged, {}, findings);
  if (!found) throw new Error('no house');
  const context = { document: merged, findings, poisoned: shape.poisoned, house: found.house };
  const recipe = evaluateRecipe(shape.value, {}, context);
  const expanded = expandRecipe(recipe, context);
  const resolved = resolveRecipe(recipe, expanded, 'someone', context);
  const solved = solveRecipe(resolved, context);
  if (findings.hasErrors) throw new Error(findings.all.map(({ message }) => message).join('\n'));
  const scene = {
    character: 'someone',
    recipe: 'trial@draft',
    house: found.reference,
    up: expanded.scene.upAxis,
    forward: expanded.scene.forwardAxis,
    unit: expanded.scene.unit,
    recipeHash: '0'.repeat(64),
    houseHash: found.hash,
    compiler: '0',
  };
  return { rig: assembleRig(scene, resolved, solved), intent: readIntent(resolved, context) };
}
