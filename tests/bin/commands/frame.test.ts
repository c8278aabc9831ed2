import { expect, it } from 'vitest';
import { frame } from '@/bin/commands/frame';
import type { Finding } from '@/compiler';

function findingAt(startColumn: number, endColumn: number): Finding {
  const span = { source: 's', start: 0, end: 0, startLine: 1, startColumn, endLine: 1, endColumn };
  return { code: 'c', severity: 'error', message: '', help: '', related: [], span };
}

it('points at the very characters', () => {
  expect(frame(findingAt(7, 10), 'kind: roo')).toBe('    1 | kind: roo\n      |       ^^^');
});

it('keeps tabs before the place, so that a terminal lines both lines up', () => {
  expect(frame(findingAt(3, 4), 'a\tb')).toBe('    1 | a\tb\n      |  \t^');
});

it('shows only what is around the place in a line as long as a file', () => {
  const line = `${'a'.repeat(5_000)}X${'b'.repeat(5_000)}`;
  const [shown = '', carets = ''] = frame(findingAt(5_001, 5_002), line).split('\n');
  expect(shown.length).toBeLessThan(180);
  expect(shown[carets.indexOf('^')]).toBe('X');
  expect(carets.trimEnd().endsWith(' ^')).toBe(true);
});

it('ends the carets with what is shown', () => {
  const [shown = '', carets = ''] = frame(findingAt(1, 900), 'a'.repeat(1_000)).split('\n');
  expect(carets.length).toBe(shown.length - 1);
});

it('shows what steers a terminal as a stand-in of the same length', () => {
  expect(frame(findingAt(3, 4), 'a\u001bb')).toBe('    1 | a\ufffdb\n      |   ^');
});
