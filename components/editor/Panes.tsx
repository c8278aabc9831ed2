'use client';

import { Tabs } from 'radix-ui';
import { type ReactNode, useSyncExternalStore } from 'react';
import { Group, Panel, Separator } from 'react-resizable-panels';

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

/** The width below which panes stand below one another; the same as in editor.css. */
const NARROW = '(max-width: 60rem)';

function onWidthChange(callback: () => void): () => void {
  const query = window.matchMedia(NARROW);
  query.addEventListener('change', callback);
  return () => query.removeEventListener('change', callback);
}

function useIsNarrow(): boolean {
  return useSyncExternalStore(
    onWidthChange,
    () => window.matchMedia(NARROW).matches,
    () => false,
  );
}

/**
 * The text on the left; the picture and what belongs to it on the right. On a narrow screen all stand below one
 * another. The hairlines between them can be moved by pointer, and by arrow keys when they have the keyboard.
 */
export function Panes({ text, picture, tabs }: PanesProps) {
  const [first] = tabs;
  const isNarrow = useIsNarrow();
  return (
    <div className="editor-panes">
      <Group orientation={isNarrow ? 'vertical' : 'horizontal'}>
        <Panel id="text" defaultSize={isNarrow ? '36%' : '44%'} minSize="15%">
          <section aria-label="Recipe text" className="editor-text">
            {text}
          </section>
        </Panel>
        <Separator className="pane-line" aria-label="Line between text and picture" />
        <Panel id="side" minSize="20%">
          <Group orientation="vertical">
            <Panel id="picture" defaultSize={isNarrow ? '55%' : '62%'} minSize="20%">
              {picture}
            </Panel>
            <Separator className="pane-line" aria-label="Line between picture and lists" />
            <Panel id="tabs" minSize="15%">
              <Tabs.Root defaultValue={first?.id ?? ''} className="editor-tabs">
                <Tabs.List aria-label="About the rig" className="tab-list">
                  {tabs.map(({ id, words }) => (
                    <Tabs.Trigger key={id} id={`tab-${id}`} value={id} className="tab-trigger">
                      {words}
                    </Tabs.Trigger>
                  ))}
                </Tabs.List>
                {tabs.map(({ id, content }) => (
                  <Tabs.Content
                    key={id}
                    value={id}
                    className="tab-content"
                    // What scrolls and holds nothing to stop at must be reached itself by keyboard.
                    tabIndex={id === 'trials' ? 0 : -1}
                  >
                    {content}
                  </Tabs.Content>
                ))}
              </Tabs.Root>
            </Panel>
          </Group>
        </Panel>
      </Group>
    </div>
  );
}
