import { samples } from '@/compiler';
import { answerQuestion } from '@/components/worker/answerQuestion';
import type { BuiltRig } from '@/components/worker/messages';

/** A sample as the page gets it: compiled, its script run, posed at rest. */
export function builtSample(id: string): BuiltRig {
  const text = samples.find((sample) => sample.id === id)?.text ?? '';
  return builtText(text);
}

/** A recipe as the page gets it. */
export function builtText(text: string): BuiltRig {
  const question = { sequence: 1, text, name: 'a.recipe.yaml', bases: {} };
  const { built, findings } = answerQuestion(question, () => 0);
  if (!built) throw new Error(findings.map(({ message }) => message).join('\n'));
  return built;
}
