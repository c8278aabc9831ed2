import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { compile, type Finding } from '@/compiler';
import { countFindings, FindingsPane } from '@/components/editor/FindingsPane';

afterEach(cleanup);

const NAME = 'hare.recipe.yaml';
const findingsOf = (text: string): readonly Finding[] => compile({ recipe: { name: NAME, text } }).findings;
const WRONG =
  'format: 1\nrecipe: hare\nchain: {}\nlandmarks:\n  a: { at: "=landmarks.b" }\n  b: { at: "=landmarks.a" }\n';

function show(findings: readonly Finding[], isReadOnly = false) {
  const onGoTo = vi.fn();
  const onFix = vi.fn();
  render(
    <FindingsPane findings={findings} isReadOnly={isReadOnly} source={NAME} onGoTo={onGoTo} onFix={onFix} />,
  );
  return { onGoTo, onFix, user: userEvent.setup() };
}
const entries = () => within(screen.getByRole('list', { name: 'Findings' })).getAllByRole('listitem');

describe('findings', () => {
  it('say that nothing is wrong', () => {
    show([]);
    expect(screen.getByText(/^Nothing is wrong\./)).toBeDefined();
    expect(screen.queryByRole('list')).toBeNull();
  });

  it('show severity, place, code, message and help', () => {
    const findings = findingsOf(WRONG);
    show(findings);
    const [first] = entries();
    const words = first?.textContent ?? '';
    for (const part of [
      'Error',
      'line 3, column 1',
      'unknown-key',
      'There is no key "chain" here.',
      'Did you mean "chains"?',
    ])
      expect(words).toContain(part);
  });

  it('lead to their place and to related ones', async () => {
    const findings = findingsOf(WRONG);
    const { onGoTo, user } = show(findings);
    await user.click(screen.getByRole('button', { name: 'line 3, column 1' }));
    expect(onGoTo).toHaveBeenLastCalledWith(findings[0]?.span);
    await user.click(screen.getByRole('button', { name: /"b" is worked out here: line 6/ }));
    expect(onGoTo).toHaveBeenLastCalledWith(findings[1]?.related[0]?.span);
  });

  it('offer a repair, but not to somebody who may only read', async () => {
    const findings = findingsOf(WRONG);
    const { onFix, user } = show(findings);
    await user.click(screen.getByRole('button', { name: 'Rename to "chains"' }));
    expect(onFix).toHaveBeenCalledExactlyOnceWith(findings[0]?.fix);
    cleanup();
    show(findings, true);
    expect(screen.queryByRole('button', { name: 'Rename to "chains"' })).toBeNull();
    expect(screen.getByRole('button', { name: 'line 3, column 1' })).toBeDefined();
  });

  it('name a place in another document without leading there', () => {
    const [finding] = findingsOf(WRONG) as [Finding];
    show([{ ...finding, span: { ...finding.span, source: 'walker@4' } }]);
    expect(screen.getByText('walker@4, line 3, column 1')).toBeDefined();
    expect(screen.queryByRole('button', { name: /line 3/ })).toBeNull();
  });

  it('show what was typed as text', () => {
    show(findingsOf('format: 1\nrecipe: hare\n"<img src=x onerror=alert(1)>": 1\n'));
    expect(screen.getByText(/There is no key "<img src=x onerror=alert\(1\)>" here\./)).toBeDefined();
    expect(document.querySelector('img')).toBeNull();
  });

  it('are counted in words', () => {
    const [finding] = findingsOf(WRONG) as [Finding];
    const warning: Finding = { ...finding, severity: 'warning' };
    expect(countFindings([])).toBe('no findings');
    expect(countFindings([finding])).toBe('1 error, 0 warnings');
    expect(countFindings([finding, finding, warning])).toBe('2 errors, 1 warning');
  });
});
