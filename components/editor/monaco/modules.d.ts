/** Parts of monaco-editor that are imported one by one, to leave out the languages nobody edits here. */
declare module 'monaco-editor/esm/vs/editor/edcore.main.js' {
  export * from 'monaco-editor';
}
declare module 'monaco-editor/esm/vs/basic-languages/yaml/yaml.contribution.js';
declare module 'monaco-editor/esm/vs/common/workers.js' {
  export const createWebWorker: typeof import('monaco-editor')['editor']['createWebWorker'];
}
declare module 'monaco-editor/esm/vs/editor/editor.worker.js';
declare module 'monaco-yaml/yaml.worker.js';
