import { describe, expect, it } from 'vitest';
import { FindingList } from '@/compiler/findings/FindingList';
import { readPose } from '@/compiler/pose/readPose';
import type { PoseValues } from '@/compiler/rig/Rig';
import { parseDocument } from '@/compiler/syntax/parseDocument';
import { control, joint, rigOf } from './rigParts';

const rig = rigOf([
  control('hand', {
    channels: {
      tx: { locked: false, min: -1, max: null },
      sy: { locked: true, min: null, max: null },
    },
    attributes: [{ name: 'reach', default: 1, min: 0, max: 1, labels: null, note: null }],
  }),
  joint('wrist'),
]);

function read(text: string): {
  pose: PoseValues;
  marks: readonly (readonly [string, string])[];
  helps: readonly string[];
} {
  const findings = new FindingList();
  const pose = readPose(parseDocument({ name: 'pose.json', text }, findings), rig, findings);
  const marks = findings.all.map(({ code, span }) => [code, text.slice(span.start, span.end)] as const);
  return { pose, marks, helps: findings.all.map(({ help }) => help) };
}

describe('readPose', () => {
  it('reads channels and attributes of controls', () => {
    const { pose, marks } = read('{"hand": {"tx": 2.5, "rz": -30, "reach": 0.5}}');
    expect(marks).toEqual([]);
    expect(pose).toEqual({ hand: { tx: 2.5, rz: -30, reach: 0.5 } });
  });

  it('finds unknown controls and channels at their keys, with the nearest that exist', () => {
    const { pose, marks, helps } = read('{"hnad": {"tx": 1}, "hand": {"tq": 1, "reech": 1}, "wrist": {}}');
    expect(marks).toEqual([
      ['pose-control-unknown', '"hnad"'],
      ['pose-channel-unknown', '"tq"'],
      ['pose-channel-unknown', '"reech"'],
      ['pose-control-unknown', '"wrist"'],
    ]);
    expect(helps[2]).toBe('Did you mean "reach"?');
    expect(pose).toEqual({ hand: {} });
  });

  it('finds what is no number and what is no map', () => {
    expect(read('{"hand": {"tx": "2", "ty": null, "tz": 1e999}}').marks.map(([code]) => code)).toContain(
      'pose-value-wrong',
    );
    expect(read('{"hand": 3}').marks).toEqual([['pose-not-a-map', '3']]);
    expect(read('[1]').marks).toEqual([['pose-not-a-map', '[1]']]);
  });

  it('warns of locked channels and of values outside their limits, on either side', () => {
    expect(read('{"hand": {"sy": 2, "tx": -4, "reach": 1.5}}').marks).toEqual([
      ['pose-channel-locked', '"sy"'],
      ['pose-value-clamped', '-4'],
      ['pose-value-clamped', '1.5'],
    ]);
  });

  it('takes no name for what every object has', () => {
    expect(read('{"toString": {"tx": 1}, "hand": {"valueOf": 1}}').marks).toEqual([
      ['pose-control-unknown', '"toString"'],
      ['pose-channel-unknown', '"valueOf"'],
    ]);
  });
});
