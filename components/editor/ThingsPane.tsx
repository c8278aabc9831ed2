'use client';

import { useEffect, useMemo, useRef, useState } from 'react';
import type { RigNode } from '@/compiler';
import { stepThrough } from '@/components/ui/stepThrough';
import type { BuiltRig } from '@/components/worker/messages';

export interface ThingsPaneProps {
  readonly built: BuiltRig;
  readonly chosen: readonly string[];
  onChoose(id: string | null): void;
}

const AXES = ['x', 'y', 'z'] as const;

interface Row {
  readonly node: RigNode;
  readonly depth: number;
  readonly position: readonly [number, number, number];
}

function toRows({ rig, world }: BuiltRig): readonly Row[] {
  const depthOf = new Map<string, number>();
  return rig.nodes.map((node, index) => {
    const depth = node.parent === null ? 0 : (depthOf.get(node.parent) ?? 0) + 1;
    depthOf.set(node.name, depth);
    const at = index * 16 + 12;
    return { node, depth, position: [world[at] ?? 0, world[at + 1] ?? 0, world[at + 2] ?? 0] };
  });
}

/** A length with three decimals; a minus sign that lines up with figures, and never a minus zero. */
export function lengthWords(value: number): string {
  const rounded = Math.round(value * 1000) / 1000 + 0;
  return rounded.toFixed(3).replace('-', '−');
}

/** Everything in the rig: the tree of the scene, and the picture's twin in words and numbers. */
export function ThingsPane({ built, chosen, onChoose }: ThingsPaneProps) {
  const [search, setSearch] = useState('');
  const [role, setRole] = useState('');
  const rows = useMemo(() => toRows(built), [built]);
  const roles = useMemo(() => [...new Set(rows.map(({ node }) => node.role))].sort(), [rows]);
  const ids = useMemo(() => new Set(chosen), [chosen]);
  const words = search.trim().toLowerCase();
  const isFiltered = words !== '' || role !== '';
  const shown = rows.filter(
    ({ node }) =>
      (role === '' || node.role === role) &&
      (words === '' || node.id.includes(words) || node.name.toLowerCase().includes(words)),
  );

  const firstChosen = shown.find(({ node }) => ids.has(node.id))?.node.id;
  const tabStop = firstChosen ?? shown[0]?.node.id;
  const first = useRef<HTMLTableRowElement>(null);

  useEffect(() => {
    if (firstChosen !== undefined) first.current?.scrollIntoView({ block: 'nearest' });
  }, [firstChosen]);

  return (
    <section aria-label="Things in the rig" className="flex h-full min-h-0 flex-col">
      <div className="flex flex-wrap items-end gap-3 border-rule border-b px-3 py-2 text-sm">
        <label className="flex min-w-0 flex-1 items-baseline gap-2">
          Search
          <input
            className="plain-input min-w-0 flex-1"
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
        </label>
        <label className="flex items-baseline gap-2">
          Role
          <select className="plain-select" value={role} onChange={(event) => setRole(event.target.value)}>
            <option value="">all</option>
            {roles.map((name) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        </label>
        <span className="figures text-ink-soft">{shown.length}</span>
      </div>
      <section className="scrolls-under-head min-h-0 flex-1 overflow-auto" aria-label="List of things">
        <table className="w-full text-sm">
          <thead className="sticky top-0 bg-sheet text-left text-ink-soft">
            <tr className="border-rule border-b">
              <th className="px-3 py-1 font-normal" scope="col">
                Thing
              </th>
              <th className="px-2 py-1 font-normal" scope="col">
                Role
              </th>
              <th className="px-2 py-1 font-normal" scope="col">
                Side
              </th>
              {AXES.map((axis) => (
                <th key={axis} className="px-2 py-1 text-right font-normal last:pr-3" scope="col">
                  {axis}
                </th>
              ))}
            </tr>
          </thead>
          <tbody onKeyDown={stepThrough}>
            {shown.map(({ node, depth, position }) => {
              const isChosen = ids.has(node.id);
              return (
                <tr
                  key={node.id}
                  ref={node.id === firstChosen ? first : undefined}
                  data-node={node.id}
                  className={isChosen ? 'row-chosen' : ''}
                  aria-selected={isChosen}
                >
                  <th scope="row" className="px-3 py-0.5 text-left font-normal">
                    <button
                      type="button"
                      tabIndex={node.id === tabStop ? 0 : -1}
                      className="thing-name figures"
                      style={{ paddingLeft: isFiltered ? 0 : `${Math.min(depth, 12) * 0.6}rem` }}
                      aria-pressed={isChosen}
                      onClick={() => onChoose(isChosen ? null : node.id)}
                    >
                      <span aria-hidden className={`side-dot side-dot-${node.side}`} />
                      {node.id}
                    </button>
                  </th>
                  <td className="px-2 py-0.5 text-ink-soft">
                    {node.role}
                    {!node.shown && <span title="Hidden from animators"> (hidden)</span>}
                  </td>
                  <td className="px-2 py-0.5 text-ink-soft">{node.side}</td>
                  {AXES.map((axis, index) => (
                    <td key={axis} className="figures px-2 py-0.5 text-right last:pr-3">
                      {lengthWords(position[index] ?? 0)}
                    </td>
                  ))}
                </tr>
              );
            })}
          </tbody>
        </table>
        {shown.length === 0 && (
          <p className="p-4 text-ink-soft">Nothing matches. Clear the search or choose another role.</p>
        )}
      </section>
    </section>
  );
}
