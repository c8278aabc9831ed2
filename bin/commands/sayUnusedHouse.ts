import type { Rig, SourceText } from '../../compiler/index';
import { printable } from './printable';

/** Tells people, beside the output, which recipes follow other house rules than those given with `--house`. */
export function sayUnusedHouse(
  path: string | undefined,
  houses: Readonly<Record<string, SourceText>>,
  results: readonly { readonly file: string; readonly rig: Rig | null }[],
): void {
  if (path === undefined) return;
  for (const { file, rig } of results) {
    if (!rig || Object.hasOwn(houses, rig.scene.house)) continue;
    console.error(`${printable(file)} follows ${rig.scene.house}; ${printable(path)} was not used for it.`);
  }
}
