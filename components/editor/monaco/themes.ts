import { readColours } from '@/components/viewport/colours';
import { monaco } from './setUpMonaco';

/** Name of the theme that follows the page's own colours. */
export const THEME = 'pintle';

function bare(colour: string): string {
  return colour.replace('#', '');
}

/** Defines the editor's theme from the colours the page has at this moment, and puts it on. */
export function applyTheme(isNight: boolean): void {
  const colours = readColours();
  monaco.editor.defineTheme(THEME, {
    base: isNight ? 'vs-dark' : 'vs',
    inherit: true,
    rules: [
      { token: '', foreground: bare(colours.ink) },
      { token: 'type', foreground: bare(colours.ink), fontStyle: 'bold' },
      { token: 'comment', foreground: bare(colours.inkSoft), fontStyle: 'italic' },
      { token: 'string', foreground: bare(colours.ink) },
      { token: 'string.yaml', foreground: bare(colours.ink) },
      { token: 'number.yaml', foreground: bare(colours.info) },
      { token: 'type.yaml', foreground: bare(colours.ink), fontStyle: 'bold' },
      { token: 'keyword.yaml', foreground: bare(colours.info) },
      { token: 'number', foreground: bare(colours.info) },
      { token: 'keyword', foreground: bare(colours.info) },
      { token: 'operators', foreground: bare(colours.inkSoft) },
      { token: 'delimiter', foreground: bare(colours.inkSoft) },
      { token: 'tag', foreground: bare(colours.signal) },
    ],
    colors: {
      'editor.background': colours.sheet,
      'editor.foreground': colours.ink,
      'editorLineNumber.foreground': colours.inkSoft,
      'editorLineNumber.activeForeground': colours.ink,
      'editorCursor.foreground': colours.signal,
      'editor.selectionBackground': `${colours.left}55`,
      'editor.lineHighlightBackground': `${colours.rule}33`,
      'editor.lineHighlightBorder': `${colours.rule}00`,
      'editorIndentGuide.background1': `${colours.rule}99`,
      'editorIndentGuide.activeBackground1': colours.inkSoft,
      'editorError.foreground': colours.error,
      'editorWarning.foreground': colours.warning,
      'editorInfo.foreground': colours.info,
      'editorWidget.background': colours.paper,
      'editorWidget.border': colours.rule,
      'editorHoverWidget.background': colours.paper,
      'editorHoverWidget.border': colours.ink,
      'editorSuggestWidget.background': colours.paper,
      'editorSuggestWidget.border': colours.ink,
      'editorSuggestWidget.selectedBackground': `${colours.left}66`,
      'editorSuggestWidget.selectedForeground': colours.ink,
      'editorSuggestWidget.highlightForeground': colours.signal,
      'editorSuggestWidget.focusHighlightForeground': colours.signal,
      'editorGutter.background': colours.sheet,
      // Brackets in ink: colour in the text means side or finding, nothing else.
      'editorBracketHighlight.foreground1': colours.inkSoft,
      'editorBracketHighlight.foreground2': colours.inkSoft,
      'editorBracketHighlight.foreground3': colours.inkSoft,
      'editorBracketHighlight.foreground4': colours.inkSoft,
      'editorBracketHighlight.foreground5': colours.inkSoft,
      'editorBracketHighlight.foreground6': colours.inkSoft,
      'scrollbarSlider.background': `${colours.rule}aa`,
      focusBorder: colours.signal,
    },
  });
  monaco.editor.setTheme(THEME);
}
