import type { Compilation } from '../compile';
import { canonicalJson } from '../hash/canonicalJson';
import { sha256Hex } from '../hash/sha256Hex';
import { COMPILER_VERSION } from '../version';
import { findingsToSarif } from './findingsToSarif';

/** One file of a build. */
export interface BuildFile {
  readonly name: string;
  readonly mediaType: string;
  readonly text: string;
  /** Of the text in UTF-8, in hexadecimal. */
  readonly sha256: string;
}

function toFile(name: string, mediaType: string, text: string): BuildFile {
  return { name, mediaType, text, sha256: sha256Hex(text) };
}

/** Every file but the manifest, which lists them. */
function contentFiles({ character, findings, rig, script }: Compilation): readonly BuildFile[] {
  const sarif = toFile(
    `${character}.findings.sarif`,
    'application/sarif+json',
    `${JSON.stringify(findingsToSarif(findings), null, 2)}\n`,
  );
  if (!rig || script === null) return [sarif];
  return [
    toFile(`${character}.slip`, 'text/plain; charset=utf-8', script),
    toFile(`${character}.rig.json`, 'application/json', `${canonicalJson(rig)}\n`),
    sarif,
  ];
}

/**
 * The files of a build, the manifest last. A recipe with errors gives its findings alone: no script, no rig, and
 * no manifest that could be taken for a build.
 */
export function buildFiles(compilation: Compilation): readonly BuildFile[] {
  const files = contentFiles(compilation);
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
    files: files.map(({ name, mediaType, text, sha256 }) => ({
      name,
      mediaType,
      bytes: utf8Length(text),
      sha256,
    })),
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
