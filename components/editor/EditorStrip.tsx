import type { ReactNode } from 'react';

export interface EditorStripProps {
  readonly recipeId: string;
  readonly title: string;
  readonly number: number;
  /** Whether version `number` can be built. */
  readonly hasBuild: boolean;
  /** Number of a version that was saved since the work began; null while there is none. */
  readonly newer: number | null;
  readonly isReadOnly: boolean;
  readonly isChanged: boolean;
  /** Says whether the work is safe. */
  readonly draftWords: ReactNode;
  openCommands(): void;
  openBuild(): void;
  backToSaved(): void;
  save(): void;
}

/** The strip over the sheet: what this is, whether it is safe, and what can be done with it. */
export function EditorStrip(props: EditorStripProps) {
  const { recipeId, number, newer, isReadOnly, isChanged } = props;
  return (
    <div className="editor-strip">
      <h1 className="editor-title">{props.title}</h1>
      {props.draftWords}
      {newer !== null && (
        <a className="plain-action text-sm" href={`/recipes/${recipeId}/compare?from=${number}&to=${newer}`}>
          Version {newer} was saved since
        </a>
      )}
      <div className="ml-auto flex flex-wrap items-center gap-x-4 gap-y-1">
        <button
          type="button"
          className="plain-action"
          onClick={props.openCommands}
          aria-keyshortcuts="Control+."
        >
          Commands
        </button>
        {!isReadOnly && isChanged && (
          <button type="button" className="plain-action" onClick={props.backToSaved}>
            Back to version {number}
          </button>
        )}
        <a className="plain-action" href={`/recipes/${recipeId}/versions`}>
          Versions
        </a>
        {props.hasBuild && (
          <>
            <a
              className="plain-action"
              href={`/api/v1/recipes/${recipeId}/versions/${number}/build/archive`}
              title={isChanged ? 'Your unsaved changes are not in it' : undefined}
            >
              Download build {number}
            </a>
            <button type="button" className="plain-action" onClick={props.openBuild}>
              Its files
            </button>
          </>
        )}
        {!isReadOnly && (
          <button
            type="button"
            className="action action-main"
            disabled={!isChanged}
            aria-keyshortcuts="Control+S"
            onClick={props.save}
          >
            Save version
          </button>
        )}
      </div>
    </div>
  );
}
