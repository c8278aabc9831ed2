import { type Compilation, compile, createPoser, runScript } from '@/compiler';
import type { BuiltRig, CompileAnswer, CompileQuestion } from './messages';

/** The end of a stretch of text without the blank lines after it, which YAML counts to the entry before them. */
function endOfWords(text: string, end: number): number {
  return text.slice(0, end).trimEnd().length;
}

function build(compilation: Compilation, name: string, text: string): BuiltRig | null {
  if (compilation.script === null) return null;
  // The page draws what the script built, not what the compiler believes: what adapters get is what people see.
  const { rig } = runScript({ name: `${compilation.character}.slip`, text: compilation.script });
  if (!rig) return null;
  const poser = createPoser(rig);
  poser.evaluate();
  const places = rig.nodes.map(({ id }) => {
    const place = compilation.placeOf(id);
    const isOwn = place?.key.source === name;
    return {
      id,
      start: isOwn ? place.key.start : null,
      end: isOwn ? endOfWords(text, place.value.end) : null,
    };
  });
  return { rig, world: poser.world, places, script: compilation.script };
}

/** Compiles a text, runs its script and poses the rig at rest. */
export function answerQuestion(question: CompileQuestion, now: () => number): CompileAnswer {
  const started = now();
  const { text, name, bases, sequence } = question;
  const compilation = compile({ recipe: { name, text }, bases });
  const built = build(compilation, name, text);
  return { sequence, findings: compilation.findings, built, took: now() - started };
}
