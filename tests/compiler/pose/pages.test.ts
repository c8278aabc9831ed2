import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { FindingList } from '@/compiler/findings/FindingList';
import { poseFindings } from '@/compiler/pose/findings';
import { readPose } from '@/compiler/pose/readPose';
import { parseDocument } from '@/compiler/syntax/parseDocument';
import { control, rigOf } from './rigParts';

const folder = new URL('../../../compiler/pose/pages/', import.meta.url);

/** The rig that the pages' poses are for. */
const rig = rigOf([
  control('demo_hand', {
    channels: {
      sx: { locked: true, min: null, max: null },
      ry: { locked: false, min: -90, max: 90 },
    },
  }),
]);

function codesUnder(page: string, heading: string): readonly string[] {
  const section = page.split(`\n## ${heading}\n`)[1]?.split('\n## ')[0] ?? '';
  const text = /```json\n([\s\S]*?)\n```/.exec(section)?.[1] ?? '';
  const findings = new FindingList();
  const pose = readPose(parseDocument({ name: 'pose.json', text }, findings), rig, findings);
  expect(pose).toBeTypeOf('object');
  return findings.all.map(({ code }) => code);
}

describe('pages of pose findings', () => {
  const codes = readdirSync(folder).map((name) => name.replace('.page.md', ''));

  it('are there for every code and no other', () => {
    expect(codes.sort()).toEqual(Object.keys(poseFindings).sort());
  });

  it.each(codes)('%s: Wrong gives exactly this code, Right none', (code) => {
    const page = readFileSync(new URL(`${code}.page.md`, folder), 'utf8');
    expect(codesUnder(page, 'Wrong')).toEqual([code]);
    expect(codesUnder(page, 'Right')).toEqual([]);
  });
});
