/** The compiler's only door: everything outside `compiler/` imports from here. */
export { type BuildFile, buildFiles, utf8Length } from './build/buildFiles';
export { findingsToSarif } from './build/findingsToSarif';
export { type Compilation, type CompileRequest, compile, type NodePlace } from './compile';
export { type BaseReference, findBaseReference } from './documents/findBaseReference';
export { DEFAULT_HOUSE } from './documents/readHouse';
export { type Explanation, explainFinding } from './findings/explainFinding';
export type { Finding, Fix, RelatedPlace, Severity } from './findings/Finding';
export { listFindingCodes } from './findings/registry';
export { sha256Hex } from './hash/sha256Hex';
export { createPoser } from './pose/createPoser';
export type { Poser } from './pose/Poser';
export type * from './rig/Rig';
export { type Sample, samples } from './samples/samples';
export { houseSchema } from './schema/generated/houseSchema';
export { recipeSchema } from './schema/generated/recipeSchema';
export { runScript } from './slipway/runScript';
export type { SourceText, Span } from './source/SourceText';
export { COMPILER_VERSION } from './version';
