import type { Mat4 } from '@/compiler/math/mat4';

/** What the tests read of a stage that holds one skeleton. */
export interface UsdStage {
  readonly upAxis: string;
  readonly metersPerUnit: number;
  readonly joints: readonly string[];
  readonly bindTransforms: readonly Mat4[];
  readonly restTransforms: readonly Mat4[];
}

function listAfter(text: string, name: string): string {
  const start = text.indexOf(`${name} = [`);
  if (start < 0) throw new Error(`no ${name}`);
  return text.slice(start + name.length + 3, text.indexOf(']\n', start) + 1);
}

/** Rows of a USD matrix in order are the columns of ours. */
function matrices(list: string): readonly Mat4[] {
  const numbers = list.match(/-?[0-9.]+(?:e[+-]?[0-9]+)?/gi)?.map(Number) ?? [];
  return Array.from(
    { length: numbers.length / 16 },
    (_, index) => numbers.slice(index * 16, index * 16 + 16) as unknown as Mat4,
  );
}

/** Reads the little of OpenUSD text that a delivered skeleton consists of. */
export function readUsda(text: string): UsdStage {
  if (!text.startsWith('#usda 1.0\n')) throw new Error('no OpenUSD text');
  return {
    upAxis: /upAxis = "([YZ])"/.exec(text)?.[1] ?? '',
    metersPerUnit: Number(/metersPerUnit = ([0-9.e-]+)/.exec(text)?.[1]),
    joints: JSON.parse(listAfter(text, 'uniform token[] joints')) as string[],
    bindTransforms: matrices(listAfter(text, 'uniform matrix4d[] bindTransforms')),
    restTransforms: matrices(listAfter(text, 'uniform matrix4d[] restTransforms')),
  };
}
