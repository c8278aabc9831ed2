/** The compiler's only door: everything outside `compiler/` imports from here. */
export { type BuildFile, buildFiles, utf8Length } from './build/buildFiles';
export { findingsToSarif } from './build/findingsToSarif';
export { frontPicture } from './chart/frontPicture';
export { type Compilation, type CompileRequest, compile, type NodePlace } from './compile';
export { type KitFile, makeConformanceKit } from './conformance/makeConformanceKit';
export { type BaseReference, findBaseReference } from './documents/findBaseReference';
export { findHouseReference } from './documents/findHouseReference';
export { DEFAULT_HOUSE } from './documents/readHouse';
export { type Explanation, explainFinding } from './findings/explainFinding';
export type { Finding, Fix, RelatedPlace, Severity } from './findings/Finding';
export { listFindingCodes } from './findings/registry';
export {
  type FindingEntry,
  type KeyEntry,
  type LanguageEntry,
  listFindings,
  listLanguage,
  listParts,
  type PartEntry,
  slipwayReference,
} from './handbook';
export { sha256Hex } from './hash/sha256Hex';
export { type ChainSwitch, findSwitches } from './match/findSwitches';
export { matchToReaching, matchToTurning } from './match/matchChain';
export { matchSpace } from './match/matchSpace';
export { makeRigReader, type RigReader } from './match/RigReader';
export { axisDirection, leftDirection } from './math/axisDirection';
export { createPoser } from './pose/createPoser';
export { describePose, type PosedNode } from './pose/describePose';
export type { Poser } from './pose/Poser';
export { readPoseText } from './pose/readPoseText';
export type * from './rig/Rig';
export { type Sample, samples } from './samples/samples';
export { houseSchema } from './schema/generated/houseSchema';
export { recipeSchema } from './schema/generated/recipeSchema';
export { runScript } from './slipway/runScript';
export { type Polyline, shapeLines } from './slipway/shapes';
export type { SourceText, Span } from './source/SourceText';
export { TRIAL_NAMES, type TrialName, type TrialResult } from './trials/TrialResult';
export { emitUpgrade } from './upgrade/emitUpgrade';
export { planUpgrade } from './upgrade/planUpgrade';
export { runUpgrade, type UpgradeRun } from './upgrade/runUpgrade';
export { COMPILER_VERSION } from './version';
