import { closestNames } from '../findings/closestNames';
import type { FindingList } from '../findings/FindingList';
import type { ChannelRule, ControlNode, PoseValues, Rig, RigAttribute } from '../rig/Rig';
import type { JsonValue, Path, SourceDocument } from '../syntax/types';
import { CHANNELS, clampValue } from './channelValues';
import { poseFindings } from './findings';

type JsonMap = Readonly<Record<string, JsonValue>>;

function isMap(value: JsonValue | undefined): value is { [key: string]: JsonValue } {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function suggest(name: string, candidates: readonly string[]): { readonly help?: string } {
  const close = closestNames(name, candidates);
  return close.length === 0 ? {} : { help: `Did you mean ${close.map((one) => `"${one}"`).join(' or ')}?` };
}

/** The rule of a channel or attribute; undefined when the control has no such thing. */
function findRule(control: ControlNode, key: string): ChannelRule | undefined {
  const channel = CHANNELS.find((name) => name === key);
  if (channel !== undefined) return control.channels[channel] ?? { locked: false, min: null, max: null };
  const attribute: RigAttribute | undefined = control.attributes.find(({ name }) => name === key);
  return attribute && { locked: false, min: attribute.min, max: attribute.max };
}

/** Reads the values of one control, and reports each that it cannot take or will not take as written. */
function readControl(
  control: ControlNode,
  values: JsonMap,
  document: SourceDocument,
  findings: FindingList,
): Record<string, number> {
  const read: [string, number][] = [];
  for (const [key, value] of Object.entries(values)) {
    const path: Path = [control.name, key];
    const named = { control: control.name, channel: key };
    const rule = findRule(control, key);
    if (rule === undefined) {
      const known = [...CHANNELS, ...control.attributes.map(({ name }) => name)];
      const parameters = { ...named, channels: known.join(', ') };
      findings.report(
        poseFindings,
        'pose-channel-unknown',
        document.spanAt(path, 'key'),
        parameters,
        suggest(key, known),
      );
    } else if (typeof value !== 'number' || !Number.isFinite(value)) {
      findings.report(poseFindings, 'pose-value-wrong', document.spanAt(path), named);
    } else {
      const limit = clampValue(value, rule.min, rule.max);
      if (rule.locked)
        findings.report(poseFindings, 'pose-channel-locked', document.spanAt(path, 'key'), named);
      else if (limit !== value) {
        findings.report(poseFindings, 'pose-value-clamped', document.spanAt(path), {
          ...named,
          value,
          limit,
        });
      }
      read.push([key, value]);
    }
  }
  return Object.fromEntries(read);
}

/**
 * Reads control values from a parsed document of the form `{control: {channel or attribute: number}}`, controls by
 * their names in the scene. Whatever does not fit the rig is a finding at its own place and is left out.
 */
export function readPose(document: SourceDocument, rig: Rig, findings: FindingList): PoseValues {
  const { value } = document;
  if (!isMap(value)) {
    const parameters = { what: 'The pose', content: 'values' };
    if (value !== undefined) findings.report(poseFindings, 'pose-not-a-map', document.spanAt([]), parameters);
    return {};
  }
  const controls = new Map(
    rig.nodes.flatMap((node) => (node.kind === 'control' ? [[node.name, node] as const] : [])),
  );
  const pose: [string, Record<string, number>][] = [];
  for (const [name, values] of Object.entries(value)) {
    const control = controls.get(name);
    if (control === undefined) {
      const more = suggest(name, [...controls.keys()]);
      findings.report(
        poseFindings,
        'pose-control-unknown',
        document.spanAt([name], 'key'),
        { control: name },
        more,
      );
    } else if (!isMap(values)) {
      const parameters = { what: `The value of "${name}"`, content: 'numbers' };
      findings.report(poseFindings, 'pose-not-a-map', document.spanAt([name]), parameters);
    } else pose.push([name, readControl(control, values, document, findings)]);
  }
  return Object.fromEntries(pose);
}
