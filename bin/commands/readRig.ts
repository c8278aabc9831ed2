import { compile, type Rig, runScript, type SourceText } from '../../compiler/index';
import { hasErrors, printFindings } from './printFindings';
import { readRequest } from './readRequest';
import { readText } from './readText';

/** The rig of a recipe or of a build script (`.slip`); null when it has errors, which are then printed. */
export function readRig(path: string, houses: Readonly<Record<string, SourceText>>): Rig | null {
  if (path.endsWith('.slip')) {
    const source = readText(path);
    const { rig, findings } = runScript(source);
    if (hasErrors(findings)) printFindings(findings, [source]);
    return rig;
  }
  const { recipe, bases } = readRequest(path);
  const { rig, findings } = compile({ recipe, bases, houses });
  if (hasErrors(findings)) {
    printFindings(findings, [recipe, ...Object.values(bases), ...Object.values(houses)]);
  }
  return rig;
}
