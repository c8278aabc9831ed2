import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { samples, type TrialName } from '@/compiler';
import { countTrials, measureWords, TrialsPane } from '@/components/editor/TrialsPane';
import { answerQuestion } from '@/components/worker/answerQuestion';

afterEach(cleanup);

const hare = samples.find(({ id }) => id === 'hare')?.text ?? '';
const answerOf = (text: string) =>
  answerQuestion({ sequence: 1, text, name: 'a.recipe.yaml', bases: {} }, () => 0);

/** A control that turns a joint farther than the joint is meant to turn. */
const TOO_FAR = `format: 1
recipe: too_far
parts:
  root: { kind: root }
landmarks:
  a: { at: [0, 10, 0] }
  b: { at: [0, 20, 1] }
  c: { at: [0, 30, 0] }
chains:
  neck: { points: [a, b, c], limits: { a: { rz: { min: -30, max: 30 } } } }
controls:
  one: { at: a, align: neck.a, channels: { rz: { min: -60, max: 60 } } }
constraints:
  turn: { kind: orient, target: neck.a, sources: { one: 1 } }
`;

function show(text: string, posed: TrialName | null = null) {
  const onPose = vi.fn();
  const onChoose = vi.fn();
  const { trials } = answerOf(text);
  render(<TrialsPane trials={trials} posed={posed} onPose={onPose} onChoose={onChoose} />);
  return { onPose, onChoose, trials, user: userEvent.setup() };
}
const row = (words: string) => screen.getByRole('row', { name: new RegExp(words) });

describe('trials', () => {
  it('say when they run, while the text has other errors', () => {
    show('format: 1\nrecipe: hare\ntitel: x\n');
    expect(screen.getByText(/^The trials run as soon as/)).toBeDefined();
    expect(screen.queryByRole('table')).toBeNull();
  });

  it('are a row each, with what was measured, what is allowed and how much was checked', () => {
    const { trials } = show(hare);
    expect(screen.getAllByRole('row')).toHaveLength(trials.length + 1);
    const words = row('At rest nothing moves').textContent ?? '';
    const rest = trials.find(({ trial }) => trial === 'rest');
    const allowed = measureWords(rest?.tolerance ?? 0, 'cm');
    for (const part of ['passed', allowed, String(rest?.checked)]) expect(words).toContain(part);
    expect(screen.queryByRole('button')).toBeNull();
  });

  it('lead to what failed, and offer to show it in the picture', async () => {
    const { onPose, onChoose, user } = show(TOO_FAR);
    const failed = within(row('Limits hold'));
    expect(failed.getByText('failed')).toBeDefined();
    await user.click(failed.getByRole('button', { name: 'neck.a' }));
    expect(onChoose).toHaveBeenCalledExactlyOnceWith('neck.a');
    await user.click(failed.getByRole('button', { name: 'Show in the picture' }));
    expect(onPose).toHaveBeenCalledExactlyOnceWith('limits');
  });

  it('offer the way back while their pose is shown', async () => {
    const { onPose, user } = show(TOO_FAR, 'limits');
    const button = screen.getByRole('button', { name: 'Back to rest' });
    expect(button.getAttribute('aria-pressed')).toBe('true');
    await user.click(button);
    expect(onPose).toHaveBeenCalledExactlyOnceWith(null);
  });

  it('come with the rig as the failure shows it, though it will not be built', () => {
    const { built, trials, findings } = answerOf(TOO_FAR);
    const errors = findings.filter(({ severity }) => severity === 'error');
    expect(errors.map(({ code }) => code)).toEqual(['trial-limits']);
    const failed = trials.find(({ passed }) => !passed);
    const neck = built?.rig.nodes.findIndex(({ id }) => id === 'neck.b') ?? -1;
    const moved = [12, 13, 14].map((entry) => {
      const index = neck * 16 + entry;
      return (failed?.world?.[index] ?? Number.NaN) - (built?.world[index] ?? Number.NaN);
    });
    // Ten long and turned by 60 degrees: its end moves by about its own length.
    expect(Math.hypot(...moved)).toBeCloseTo(Math.hypot(10, 1), 6);
  });
});

describe('words about trials', () => {
  it('write tiny numbers as powers of ten, counts bare and what is no number in words', () => {
    expect(measureWords(1.2239e-7, 'cm')).toBe('1.2e−7 cm');
    expect(measureWords(7.30333, 'cm')).toBe('7.3 cm');
    expect(measureWords(0, 'm')).toBe('0 m');
    expect(measureWords(3, 'things')).toBe('3');
    expect(measureWords(Number.MAX_VALUE, 'cm')).toBe('no number');
  });

  it('count in the tab', () => {
    expect(countTrials([])).toBe('Trials');
    expect(countTrials(answerOf(hare).trials)).toBe('Trials (12 passed)');
    expect(countTrials(answerOf(TOO_FAR).trials)).toBe('Trials (1 failed)');
  });
});
