import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { lengthWords, ThingsPane } from '@/components/editor/ThingsPane';
import { builtSample } from './sample';

afterEach(cleanup);
/** The document of these tests has no layout and so no scrolling; what was brought into sight is written down. */
const seen = vi.fn();
beforeEach(() => {
  seen.mockReset();
  Element.prototype.scrollIntoView = function scrollIntoView() {
    seen(this.getAttribute('data-node'));
  };
});

const built = builtSample('hare');

function show(chosen: readonly string[] = []) {
  const onChoose = vi.fn();
  render(<ThingsPane built={built} chosen={chosen} onChoose={onChoose} />);
  return { onChoose, user: userEvent.setup() };
}
const bodyRows = () => screen.getAllByRole('row').slice(1);
const idOf = (row: HTMLElement): string => within(row).getByRole('button').textContent ?? '';

describe('things in the rig', () => {
  it('are all there, in the order of the scene, with role, side and place', () => {
    show();
    expect(bodyRows().map(idOf)).toEqual(built.rig.nodes.map(({ id }) => id));
    expect(screen.getAllByRole('columnheader').map(({ textContent }) => textContent)).toEqual([
      'Thing',
      'Role',
      'Side',
      'x',
      'y',
      'z',
    ]);
    const index = built.rig.nodes.findIndex(({ id }) => id === 'arm.left.wrist');
    const cells = within(bodyRows()[index] as HTMLElement).getAllByRole('cell');
    const place = [12, 13, 14].map((at) => lengthWords(built.world[index * 16 + at] ?? Number.NaN));
    expect(cells.map(({ textContent }) => textContent)).toEqual(['skin (hidden)', 'left', ...place]);
  });

  it('are found by id or by name, and told of when nothing matches', async () => {
    const { user } = show();
    const field = screen.getByRole('textbox', { name: 'Search' });
    await user.type(field, 'WRIST');
    const named = built.rig.nodes.filter(
      ({ id, name }) => id.includes('wrist') || name.toLowerCase().includes('wrist'),
    );
    expect(bodyRows().map(idOf)).toEqual(named.map(({ id }) => id));
    await user.type(field, 'zzz');
    expect(screen.getByText(/^Nothing matches\./)).toBeDefined();
    await user.clear(field);
    expect(bodyRows()).toHaveLength(built.rig.nodes.length);
  });

  it('are chosen by role', async () => {
    const { user } = show();
    await user.selectOptions(screen.getByRole('combobox', { name: 'Role' }), 'control');
    const controls = built.rig.nodes.filter(({ role }) => role === 'control');
    expect(bodyRows().map(idOf)).toEqual(controls.map(({ id }) => id));
  });

  it('can be chosen and let go', async () => {
    const { onChoose, user } = show(['arm.left.wrist']);
    const chosen = screen.getByRole('button', { name: 'arm.left.wrist' });
    expect(chosen.getAttribute('aria-pressed')).toBe('true');
    await user.click(chosen);
    expect(onChoose).toHaveBeenLastCalledWith(null);
    await user.click(screen.getByRole('button', { name: 'arm.left.elbow' }));
    expect(onChoose).toHaveBeenLastCalledWith('arm.left.elbow');
    expect(screen.getAllByRole('button', { pressed: true })).toEqual([chosen]);
  });

  it('are brought into sight when they are chosen elsewhere, and are one stop of the Tab key', async () => {
    const { user } = show(['arm.left.wrist']);
    expect(seen).toHaveBeenCalledExactlyOnceWith('arm.left.wrist');
    await user.click(screen.getByRole('combobox', { name: 'Role' }));
    await user.tab();
    expect(document.activeElement).toBe(screen.getByRole('button', { name: 'arm.left.wrist' }));
    await user.tab();
    expect(document.activeElement).toBe(document.body);
  });

  it('can be walked through by arrow keys', async () => {
    const { user } = show();
    const buttons = screen.getAllByRole('button');
    buttons[3]?.focus();
    await user.keyboard('{ArrowDown}');
    expect(document.activeElement).toBe(buttons[4]);
    await user.keyboard('{ArrowUp}{ArrowUp}');
    expect(document.activeElement).toBe(buttons[2]);
    buttons[0]?.focus();
    await user.keyboard('{ArrowUp}');
    expect(document.activeElement).toBe(buttons[0]);
  });
});
