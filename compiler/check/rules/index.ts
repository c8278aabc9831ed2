import type { Rule } from '../Rule';
import { aimGoalOnJoint } from './aim-goal-on-joint';
import { attributeUnread } from './attribute-unread';
import { boneDwarfed } from './bone-dwarfed';
import { chainCrossesMiddle } from './chain-crosses-middle';
import { chainFoldsBack } from './chain-folds-back';
import { chainNeverBends } from './chain-never-bends';
import { channelSteersNothing } from './channel-steers-nothing';
import { choiceRepeated } from './choice-repeated';
import { constraintCrossesSides } from './constraint-crosses-sides';
import { constraintFollowsParent } from './constraint-follows-parent';
import { constraintJumpsAtRest } from './constraint-jumps-at-rest';
import { constraintOverridesControl } from './constraint-overrides-control';
import { constraintOverwritten } from './constraint-overwritten';
import { constraintsCompete } from './constraints-compete';
import { containerUnused } from './container-unused';
import { controlAllLocked } from './control-all-locked';
import { controlFarAway } from './control-far-away';
import { controlHidden } from './control-hidden';
import { controlNotSelectable } from './control-not-selectable';
import { controlSizeExtreme } from './control-size-extreme';
import { controlSteersNothing } from './control-steers-nothing';
import { controlsCoincide } from './controls-coincide';
import { driverFlat } from './driver-flat';
import { driverMovesRest } from './driver-moves-rest';
import { entryChangesNothing } from './entry-changes-nothing';
import { expressionReadsNothing } from './expression-reads-nothing';
import { guideLineInPlace } from './guide-line-in-place';
import { guideLineRepeated } from './guide-line-repeated';
import { guideLineWithoutLength } from './guide-line-without-length';
import { hingeAcrossBend } from './hinge-across-bend';
import { hingeOpensBackward } from './hinge-opens-backward';
import { jointsFewerThanPoints } from './joints-fewer-than-points';
import { jointsInParkedContainer } from './joints-in-parked-container';
import { landmarkLeftInMiddle } from './landmark-left-in-middle';
import { landmarkOffMiddle } from './landmark-off-middle';
import { landmarkOnOtherSide } from './landmark-on-other-side';
import { landmarkUnused } from './landmark-unused';
import { landmarksCoincide } from './landmarks-coincide';
import { landmarksNearlyMirrored } from './landmarks-nearly-mirrored';
import { limbBonesUnequal } from './limb-bones-unequal';
import { limbNearlyStraight } from './limb-nearly-straight';
import { limitBeyondFullTurn } from './limit-beyond-full-turn';
import { limitInverted } from './limit-inverted';
import { limitOnLocked } from './limit-on-locked';
import { limitZeroWidth } from './limit-zero-width';
import { mirroredControlsDiffer } from './mirrored-controls-differ';
import { nameContradictsSide } from './name-contradicts-side';
import { namesNearlySame } from './names-nearly-same';
import { nothingCarries } from './nothing-carries';
import { parameterHalfBounded } from './parameter-half-bounded';
import { parameterNeverVaries } from './parameter-never-varies';
import { parameterUnitDiffers } from './parameter-unit-differs';
import { parameterUnused } from './parameter-unused';
import { parentCrossesSides } from './parent-crosses-sides';
import { partOnOneSide } from './part-on-one-side';
import { poleOffPlane } from './pole-off-plane';
import { poleTooNear } from './pole-too-near';
import { poleWithoutGuideLine } from './pole-without-guide-line';
import { restOutsideLimits } from './rest-outside-limits';
import { rigBelowFloor } from './rig-below-floor';
import { roleUnused } from './role-unused';
import { rotationOrderLocksUp } from './rotation-order-locks-up';
import { scaleImplausible } from './scale-implausible';
import { shareWithoutRange } from './share-without-range';
import { skeletonInPieces } from './skeleton-in-pieces';
import { skinJointRepeated } from './skin-joint-repeated';
import { soleNotLevel } from './sole-not-level';
import { solverCrossesSides } from './solver-crosses-sides';
import { solversShareJoint } from './solvers-share-joint';
import { sourceWithoutWeight } from './source-without-weight';
import { spaceWithoutChoice } from './space-without-choice';
import { splineRunsBackward } from './spline-runs-backward';
import { textBlank } from './text-blank';
import { towardAlongChain } from './toward-along-chain';
import { twistJointOffBone } from './twist-joint-off-bone';
import { worldOrientedLimb } from './world-oriented-limb';

/** Every rule, those first whose finding most often explains the others. */
export const RULES: readonly Rule[] = [
  limitInverted,
  restOutsideLimits,
  constraintsCompete,
  solversShareJoint,
  nothingCarries,
  controlSteersNothing,
  controlAllLocked,
  parentCrossesSides,
  constraintCrossesSides,
  solverCrossesSides,
  jointsFewerThanPoints,
  skeletonInPieces,
  jointsInParkedContainer,
  chainNeverBends,
  skinJointRepeated,
  constraintOverwritten,
  sourceWithoutWeight,
  constraintJumpsAtRest,
  constraintOverridesControl,
  constraintFollowsParent,
  worldOrientedLimb,
  driverFlat,
  driverMovesRest,
  chainFoldsBack,
  boneDwarfed,
  chainCrossesMiddle,
  landmarksNearlyMirrored,
  scaleImplausible,
  rigBelowFloor,
  towardAlongChain,
  twistJointOffBone,
  splineRunsBackward,
  aimGoalOnJoint,
  soleNotLevel,
  limbNearlyStraight,
  limbBonesUnequal,
  hingeAcrossBend,
  hingeOpensBackward,
  poleOffPlane,
  poleTooNear,
  guideLineWithoutLength,
  limitZeroWidth,
  limitOnLocked,
  limitBeyondFullTurn,
  rotationOrderLocksUp,
  attributeUnread,
  shareWithoutRange,
  channelSteersNothing,
  controlHidden,
  controlNotSelectable,
  controlSizeExtreme,
  controlFarAway,
  controlsCoincide,
  mirroredControlsDiffer,
  guideLineRepeated,
  guideLineInPlace,
  poleWithoutGuideLine,
  parameterHalfBounded,
  parameterNeverVaries,
  parameterUnitDiffers,
  landmarksCoincide,
  landmarkOnOtherSide,
  landmarkLeftInMiddle,
  landmarkOffMiddle,
  namesNearlySame,
  nameContradictsSide,
  entryChangesNothing,
  roleUnused,
  containerUnused,
  expressionReadsNothing,
  spaceWithoutChoice,
  choiceRepeated,
  textBlank,
  partOnOneSide,
  parameterUnused,
  landmarkUnused,
];
