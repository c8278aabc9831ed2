import { chartCsv } from '../chart/chartCsv';
import { chartHtml } from '../chart/chartHtml';
import { controlChart } from '../chart/controlChart';
import type { Compilation } from '../compile';
import type { DeliveryProfile } from '../deliver/DeliveryProfile';
import { toGlb } from '../deliver/toGlb';
import { toUsda } from '../deliver/toUsda';
import { canonicalJson } from '../hash/canonicalJson';
import { sha256Hex, sha256HexOf } from '../hash/sha256Hex';
import type { Rig } from '../rig/Rig';
import { COMPILER_VERSION } from '../version';
import { findingsToSarif } from './findingsToSarif';
import { toBase64 } from './toBase64';

/** One file of a build. */
export interface BuildFile {
  readonly name: string;
  readonly mediaType: string;
  /** What the file holds: its text, or its bytes in base64. */
  readonly text: string;
  readonly encoding: 'utf8' | 'base64';
  /** Of the file's bytes, in hexadecimal. */
  readonly sha256: string;
  readonly bytes: number;
}

function toFile(name: string, mediaType: string, text: string): BuildFile {
  return { name, mediaType, text, encoding: 'utf8', sha256: sha256Hex(text), bytes: utf8Length(text) };
}

/** Turns bytes into base64 without anything of Node or the browser: as text of 8-bit characters. */
function toBinaryFile(name: string, mediaType: string, content: Uint8Array): BuildFile {
  const text = toBase64(content);
  return { name, mediaType, text, encoding: 'base64', sha256: sha256HexOf(content), bytes: content.length };
}

/** The files of every delivery profile: glTF and OpenUSD. */
async function deliveryFiles(
  rig: Rig,
  deliveries: readonly DeliveryProfile[],
): Promise<readonly BuildFile[]> {
  const files: BuildFile[] = [];
  for (const profile of deliveries) {
    const name = `${rig.scene.character}.${profile.id}`;
    if (profile.formats.includes('gltf')) {
      files.push(toBinaryFile(`${name}.glb`, 'model/gltf-binary', await toGlb(rig, profile)));
    }
    if (profile.formats.includes('usd')) {
      files.push(toFile(`${name}.usda`, 'model/vnd.usda', toUsda(rig, profile)));
    }
  }
  return files;
}

/** Every file but the manifest, which lists them. */
async function contentFiles({
  character,
  findings,
  rig,
  script,
  deliveries,
}: Compilation): Promise<readonly BuildFile[]> {
  const sarif = toFile(
    `${character}.findings.sarif`,
    'application/sarif+json',
    `${JSON.stringify(findingsToSarif(findings), null, 2)}\n`,
  );
  if (!rig || script === null) return [sarif];
  return [
    toFile(`${character}.slip`, 'text/plain; charset=utf-8', script),
    toFile(`${character}.rig.json`, 'application/json', `${canonicalJson(rig)}\n`),
    ...(await deliveryFiles(rig, deliveries)),
    toFile(`${character}.chart.html`, 'text/html; charset=utf-8', chartHtml(rig)),
    toFile(`${character}.chart.csv`, 'text/csv; charset=utf-8', chartCsv(controlChart(rig))),
    sarif,
  ];
}

/**
 * The files of a build, the manifest last. A recipe with errors gives its findings alone: no script, no rig, and
 * no manifest that could be taken for a build.
 */
export async function buildFiles(compilation: Compilation): Promise<readonly BuildFile[]> {
  const files = await contentFiles(compilation);
  const { rig, character } = compilation;
  if (!rig) return files;
  const manifest = {
    format: 1,
    character,
    recipe: rig.scene.recipe,
    house: rig.scene.house,
    compiler: COMPILER_VERSION,
    recipeHash: rig.scene.recipeHash,
    houseHash: rig.scene.houseHash,
    counts: {
      joints: rig.nodes.filter(({ kind }) => kind === 'joint').length,
      controls: rig.nodes.filter(({ kind }) => kind === 'control').length,
      guideLines: rig.nodes.filter(({ kind }) => kind === 'line').length,
      solvers: rig.solvers.length,
      constraints: rig.constraints.length,
    },
    findings: {
      warnings: compilation.findings.filter(({ severity }) => severity === 'warning').length,
      infos: compilation.findings.filter(({ severity }) => severity === 'info').length,
    },
    trials: compilation.trials.map(({ trial, passed, measured, tolerance, unit, checked }) => ({
      trial,
      passed,
      // More digits of what rounding leaves would say nothing.
      measured: Number(measured.toPrecision(3)),
      tolerance: Number(tolerance.toPrecision(3)),
      unit,
      checked,
    })),
    files: files.map(({ name, mediaType, bytes, sha256 }) => ({ name, mediaType, bytes, sha256 })),
  };
  return [
    ...files,
    toFile(`${character}.manifest.json`, 'application/json', `${JSON.stringify(manifest, null, 2)}\n`),
  ];
}

/** Bytes a text takes in UTF-8. */
export function utf8Length(text: string): number {
  return new TextEncoder().encode(text).length;
}
