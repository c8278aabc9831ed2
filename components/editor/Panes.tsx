'use client';

import { Tabs } from 'radix-ui';
import type { ReactNode } from 'react';

export interface PaneTab {
  readonly id: string;
  readonly words: string;
  readonly content: ReactNode;
}

export interface PanesProps {
  readonly text: ReactNode;
  readonly picture: ReactNode;
  readonly tabs: readonly PaneTab[];
}

/**
 * The text on the left; the picture and what belongs to it on the right. On a narrow screen they stand below one
 * another. Hairlines part them; the line between text and picture can be dragged.
 */
export function Panes({ text, picture, tabs }: PanesProps) {
  const [first] = tabs;
  return (
    <div className="editor-panes">
      <section aria-label="Recipe text" className="editor-text">
        {text}
      </section>
      <div className="editor-side">
        <div className="editor-picture">{picture}</div>
        <Tabs.Root defaultValue={first?.id ?? ''} className="editor-tabs">
          <Tabs.List aria-label="About the rig" className="tab-list">
            {tabs.map(({ id, words }) => (
              <Tabs.Trigger key={id} id={`tab-${id}`} value={id} className="tab-trigger">
                {words}
              </Tabs.Trigger>
            ))}
          </Tabs.List>
          {tabs.map(({ id, content }) => (
            <Tabs.Content key={id} value={id} className="tab-content" tabIndex={-1}>
              {content}
            </Tabs.Content>
          ))}
        </Tabs.Root>
      </div>
    </div>
  );
}
