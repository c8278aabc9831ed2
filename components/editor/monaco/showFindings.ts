import type { Finding, Severity } from '@/compiler';
import { monaco } from './setUpMonaco';

type Model = NonNullable<ReturnType<typeof monaco.editor.getModel>>;

const OWNER = 'pintle';
const SEVERITIES: Readonly<Record<Severity, number>> = {
  error: monaco.MarkerSeverity.Error,
  warning: monaco.MarkerSeverity.Warning,
  info: monaco.MarkerSeverity.Info,
};

/** Findings shown in each text, for the quick fixes that are asked for later. */
const shown = new WeakMap<Model, readonly Finding[]>();
const glyphs = new WeakMap<Model, string[]>();

/** Marks findings in the text and in its margin. */
export function showFindings(model: Model, findings: readonly Finding[]): void {
  shown.set(model, findings);
  monaco.editor.setModelMarkers(
    model,
    OWNER,
    findings.map(({ severity, message, help, code, span }) => ({
      severity: SEVERITIES[severity],
      message: `${message}\n${help}`,
      code,
      source: OWNER,
      startLineNumber: span.startLine,
      startColumn: span.startColumn,
      endLineNumber: span.endLine,
      // An empty place is widened, or nothing would be seen.
      endColumn: span.end > span.start ? span.endColumn : span.endColumn + 1,
    })),
  );
  const before = glyphs.get(model) ?? [];
  const after = findings.map(({ severity, span, message }) => ({
    range: new monaco.Range(span.startLine, 1, span.startLine, 1),
    options: {
      glyphMarginClassName: `finding-glyph finding-glyph-${severity}`,
      glyphMarginHoverMessage: { value: message, isTrusted: false },
    },
  }));
  glyphs.set(model, model.deltaDecorations(before, after));
}

monaco.languages.registerCodeActionProvider('yaml', {
  provideCodeActions(model, range) {
    const touching = (shown.get(model) ?? []).filter(
      ({ fix, span }) =>
        fix !== undefined &&
        monaco.Range.areIntersectingOrTouching(
          range,
          new monaco.Range(span.startLine, span.startColumn, span.endLine, span.endColumn),
        ),
    );
    const actions = touching.flatMap(({ fix }) =>
      fix
        ? [
            {
              title: fix.title,
              kind: 'quickfix',
              isPreferred: fix.safe,
              edit: {
                edits: fix.edits.map(({ span, newText }) => ({
                  resource: model.uri,
                  versionId: model.getVersionId(),
                  textEdit: {
                    range: new monaco.Range(span.startLine, span.startColumn, span.endLine, span.endColumn),
                    text: newText,
                  },
                })),
              },
            },
          ]
        : [],
    );
    return { actions, dispose() {} };
  },
});
