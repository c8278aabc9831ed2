import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ScriptPane } from '@/components/editor/ScriptPane';
import { builtSample } from './sample';

afterEach(cleanup);
/** The document of these tests has no layout and so no scrolling; what was brought into sight is written down. */
const seen = vi.fn();
beforeEach(() => {
  seen.mockReset();
  Element.prototype.scrollIntoView = function scrollIntoView() {
    seen(this.textContent);
  };
});

const { script } = builtSample('eel');
const scriptLines = script.trimEnd().split('\n');
const shownLines = () =>
  within(screen.getByRole('region', { name: 'Build script' })).getAllByRole('listitem');

describe('the build script', () => {
  it('is shown line by line, numbered from one', () => {
    render(<ScriptPane script={script} chosen={[]} onChoose={() => {}} />);
    expect(shownLines().map(({ textContent }) => textContent)).toEqual(
      scriptLines.map((text, index) => `${index + 1}${text}`),
    );
    expect(seen).not.toHaveBeenCalled();
  });

  it('marks every line that makes a chosen thing, and brings the first into sight', () => {
    const id = 'body.03';
    const makers = scriptLines.filter((text) => text.includes(` id="${id}"`));
    expect(makers.length).toBeGreaterThan(0);
    render(<ScriptPane script={script} chosen={[id]} onChoose={() => {}} />);
    const marked = shownLines().filter((line) => line.getAttribute('aria-current') === 'true');
    expect(marked.map(({ textContent }) => textContent?.replace(/^\d+/, ''))).toEqual(makers);
    expect(seen).toHaveBeenCalledExactlyOnceWith(marked[0]?.textContent);
  });

  it('chooses what a line makes', async () => {
    const onChoose = vi.fn();
    render(<ScriptPane script={script} chosen={[]} onChoose={onChoose} />);
    const line = scriptLines.find((text) => text.includes(' id="body.02"')) ?? 'none';
    await userEvent.click(screen.getByText(line));
    expect(onChoose).toHaveBeenCalledExactlyOnceWith('body.02');
  });
});
