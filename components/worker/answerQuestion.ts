import { type Compilation, compile, createPoser, runScript } from '@/compiler';
import type { BuiltRig, CompileAnswer, CompileQuestion, TrialShown } from './messages';

/** The end of a stretch of text without the blank lines after it, which YAML counts to the entry before them. */
function endOfWords(text: string, end: number): number {
  return text.slice(0, end).trimEnd().length;
}

function build(compilation: Compilation, name: string, text: string): BuiltRig | null {
  const script = compilation.script ?? compilation.failing?.script;
  if (script === undefined) return null;
  // The page draws what the script built, not what the compiler believes: what adapters get is what people see.
  const { rig } = runScript({ name: `${compilation.character}.slip`, text: script });
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
  return { rig, world: poser.world, places, script };
}

/** Poses the rig as each failed trial found it, so that the page can show what is wrong. */
function showTrials({ trials }: Compilation, built: BuiltRig | null): readonly TrialShown[] {
  if (!built || trials.every(({ passed }) => passed))
    return trials.map((trial) => ({ ...trial, world: null }));
  const poser = createPoser(built.rig);
  return trials.map((trial) => {
    if (trial.passed) return { ...trial, world: null };
    poser.evaluate(trial.pose);
    return { ...trial, world: poser.world.slice() };
  });
}

/** Compiles a text, runs its script and poses the rig at rest, and as failed trials found it. */
export function answerQuestion(question: CompileQuestion, now: () => number): CompileAnswer {
  const started = now();
  const { text, name, bases, sequence } = question;
  const compilation = compile({ recipe: { name, text }, bases });
  const built = build(compilation, name, text);
  const trials = showTrials(compilation, built);
  return { sequence, findings: compilation.findings, built, trials, took: now() - started };
}
