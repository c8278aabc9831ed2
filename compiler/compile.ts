import { assembleRig } from './assemble/assembleRig';
import { checkEvaluationRing } from './check/checkEvaluationRing';
import { runRules } from './check/runRules';
import { checkDeliveries } from './deliver/checkDeliveries';
import type { DeliveryProfile } from './deliver/DeliveryProfile';
import { characterNameOf } from './documents/characterName';
import { houseSeverities } from './documents/houseSeverities';
import { readHouse } from './documents/readHouse';
import { readRecipe } from './documents/readRecipe';
import { emitScript } from './emit/emitScript';
import { expandRecipe } from './expand/expandRecipe';
import { evaluateRecipe } from './expressions/evaluateRecipe';
import type { Finding } from './findings/Finding';
import { FindingList } from './findings/FindingList';
import { finishFindings } from './findings/finishFindings';
import { canonicalJson } from './hash/canonicalJson';
import { sha256Hex } from './hash/sha256Hex';
import { planSteps } from './plan/planSteps';
import { resolveRecipe } from './resolve/resolveRecipe';
import type { Rig } from './rig/Rig';
import { checkRecipeShape } from './schema/checkShape';
import { solveRecipe } from './solve/solveRecipe';
import type { SourceText, Span } from './source/SourceText';
import { readIntent } from './trials/readIntent';
import { reportTrials } from './trials/reportTrials';
import { runTrials } from './trials/runTrials';
import type { TrialResult } from './trials/TrialResult';
import { COMPILER_VERSION } from './version';

/** Everything one compile depends on; the same request always gives the same compilation. */
export interface CompileRequest {
  readonly recipe: SourceText;
  /** House rules by `name@version`, beside those that come with Pintle. */
  readonly houses?: Readonly<Record<string, SourceText>>;
  /** Recipe versions by `name@version`, for `extends`. */
  readonly bases?: Readonly<Record<string, SourceText>>;
  /** The cast member to build; without one, or without a name, the recipe under its own name. */
  readonly character?: {
    readonly name?: string;
    readonly params?: Readonly<Record<string, number>>;
    readonly patch?: SourceText;
  };
  /** Number of the saved version; left out for a draft. */
  readonly version?: number;
  /** Whether the rig is put to its trials; they run unless this is false. */
  readonly trials?: boolean;
}

/** What one compile gives. Rig and script are null when a finding is an error. */
export interface Compilation {
  readonly findings: readonly Finding[];
  readonly character: string;
  /** SHA-256 of the canonical merged recipe and the character's parameters; null when nothing could be read. */
  readonly recipeHash: string | null;
  readonly rig: Rig | null;
  readonly script: string | null;
  /** What the trials measured; empty without a rig to try, and when none were asked for. */
  readonly trials: readonly TrialResult[];
  /** The rig and script that failed a trial, to be looked at and never built; null in every other case. */
  readonly failing: { readonly rig: Rig; readonly script: string } | null;
  /** The profiles that files are made for. */
  readonly deliveries: readonly DeliveryProfile[];
  /** Where a node of the rig was written, by its id; null for what no document wrote. */
  placeOf(nodeId: string): NodePlace | null;
}

/** The entry that a node comes from: its key, and everything it says. */
export interface NodePlace {
  readonly key: Span;
  readonly value: Span;
}

/**
 * Turns a recipe into a rig and its build script: parse and merge the documents, check their shape, evaluate
 * expressions, write parts out in primitives, resolve ids, containers and names, solve the geometry, check the
 * rules, assemble the rig, hold it against its delivery profiles, plan its steps, emit them, and put it to its trials. Never throws for what a person
 * wrote: each stage adds its findings and goes on as far as it can, so that one compile shows them all.
 */
export function compile(request: CompileRequest): Compilation {
  const findings = new FindingList();
  const merged = readRecipe(request.recipe, request.bases ?? {}, request.character?.patch, findings);
  const character = characterNameOf(request.character?.name, merged, findings);
  const stop = (): Compilation => {
    const finished = finishFindings(findings.all);
    return {
      findings: finished,
      character,
      recipeHash: null,
      rig: null,
      script: null,
      trials: [],
      failing: null,
      deliveries: [],
      placeOf: () => null,
    };
  };
  // Beyond broken YAML every finding would be about a structure nobody wrote.
  if (merged.value === undefined || merged.isBroken) return stop();

  const shape = checkRecipeShape(merged, findings);
  if (!shape.value) return stop();
  const found = readHouse(shape.value.house, merged, request.houses ?? {}, findings);
  if (!found) return stop();
  const { house, reference, hash: houseHash } = found;
  findings.overrule(houseSeverities(house.rules));

  const context = { document: merged, findings, poisoned: shape.poisoned, house };
  const recipe = evaluateRecipe(shape.value, request.character?.params ?? {}, context);
  const expanded = expandRecipe(recipe, context);
  const resolved = resolveRecipe(recipe, expanded, character, context);
  const solved = solveRecipe(resolved, context);
  runRules(recipe, resolved, solved, context);

  const recipeHash = sha256Hex(
    canonicalJson({ recipe: merged.value, params: request.character?.params ?? {} }),
  );
  if (findings.hasErrors) return { ...stop(), recipeHash };

  const scene = {
    character,
    recipe: `${recipe.recipe}@${request.version ?? 'draft'}`,
    house: reference,
    up: expanded.scene.upAxis,
    forward: expanded.scene.forwardAxis,
    unit: expanded.scene.unit,
    recipeHash,
    houseHash,
    compiler: COMPILER_VERSION,
  };
  const rig = assembleRig(scene, resolved, solved);
  checkEvaluationRing(rig, resolved, context);
  const deliveries = checkDeliveries(recipe.deliver ?? [], reference, house.rules, rig, context);
  if (findings.hasErrors) return { ...stop(), recipeHash };
  const script = emitScript(planSteps(rig));
  const placeOf = (nodeId: string): NodePlace | null => {
    const path = resolved.nodeById.get(nodeId)?.path;
    return path && path.length > 0 && merged.layers.some((layer) => layer.has(path))
      ? { key: merged.spanAt(path, 'key'), value: merged.spanAt(path) }
      : null;
  };
  const trials = request.trials === false ? [] : runTrials(rig, readIntent(resolved, context));
  const spanOf = (nodeId: string | undefined): Span =>
    (nodeId === undefined ? null : placeOf(nodeId)?.key) ?? merged.spanAt(['recipe']);
  reportTrials(trials, spanOf, findings);
  const failing = findings.hasErrors ? { rig, script } : null;
  return {
    findings: finishFindings(findings.all),
    character,
    recipeHash,
    rig: failing ? null : rig,
    script: failing ? null : script,
    trials,
    failing,
    deliveries,
    placeOf,
  };
}
