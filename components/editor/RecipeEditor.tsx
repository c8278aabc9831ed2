'use client';

import dynamic from 'next/dynamic';
import { useRouter } from 'next/navigation';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { Draft } from '@/app/api/v1/_contracts/draft';
import type { Recipe } from '@/app/api/v1/_contracts/recipe';
import type { Version } from '@/app/api/v1/_contracts/version';
import type { Fix, SourceText, Span } from '@/compiler';
import { instantWords } from '@/components/frame/dates';
import { TitleBlock } from '@/components/frame/TitleBlock';
import { useCompiler } from '@/components/worker/useCompiler';
import type { CodePaneHandle } from './CodePane';
import { type Command, CommandList } from './CommandList';
import { DraftConflictDialog } from './DraftConflictDialog';
import { DraftWords } from './DraftWords';
import { createVersion, readVersion } from './editorApi';
import { countFindings, FindingsPane } from './FindingsPane';
import { Panes } from './Panes';
import { SaveVersionDialog } from './SaveVersionDialog';
import { ScriptPane } from './ScriptPane';
import { ThingsPane } from './ThingsPane';
import { useDraft } from './useDraft';
import { useSelection } from './useSelection';
import './editor.css';

// Text editor and picture are heavy and need the browser; they load here and nowhere else.
const CodePane = dynamic(() => import('./CodePane').then((module) => module.CodePane), { ssr: false });
const Viewport = dynamic(() => import('@/components/viewport/Viewport').then((module) => module.Viewport), {
  ssr: false,
});

export interface RecipeEditorProps {
  readonly recipe: Recipe;
  readonly version: Version;
  readonly draft: Draft | null;
  readonly bases: Readonly<Record<string, SourceText>>;
  readonly isReadOnly: boolean;
}

