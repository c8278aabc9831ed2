import { loader } from '@monaco-editor/react';
import * as monaco from 'monaco-editor/esm/vs/editor/edcore.main.js';
import 'monaco-editor/esm/vs/basic-languages/yaml/yaml.contribution.js';
import { createWebWorker } from 'monaco-editor/esm/vs/common/workers.js';
import { configureMonacoYaml, type JSONSchema } from 'monaco-yaml';
import { recipeSchema } from '@/compiler';

/** Recipes are matched by this ending, whatever they are called. */
export const RECIPE_PATH_SUFFIX = '.recipe.yaml';

self.MonacoEnvironment = {
  getWorker(_moduleId: string, label: string) {
    // Each address must stand literally here, or the bundler would not find the worker.
    return label === 'yaml'
      ? new Worker(new URL('./yaml.worker.ts', import.meta.url), { type: 'module' })
      : new Worker(new URL('./editor.worker.ts', import.meta.url), { type: 'module' });
  },
};

// The editor comes from the application itself, never from another origin.
loader.config({ monaco });

// monaco-yaml asks for a worker in the way of older editors; the newer call takes the same arguments.
configureMonacoYaml({ ...monaco, editor: { ...monaco.editor, createWebWorker } } as typeof monaco, {
  enableSchemaRequest: false,
  // Completion and hover come from the schema; what is wrong comes from the compiler alone, so nothing is said twice.
  validate: false,
  completion: true,
  hover: true,
  format: { enable: true },
  schemas: [
    {
      uri: 'inmemory://pintle/recipe.schema.json',
      fileMatch: [`**/*${RECIPE_PATH_SUFFIX}`],
      schema: recipeSchema as unknown as JSONSchema,
    },
  ],
});

export { monaco };
