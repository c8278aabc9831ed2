import type { Finding } from '@/compiler/findings/Finding';
import { sha256Hex } from '@/compiler/hash/sha256Hex';
import { runScript } from '@/compiler/slipway/runScript';

/** First line, a scene, the given lines and a last line that is true of them. */
export function seal(lines: readonly string[]): string {
  const body = `slipway 1\n${lines.map((line) => `${line}\n`).join('')}`;
  return `${body}end steps=${lines.length + 1} sha256="${sha256Hex(body)}"\n`;
}

export const SCENE =
  'scene "test" recipe="test@1" house="test@1" up=+y forward=+z unit=cm recipe_hash="0" house_hash="0" compiler="0"';

const PLACE = 'id="x" parent=none container="c" role="r" side=left at=(0 0 0) turn=(0 0 0 1)';

/** Lines that make nodes, for scripts written out in tests. */
export const make = {
  group: (name: string, parent = 'none'): string => `group "${name}" ${below(parent)}`,
  joint: (name: string, parent = 'none'): string => `joint "${name}" ${below(parent)} order=xyz`,
  control: (name: string, parent = 'none'): string =>
    `control "${name}" ${below(parent)} order=xyz shape=ring size=1`,
  note: (name: string): string => `note "${name}" ${PLACE}`,
};

function below(parent: string): string {
  return parent === 'none' ? PLACE : PLACE.replace('parent=none', `parent="${parent}"`);
}

/** What is found in a sealed script of these lines. */
export function findingsOf(...lines: readonly string[]): readonly Finding[] {
  return runScript({ name: 'test.slip', text: seal(lines) }).findings;
}

/** Codes of what is found, each with the text it is about. */
export function marksOf(...lines: readonly string[]): readonly (readonly [string, string])[] {
  const text = seal(lines);
  const { findings } = runScript({ name: 'test.slip', text });
  return findings.map(({ code, span }) => [code, text.slice(span.start, span.end)]);
}
