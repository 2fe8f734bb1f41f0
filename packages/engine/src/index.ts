export type * from './model'
export type { Clause, Step, Tag } from './step'
export { step } from './step'
export { FAMILIES, STATUSES } from './result'
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
export { DIMENSION_NAMES } from './schedule/bar-standards'
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
export {
  azimuthOf,
  alongAzimuth,
  distance,
  distanceToSegment,
  isInside,
  ROUNDING,
  selfCrossing,
  sidesOf,
  signedArea,
} from './geometry'
export { edgeFrame, leanOf } from './frame'
export type { EdgeFrame, LocalPoint } from './frame'
export { found, gapId, layoutIndex, steelKey } from './layout-index'
export type { LayoutIndex } from './layout-index'
export { edgeFacedBy, gapsOfEdge, tendonEndsOfEdge } from './gaps'
export type { Gap, TendonEnd } from './gaps'
export { anchorMark, gapName, zonesOfPour } from './zones'
export { gridOffsets, gridReference } from './grid-reference'
export type { GridOffset } from './grid-reference'
export { barKey, barOfKey, typeLetterOf } from './schedule/bar-key'
export type { TypedBar, TypeLetter } from './schedule/bar-key'
export { barsOf } from './schedule/bars'
export type { Member, PourBars, UnplacedSteel, ZoneBars } from './schedule/bars'
export { newMarks, scheduleOf } from './schedule/marks'
export type { NewMark, Schedule, ScheduleProblem, ScheduleRow, ScheduleTotal } from './schedule/marks'
export { shapeDrawing } from './schedule/shape-drawing'
export type { DrawnPoint, ShapeDrawing } from './schedule/shape-drawing'
export { statusOfDistance, statusOfRatio } from './status'
export type { Comparison } from './status'
export { boxRound, placedBars, turnsOf } from './placed'
export type { PlacedBar, SpiralTurn } from './placed'
export { faceClearance, plateBox, pocketBox } from './bodies'
export type { Box } from './bodies'
export { regionAt, sectionBehind } from './section'
export type { Section } from './section'
export { BASIS_SOURCES, basisOf, factorProblems } from './bases'
export type { Basis, BasisSource, Factor, FactorInUse, Reading } from './bases/basis'
export { FAMILIES_OF_ZONE, checkPour } from './check-pour'
export type { PourAsk } from './check-pour'
export { bySeverity, worstOf } from './severity'
export { jackingForce } from './force'
export { edgeWedge, USUAL_SPREAD } from './wedge'
export type { EdgeWedge, PlanPoint, WedgeSpread } from './wedge'
export { actsAsOne, closeAnchors, closeBelow } from './close-anchors'
export type { CloseGroup } from './close-anchors'
export { coverChecks } from './checks/cover'
export { spacingChecks } from './checks/spacing'
export { straightLengthChecks } from './checks/straight-length'
