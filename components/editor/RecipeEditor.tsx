'use client';

import dynamic from 'next/dynamic';
import { useRouter } from 'next/navigation';
import { useCallback, useMemo, useRef, useState } from 'react';
import type { Draft } from '@/app/api/v1/_contracts/draft';
import type { Recipe } from '@/app/api/v1/_contracts/recipe';
import type { Version } from '@/app/api/v1/_contracts/version';
import type { Fix, SourceText, Span, TrialName } from '@/compiler';
import { instantWords } from '@/components/frame/dates';
import { TitleBlock } from '@/components/frame/TitleBlock';
import { useCompiler } from '@/components/worker/useCompiler';
import { Announcement } from './Announcement';
import { BuildDialog } from './BuildDialog';
import type { CodePaneHandle } from './CodePane';
import { type Command, CommandList } from './CommandList';
import { DraftConflictDialog } from './DraftConflictDialog';
import { DraftWords } from './DraftWords';
import { EditorStrip } from './EditorStrip';
import { createVersion, readVersion } from './editorApi';
import { countFindings, FindingsPane } from './FindingsPane';
import { Panes } from './Panes';
import { SaveVersionDialog } from './SaveVersionDialog';
import { ScriptPane } from './ScriptPane';
import { TextFoot } from './TextFoot';
import { ThingsPane } from './ThingsPane';
import { countTrials, TrialsPane } from './TrialsPane';
import { useDraft } from './useDraft';
import { useEditorKeys } from './useEditorKeys';
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
  const [dialog, setDialog] = useState<'save' | 'commands' | 'build' | null>(null);
  const code = useRef<CodePaneHandle>(null);

  // The name under which the server compiles it too, so that findings name the same document.
  const sourceName = `${recipe.name}.recipe.yaml`;
  const compiler = useCompiler(text, sourceName, bases);
  const { built, findings, trials } = compiler;
  const [posedTrial, setPosedTrial] = useState<TrialName | null>(null);
  // A pose belongs to the text it failed in: once the trial passes, the picture is at rest again.
  const posed = trials.find(({ trial, world }) => trial === posedTrial && world !== null) ?? null;
  const pictured = useMemo(
    () => (built && posed?.world ? { ...built, world: posed.world } : built),
    [built, posed],
  );
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

  /** As an edit of the text, so that undo brings the earlier one back. */
  const replaceText = (next: string): void => {
    code.current?.replaceText(next);
    setText(next);
  };
  const backToSaved = (): Promise<void> => {
    replaceText(version.text);
    return keeper.goOnFrom(version.text);
  };
  const takeTheirs = async (number: number): Promise<void> => {
    const theirs = await readVersion(recipe.id, number);
    replaceText(theirs.text);
    setVersion(theirs);
    setDialog(null);
    await keeper.goOnFrom(theirs.text);
    router.refresh();
  };

  const canSave = !isReadOnly && isChanged;
  const close = useCallback(() => setDialog(null), []);
  useEditorKeys({
    onSave: () => canSave && dialog === null && setDialog('save'),
    onCommands: () => dialog === null && setDialog('commands'),
  });

  const commands = useMemo<readonly Command[]>(() => {
    const go = (path: string) => () => router.push(`/recipes/${recipe.id}${path}`);
    const focus = (selector: string) => () => document.querySelector<HTMLElement>(selector)?.focus();
    return [
      ...(canSave ? [{ words: 'Save a version', keys: 'Ctrl S', run: () => setDialog('save') }] : []),
      { words: 'Go to the text', keys: null, run: () => code.current?.focus() },
      { words: 'Go to the next finding in the text', keys: 'Alt F8', run: () => code.current?.nextFinding() },
      { words: 'Go to the picture of the rig', keys: null, run: focus('[data-testid="viewport"]') },
      { words: 'Go to the findings', keys: null, run: focus('#tab-findings') },
      { words: 'Go to the trials', keys: null, run: focus('#tab-trials') },
      { words: 'Go to the list of things', keys: null, run: focus('#tab-things') },
      { words: 'Go to the build script', keys: null, run: focus('#tab-script') },
      ...(version.errors === 0
        ? [{ words: `Files of build ${version.number}`, keys: null, run: () => setDialog('build') }]
        : []),
      { words: 'Show all versions', keys: null, run: go('/versions') },
      ...(version.parent === null
        ? []
        : [
            {
              words: `Compare version ${version.number} with ${version.parent}`,
              keys: null,
              run: go(`/compare?from=${version.parent}&to=${version.number}`),
            },
          ]),
    ];
  }, [canSave, recipe.id, router, version]);

  const picture = pictured ? (
    <Viewport built={pictured} isOlder={compiler.isBuiltOlder} chosen={selection.chosen} onChoose={choose} />
  ) : (
    <p className="p-4 text-ink-soft">
      {compiler.sequence === 0
        ? 'Compiling…'
        : 'No picture yet: the text has errors. The findings say where.'}
    </p>
  );

  return (
    <div className="editor-sheet" data-compiled={compiler.sequence} data-took={compiler.took.toFixed(1)}>
      <EditorStrip
        recipeId={recipe.id}
        title={recipe.title}
        number={version.number}
        hasBuild={version.errors === 0}
        newer={
          !isReadOnly && recipe.latest && recipe.latest.number > version.number ? recipe.latest.number : null
        }
        isReadOnly={isReadOnly}
        isChanged={isChanged}
        draftWords={
          <DraftWords
            state={keeper.state}
            isReadOnly={isReadOnly}
            restored={draft !== null}
            isChanged={isChanged}
          />
        }
        openCommands={() => setDialog('commands')}
        openBuild={() => setDialog('build')}
        backToSaved={() => void backToSaved()}
        save={() => setDialog('save')}
      />

      <Panes
        text={
          <>
            <div>
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
            </div>
            <TextFoot />
          </>
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
            id: 'trials',
            words: countTrials(trials),
            content: (
              <TrialsPane
                trials={trials}
                posed={posed?.trial ?? null}
                onPose={setPosedTrial}
                onChoose={choose}
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

      <Announcement words={compiler.sequence > 0 ? countFindings(findings) : ''} />
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

      {dialog === 'commands' && <CommandList commands={commands} onClose={close} />}
      {dialog === 'build' && (
        <BuildDialog recipeId={recipe.id} number={version.number} isChanged={isChanged} onClose={close} />
      )}
      {dialog === 'save' && (
        <SaveVersionDialog
          recipeId={recipe.id}
          parent={version.number}
          text={text}
          errorCount={errorCount}
          save={(wanted, key) => keeper.during(() => createVersion(recipe.id, wanted, key))}
          onSaved={(saved) => {
            setVersion({ ...saved, text });
            close();
            router.refresh();
          }}
          takeTheirs={takeTheirs}
          onClose={close}
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
            replaceText(other?.text ?? version.text);
            keeper.takeOther(other);
          }}
        />
      )}
    </div>
  );
}
