import type { DraftState } from './useDraft';

export interface DraftWordsProps {
  readonly state: DraftState;
  readonly isReadOnly: boolean;
  /** Whether the page opened with a draft from an earlier visit. */
  readonly restored: boolean;
  readonly isChanged: boolean;
}

function words({ state, isReadOnly, restored, isChanged }: DraftWordsProps): string {
  if (isReadOnly) return 'Read only: your role in this show looks, but does not change.';
  switch (state.kind) {
    case 'unsaved':
      return 'Changed…';
    case 'storing':
      return 'Storing your draft…';
    case 'stored':
      return `${restored ? 'Your draft' : 'Draft'} is stored (${new Date(state.at).toISOString().slice(11, 19)} UTC).`;
    case 'failed':
    case 'refused':
      return state.words;
    case 'conflict':
      return 'Another window changed this draft.';
    case 'same':
      return isChanged ? 'Changed…' : 'Same as the saved version.';
  }
}

/** Says in words whether the work is safe. */
export function DraftWords(props: DraftWordsProps) {
  return (
    <p className="text-ink-soft text-sm" data-draft={props.state.kind}>
      {words(props)}
    </p>
  );
}
