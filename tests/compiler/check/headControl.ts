/** A head joint and the control that turns it; `lines` go into the control's entry, four spaces deep. */
export const headControl = (...lines: readonly string[]): string => `chains:
  head: { points: [[0, 50, 0], [0, 60, 0]], names: [base, top] }
controls:
  head:
    at: head.base
    parent: root
${lines.map((line) => `    ${line}\n`).join('')}constraints:
  turn: { kind: orient, target: head.base, sources: { head: 1 } }
`;
