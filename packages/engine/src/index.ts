export type * from './model'
export type { Clause, Step, Tag } from './step'
export { FAMILIES, FAMILY_WORDS, STATUSES, STATUS_WORDS } from './result'
export { STEEL_NAMES } from './steel-names'
export type {
  Advice,
  Check,
  Compared,
  Family,
  LimitKind,
  PourResult,
  RefusalCode,
  Refused,
  Status,
  Zone,
  ZoneKind,
  ZoneResult,
} from './result'
export { BAR_STANDARDS, BS_8666_2005, BS_8666_2020, barStandardById } from './schedule/bs-8666'
export type {
  BarShape,
  BarSize,
  BarStandard,
  DimensionName,
  Dimensions,
  ShapeProblem,
  ShapeRule,
} from './schedule/bar-standards'
export { cutLength, roundedShape, shapeProblems } from './schedule/cut-length'
export type { CutLength } from './schedule/cut-length'
export { azimuthOf, alongAzimuth, distanceToSegment, isInside, selfCrossing, signedArea } from './geometry'
export { edgeFrame, leanOf } from './frame'
export type { EdgeFrame } from './frame'
export { found, layoutIndex } from './layout-index'
export type { LayoutIndex } from './layout-index'
export { gapsOfEdge } from './gaps'
export type { Gap, TendonEnd } from './gaps'
export { anchorMark, zonesOfPour } from './zones'
export { gridReference } from './grid-reference'
export { barKey, barOfKey, typeLetterOf } from './schedule/bar-key'
export { barsOf } from './schedule/bars'
export type { Member, PourBars, UnplacedSteel, ZoneBars } from './schedule/bars'
export { newMarks, scheduleOf } from './schedule/marks'
export type { ScheduleProblem, ScheduleRow } from './schedule/schedule-row'
export type { ScheduleDelivery, ScheduleKind, ScheduleTotal } from './schedule/schedule-totals'
export { edgeBarPieces, straightBarPieces } from './steel/bar-pieces'
export type { BarPiece, BarPieces } from './steel/bar-pieces'
export { cutRun } from './steel/cut-run'
export type { Cut, Run, Span } from './steel/cut-run'
export type { NewMark, Schedule } from './schedule/marks'
export { shapeDrawing } from './schedule/shape-drawing'
export type { DrawnPoint, ShapeDrawing } from './schedule/shape-drawing'
export { statusOfDistance, statusOfRatio } from './status'
export { boxRound, placedBars } from './placed'
export { turnsOf } from './placed/behind-face'
export type { PlacedBar } from './placed/bar'
export { BASIS_SOURCES, basisOf, factorProblems } from './bases'
export type { Basis, BasisSource, Factor, FactorInUse, Reading } from './bases/basis'
export { checkPour } from './check-pour'
export { recheck } from './recheck'
export type { Checked } from './recheck'
export { FAMILIES_OF_ZONE } from './checks/families'
export type { PourAsk } from './check-pour'
export { anchorageForce } from './force'
export type { AnchorageForce } from './force'
export { forceProfile } from './tendon/profile'
export type { ForceProfile } from './tendon/profile'
export type { NoForce } from './tendon/friction'
export { faceForce, tensionMidway, tensionOnLine } from './row-series'
export type { RowTension } from './row-series'
export { onProposedReadings } from './proposed-readings'
export { bySeverity, worstOf } from './severity'
export { edgeWedge, USUAL_SPREAD } from './wedge/closed-form'
export { cornerWedges } from './wedge/corner-wedge'
export { jointStrips } from './wedge/joint-strip'
export { gapAcross } from './wedge/joined-gap'
export { wedgesOfEdge } from './wedge/wedges-of-edge'
export type { GapWedge, SpreadDepth } from './wedge/wedges-of-edge'
export type { EdgeWedge } from './wedge/closed-form'
export { actsAsOne, closeAnchors, closeBelow } from './close-anchors'
export { coverChecks } from './checks/cover'
export { spacingChecks } from './checks/spacing'
export { straightLengthChecks } from './checks/straight-length'
export { proposeSteel } from './proposer/propose'
export type { Blocked, CurvePoint, Proposal, ProposeAsk, ProposedZone, WorstCheck } from './proposer/proposal'
export { jackLength } from './checks/jack-fit'
export { panNeeds } from './pan-needs'
export type { PanNeed } from './pan-needs'
export { panOutline } from './pan-outline'
export { panPlace, slabBeyond } from './pan-place'
export type { PanPlace } from './pan-place'
export { ahead, beside, nextRecess } from './pan-room'
export type { InTheWay } from './pan-room'
export { panStrip } from './pan-strip'
export type { PanStrip } from './pan-strip'
export { strengthAtStages } from './strengths'
export type { StageStrength, StrengthSet } from './strengths'