/** The page where a rigger works: the text is the master, and the rig answers beside it. */
export function RecipeEditor({ recipe, version: opened, draft, bases, isReadOnly }: RecipeEditorProps) {
  const router = useRouter();
  const [version, setVersion] = useState(opened);
  const [text, setText] = useState(draft?.text ?? opened.text);
  const [isSaving, setIsSaving] = useState(false);
  const [isListing, setIsListing] = useState(false);
  const code = useRef<CodePaneHandle>(null);

  // The name under which the server compiles it too, so that findings name the same document.
  const sourceName = `${recipe.name}.recipe.yaml`;
  const compiler = useCompiler(text, sourceName, bases);
  const { built, findings } = compiler;
  const selection = useSelection(built);
  const keeper = useDraft({
    recipeId: recipe.id,
    basedOn: version.number,
    initial: draft,
    text,
    savedText: version.text,
    isReadOnly,
  });
  const errorCount = findings.filter(({ severity }) => severity === 'error').length;
  const isChanged = text !== version.text;

  const choose = useCallback(
    (id: string | null) => {
      selection.choose(id);
      const place = built?.places.find((candidate) => candidate.id === id);
      if (place && place.start !== null && place.end !== null)
        code.current?.reveal({ start: place.start, end: place.end });
    },
    [selection.choose, built],
  );
  const goTo = useCallback((span: Span) => code.current?.goTo(span), []);
  const applyFix = useCallback((fix: Fix) => code.current?.applyFix(fix), []);

  const backToSaved = (): Promise<void> => {
    setText(version.text);
    return keeper.goOnFrom(version.text);
  };
  const takeTheirs = async (number: number): Promise<void> => {
    const theirs = await readVersion(recipe.id, number);
    // As an edit, so that undo brings one's own text back.
    setText(theirs.text);
    setVersion(theirs);
    setIsSaving(false);
    await keeper.goOnFrom(theirs.text);
    router.refresh();
  };

  const commands = useMemo<readonly Command[]>(() => {
    const go = (path: string) => () => router.push(`/recipes/${recipe.id}${path}`);
    return [
      ...(isReadOnly
        ? []
        : [{ id: 'save', words: 'Save a version', keys: 'Ctrl S', run: () => setIsSaving(true) }]),
      { id: 'text', words: 'Go to the text', keys: null, run: () => code.current?.focus() },
      {
        id: 'picture',
        words: 'Go to the picture of the rig',
        keys: null,
        run: () => focusOn('[data-testid="viewport"]'),
      },
      { id: 'findings', words: 'Go to the findings', keys: null, run: () => focusOn('#tab-findings') },
      { id: 'things', words: 'Go to the list of things', keys: null, run: () => focusOn('#tab-things') },
      { id: 'script', words: 'Go to the build script', keys: null, run: () => focusOn('#tab-script') },
      { id: 'versions', words: 'Show all versions', keys: null, run: go('/versions') },
      {
        id: 'compare',
        words: 'Compare with the version before',
        keys: null,
        run: go(`/compare?from=${Math.max(1, version.number - 1)}&to=${version.number}`),
      },
    ];
  }, [isReadOnly, recipe.id, router, version.number]);

  useEffect(() => {
    const press = (event: KeyboardEvent): void => {
      if (!(event.ctrlKey || event.metaKey)) return;
      if (event.key === 's') {
        event.preventDefault();
        if (!isReadOnly) setIsSaving(true);
      } else if (event.key === '.') {
        event.preventDefault();
        setIsListing(true);
      }
    };
    // Before the text editor sees them, which has meanings of its own for both.
    window.addEventListener('keydown', press, { capture: true });
    return () => window.removeEventListener('keydown', press, { capture: true });
  }, [isReadOnly]);

  const picture = built ? (
    <Viewport built={built} isOlder={compiler.isBuiltOlder} chosen={selection.chosen} onChoose={choose} />
  ) : (
    <p className="p-4 text-ink-soft">
      {compiler.sequence === 0
        ? 'Compiling…'
        : 'No picture yet: the text has errors. The findings say where.'}
    </p>
  );

  return (
    <div className="editor-sheet" data-compiled={compiler.sequence} data-took={compiler.took.toFixed(1)}>
      <div className="editor-strip">
        <h1 className="editor-title">{recipe.title}</h1>
        <DraftWords
          state={keeper.state}
          isReadOnly={isReadOnly}
          restored={draft !== null}
          isChanged={isChanged}
        />
        <div className="ml-auto flex flex-wrap items-center gap-3">
          <button
            type="button"
            className="plain-action"
            onClick={() => setIsListing(true)}
            aria-keyshortcuts="Control+."
          >
            Commands
          </button>
          {!isReadOnly && isChanged && (
            <button type="button" className="plain-action" onClick={() => void backToSaved()}>
              Back to version {version.number}
            </button>
          )}
          <a className="plain-action" href={`/recipes/${recipe.id}/versions`}>
            Versions
          </a>
          {version.errors === 0 && (
            <a
              className="plain-action"
              href={`/api/v1/recipes/${recipe.id}/versions/${version.number}/build/archive`}
              title={isChanged ? 'Your unsaved changes are not in it' : undefined}
            >
              Download build {version.number}
            </a>
          )}
          {!isReadOnly && (
            <button
              type="button"
              className="action action-main"
              disabled={!isChanged}
              onClick={() => setIsSaving(true)}
            >
              Save version
            </button>
          )}
        </div>
      </div>

      <Panes
        text={
          <CodePane
            ref={code}
            name={recipe.name}
            text={text}
            isReadOnly={isReadOnly}
            findings={findings}
            chosen={selection.ranges}
            onChange={setText}
            onCursor={selection.chooseAt}
          />
        }
        picture={picture}
        tabs={[
          {
            id: 'findings',
            words: `Findings (${findings.length})`,
            content: (
              <FindingsPane
                findings={findings}
                isReadOnly={isReadOnly}
                source={sourceName}
                onGoTo={goTo}
                onFix={applyFix}
              />
            ),
          },
          {
            id: 'things',
            words: 'Things',
            content: built ? <ThingsPane built={built} chosen={selection.chosen} onChoose={choose} /> : null,
          },
          {
            id: 'script',
            words: 'Build script',
            content: built ? (
              <ScriptPane script={built.script} chosen={selection.chosen} onChoose={choose} />
            ) : null,
          },
        ]}
      />

      <p className="sr-only" role="status" aria-live="polite">
        {compiler.sequence > 0 ? countFindings(findings) : ''}
      </p>
      <TitleBlock
        cells={[
          ['Show', recipe.show.title],
          ['Recipe', recipe.name],
          ['Version', `${version.number}${isChanged ? ', changed' : ''}`],
          ['State', isChanged ? 'draft' : version.state],
          ['Hash', version.contentHash.slice(0, 12)],
          ['Drawn by', version.author.name],
          ['Date (UTC)', instantWords(version.createdAt)],
          ['Findings', countFindings(findings)],
        ]}
      />

      {isListing && <CommandList commands={commands} onClose={() => setIsListing(false)} />}
      {isSaving && (
        <SaveVersionDialog
          recipeId={recipe.id}
          parent={version.number}
          text={text}
          errorCount={errorCount}
          save={(wanted, key) => keeper.during(() => createVersion(recipe.id, wanted, key))}
          onSaved={(saved) => {
            setVersion({ ...saved, text });
            setIsSaving(false);
            router.refresh();
          }}
          takeTheirs={takeTheirs}
          onClose={() => setIsSaving(false)}
        />
      )}
      {keeper.state.kind === 'conflict' && (
        <DraftConflictDialog
          other={keeper.state.other}
          text={text}
          onKeepMine={keeper.keepMine}
          onTakeOther={() => {
            const { state } = keeper;
            const other = state.kind === 'conflict' ? state.other : null;
            setText(other?.text ?? version.text);
            keeper.takeOther(other);
          }}
        />
      )}
    </div>
  );
}

function focusOn(selector: string): void {
  document.querySelector<HTMLElement>(selector)?.focus();
}
