/** The compiler's only door: everything outside `compiler/` imports from here. */
export { COMPILER_VERSION } from './version';
export type { SourceText, Span } from './source/SourceText';
export type { Finding, Fix, RelatedPlace, Severity } from './findings/Finding';
export type * from './rig/Rig';
