import type { Finding } from '../findings/Finding';
import { FindingList, MAXIMUM_FINDINGS } from '../findings/FindingList';
import { finishFindings } from '../findings/finishFindings';
import { findEvaluationRing } from '../pose/evaluationOrder';
import type { Rig } from '../rig/Rig';
import type { SourceText } from '../source/SourceText';
import { checkSeal } from './checkSeal';
import { slipwayFindings } from './findings';
import { LinkBuilder } from './LinkBuilder';
import { type Line, spanOfLine } from './lines';
import { parseLine } from './parseLine';
import { type PlacedStep, readStep } from './readStep';
import { SceneBuilder } from './SceneBuilder';
import { SceneNames } from './SceneNames';
import type { Statement } from './Value';

export interface ScriptRun {
  /** What the script built; null as soon as anything is wrong with it. */
  readonly rig: Rig | null;
  readonly findings: readonly Finding[];
}

/** Reads every line by the grammar, up to the number of findings that are ever shown. */
function parseLines(lines: readonly Line[], findings: FindingList): readonly (Statement | null)[] {
  const statements: (Statement | null)[] = [];
  for (const line of lines) {
    statements.push(parseLine(line, findings));
    if (findings.all.length > MAXIMUM_FINDINGS) break;
  }
  return statements;
}

function checkScenePlace(
  lines: readonly Line[],
  statements: readonly (Statement | null)[],
  findings: FindingList,
): void {
  const [line] = lines;
  const [first] = statements;
  if (line === undefined) return;
  if (first && first.verb !== 'scene') {
    const fact = 'The second line is not a "scene".';
    findings.report(slipwayFindings, 'script-scene-misplaced', spanOfLine(line), { fact });
  }
  for (const statement of statements.slice(1)) {
    if (statement?.verb !== 'scene') continue;
    const fact = `A "scene" stands on line ${statement.line}.`;
    findings.report(slipwayFindings, 'script-scene-misplaced', statement.verbSpan, { fact });
  }
}

/** Carries out one step. */
function runStep(placed: PlacedStep, scene: SceneBuilder, links: LinkBuilder): void {
  const { step } = placed;
  // The placed step narrows with its step, which the type checker cannot see through the wrapper.
  const as = <S extends PlacedStep['step']>(_: S): PlacedStep<S> => placed as PlacedStep<S>;
  switch (step.verb) {
    case 'scene':
      scene.openScene(as(step));
      break;
    case 'group':
    case 'joint':
    case 'control':
    case 'note':
    case 'line':
    case 'geometry':
      scene.addNode(as(step));
      break;
    case 'attr':
      scene.addAttribute(as(step));
      break;
    case 'limit':
      scene.limitChannel(as(step));
      break;
    case 'lock':
      scene.lockChannels(as(step));
      break;
    case 'show':
      scene.showNode(as(step));
      break;
    case 'entry':
      scene.addEntry(as(step));
      break;
    case 'constrain':
      links.constrain(as(step));
      break;
    case 'space':
      links.space(as(step));
      break;
    case 'drive':
      links.drive(as(step));
      break;
    case 'skin':
      links.skin(as(step));
      break;
    case 'shape':
      links.shape(as(step));
      break;
    case 'two_bone':
    case 'reach':
    case 'spline':
    case 'twist':
    case 'aim':
    case 'foot_roll':
      links.solve(as(step));
      break;
    default:
      step satisfies never;
  }
}

function checkRing(rig: Rig, names: SceneNames, fallback: Line, findings: FindingList): void {
  const ring = findEvaluationRing(rig);
  if (ring === null) return;
  const onRing = new Set(ring);
  const link =
    rig.constraints.find(
      ({ target, sources }) => onRing.has(target) && sources.some(({ node }) => onRing.has(node)),
    ) ?? rig.solvers.find(({ name }) => onRing.has(name));
  const span = names.spanOf(link?.name ?? ring[0] ?? '') ?? spanOfLine(fallback);
  const shown = ring.map((name) => `"${name}"`).join(' → ');
  findings.report(slipwayFindings, 'script-ring', span, { ring: shown });
}

/**
 * Carries out a script in memory, by the meaning that `reference.md` gives every verb. Version, count and SHA-256 are
 * checked before the first step. Never throws: whatever is wrong is a finding with its line and column, and then
 * there is no rig. Time and memory grow with the length of the script.
 */
export function runScript(source: SourceText): ScriptRun {
  const findings = new FindingList();
  const lines = checkSeal(source, findings);
  if (lines === null) return { rig: null, findings: finishFindings(findings.all) };
  const [first] = lines;
  if (first === undefined) {
    const whole = { source, number: 1, start: 0, end: 0 };
    const fact = 'The script has no "scene".';
    findings.report(slipwayFindings, 'script-scene-misplaced', spanOfLine(whole), { fact });
    return { rig: null, findings: finishFindings(findings.all) };
  }
  const parsed = parseLines(lines, findings);
  checkScenePlace(lines, parsed, findings);
  const statements = parsed.filter((statement) => statement !== null);
  const everyLineRead = statements.length === lines.length;
  const names = new SceneNames(statements, everyLineRead, findings);
  const scene = new SceneBuilder(names, findings);
  const links = new LinkBuilder(names, scene, findings);
  for (const statement of statements) {
    const placed = readStep(statement, findings);
    if (placed !== null) runStep(placed, scene, links);
    if (findings.all.length > MAXIMUM_FINDINGS) break;
  }
  const rig = scene.finish(links);
  if (!findings.hasErrors && rig !== null) checkRing(rig, names, first, findings);
  return { rig: findings.hasErrors ? null : rig, findings: finishFindings(findings.all) };
}
