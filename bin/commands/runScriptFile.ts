import { describePose, readPoseText, runScript } from '../../compiler/index';
import { hasErrors, printFindings } from './printFindings';
import { readParameters } from './readParameters';
import { readText } from './readText';
import { WrongUse } from './WrongUse';

function lengthWords(value: number): string {
  return value.toFixed(4).padStart(12);
}

/** `run SCRIPT [--pose FILE] [--json]`: builds the script's rig in memory, poses it and prints every node. */
export function runScriptFile(parameters: readonly string[]): number {
  const { values, positionals } = readParameters(parameters, {
    pose: { type: 'string' },
    json: { type: 'boolean' },
  });
  const [file, ...others] = positionals;
  if (file === undefined || others.length > 0) throw new WrongUse('Name one script.');
  const script = readText(file);
  const { rig, findings } = runScript(script);
  if (!rig) {
    if (values.json) console.log(JSON.stringify({ findings }, null, 2));
    else printFindings(findings, [script]);
    return 1;
  }
  const poseText = values.pose === undefined ? null : readText(values.pose);
  const reading = poseText ? readPoseText(poseText, rig) : { pose: {}, findings: [] };
  const all = [...findings, ...reading.findings];
  if (poseText && hasErrors(reading.findings)) {
    if (values.json) console.log(JSON.stringify({ findings: all }, null, 2));
    else printFindings(all, [script, poseText]);
    return 1;
  }
  const nodes = describePose(rig, reading.pose);
  if (values.json) {
    console.log(JSON.stringify({ scene: rig.scene, nodes }, null, 2));
    return 0;
  }
  printFindings(all, poseText ? [script, poseText] : [script]);
  const width = Math.max(...nodes.map(({ name }) => name.length));
  for (const { name, kind, world } of nodes) {
    const position = world.slice(12, 15).map(lengthWords).join('');
    console.log(`${name.padEnd(width)}  ${kind.padEnd(7)}${position}`);
  }
  return 0;
}
