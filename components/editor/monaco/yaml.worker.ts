import 'monaco-yaml/yaml.worker.js';
