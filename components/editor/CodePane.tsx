'use client';

import Editor from '@monaco-editor/react';
import { type Ref, useEffect, useImperativeHandle, useRef } from 'react';
import type { Finding, Fix, Span } from '@/compiler';
import { isNightScheme, onSchemeChange } from '@/components/viewport/colours';
import { monaco, RECIPE_PATH_SUFFIX } from './monaco/setUpMonaco';
import { showFindings } from './monaco/showFindings';
import { applyTheme, THEME } from './monaco/themes';

type CodeEditor = ReturnType<typeof monaco.editor.create>;

/** A stretch of text, in UTF-16 code units. */
export interface TextRange {
  readonly start: number;
  readonly end: number;
}

/** What the page may ask of the text. */
export interface CodePaneHandle {
  /** Shows a stretch of text without moving the cursor. */
  reveal(range: TextRange): void;
  /** Puts the cursor at a finding's place and the keyboard into the text. */
  goTo(span: Span): void;
  /** Changes the text as a fix says; can be undone like typing. */
  applyFix(fix: Fix): void;
  /** Puts another text in the place of all of it, as one step that can be undone by itself. */
  replaceText(text: string): void;
  /** Puts the cursor at the next finding and shows what it says. */
  nextFinding(): void;
  focus(): void;
}

export interface CodePaneProps {
  readonly ref: Ref<CodePaneHandle>;
  readonly name: string;
  readonly text: string;
  readonly isReadOnly: boolean;
  readonly findings: readonly Finding[];
  /** What is chosen elsewhere, marked at its lines. */
  readonly chosen: readonly TextRange[];
  onChange(text: string): void;
  onCursor(offset: number): void;
}

function toRange(span: Span) {
  return new monaco.Range(span.startLine, span.startColumn, span.endLine, span.endColumn);
}

/** The recipe's text. */
export function CodePane({
  ref,
  name,
  text,
  isReadOnly,
  findings,
  chosen,
  onChange,
  onCursor,
}: CodePaneProps) {
  const editor = useRef<CodeEditor | null>(null);
  const marks = useRef<ReturnType<CodeEditor['createDecorationsCollection']> | null>(null);
  const latest = useRef({ onCursor, findings });
  latest.current = { onCursor, findings };

  useImperativeHandle(ref, () => ({
    reveal({ start, end }) {
      const model = editor.current?.getModel();
      if (!model) return;
      const from = model.getPositionAt(start);
      const to = model.getPositionAt(end);
      editor.current?.revealRangeInCenterIfOutsideViewport(monaco.Range.fromPositions(from, to));
    },
    goTo(span) {
      editor.current?.setSelection(toRange(span));
      editor.current?.revealRangeInCenterIfOutsideViewport(toRange(span));
      editor.current?.focus();
    },
    applyFix(fix) {
      const edits = fix.edits.map(({ span, newText }) => ({ range: toRange(span), text: newText }));
      editor.current?.pushUndoStop();
      editor.current?.executeEdits('fix', edits);
      editor.current?.pushUndoStop();
      editor.current?.focus();
    },
    replaceText(next) {
      const model = editor.current?.getModel();
      if (!model) return;
      editor.current?.pushUndoStop();
      editor.current?.executeEdits('replace', [{ range: model.getFullModelRange(), text: next }]);
      editor.current?.pushUndoStop();
    },
    nextFinding() {
      editor.current?.focus();
      editor.current?.trigger('pintle', 'editor.action.marker.next', null);
    },
    focus() {
      editor.current?.focus();
    },
  }));

  useEffect(() => {
    const model = editor.current?.getModel();
    if (model) showFindings(model, findings);
  }, [findings]);

  useEffect(() => {
    const model = editor.current?.getModel();
    if (!model) return;
    marks.current?.set(
      chosen.map(({ start, end }) => ({
        range: monaco.Range.fromPositions(model.getPositionAt(start), model.getPositionAt(end)),
        options: { isWholeLine: true, className: 'chosen-lines', linesDecorationsClassName: 'chosen-margin' },
      })),
    );
  }, [chosen]);

  useEffect(() => onSchemeChange(() => applyTheme(isNightScheme())), []);

  const mount = (mounted: CodeEditor): void => {
    editor.current = mounted;
    marks.current = mounted.createDecorationsCollection();
    applyTheme(isNightScheme());
    const model = mounted.getModel();
    if (model) showFindings(model, latest.current.findings);
    mounted.onDidChangeCursorPosition(({ position, reason }) => {
      const here = mounted.getModel();
      // Edits from outside (a fix, a restored draft) move the cursor too, but nobody chose anything by them.
      if (here && reason !== monaco.editor.CursorChangeReason.ContentFlush) {
        latest.current.onCursor(here.getOffsetAt(position));
      }
    });
  };

  return (
    <Editor
      path={`file:///${name}${RECIPE_PATH_SUFFIX}`}
      language="yaml"
      theme={THEME}
      value={text}
      onChange={(value) => onChange(value ?? '')}
      onMount={(mounted) => mount(mounted as unknown as CodeEditor)}
      loading={<p className="p-4 text-ink-soft">Opening the text…</p>}
      options={{
        readOnly: isReadOnly,
        ariaLabel: 'Recipe text. Control M lets Tab move on instead of indenting.',
        automaticLayout: true,
        fontFamily: 'var(--font-figures)',
        fontSize: 13,
        lineHeight: 20,
        fontLigatures: false,
        glyphMargin: true,
        lineNumbersMinChars: 3,
        lineDecorationsWidth: 8,
        minimap: { enabled: false },
        scrollBeyondLastLine: false,
        padding: { top: 12, bottom: 12 },
        tabSize: 2,
        insertSpaces: true,
        detectIndentation: false,
        renderWhitespace: 'boundary',
        overviewRulerBorder: false,
        fixedOverflowWidgets: true,
        unicodeHighlight: { ambiguousCharacters: false, invisibleCharacters: false },
        quickSuggestions: { other: true, comments: false, strings: true },
        wordBasedSuggestions: 'off',
        stickyScroll: { enabled: false },
        bracketPairColorization: { enabled: false },
      }}
    />
  );
}
