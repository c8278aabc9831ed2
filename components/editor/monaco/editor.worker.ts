import 'monaco-editor/esm/vs/editor/editor.worker.js';
