export type * from './model'
export type { Clause, Step, Tag } from './step'
export { FAMILIES, FAMILY_WORDS, STATUSES } from './result'
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
export type { NewMark, Schedule, ScheduleProblem, ScheduleRow, ScheduleTotal } from './schedule/marks'
export { shapeDrawing } from './schedule/shape-drawing'
export type { DrawnPoint, ShapeDrawing } from './schedule/shape-drawing'
export { statusOfDistance, statusOfRatio } from './status'
export { boxRound, placedBars, turnsOf } from './placed'
export type { PlacedBar } from './placed'
export { BASIS_SOURCES, basisOf, factorProblems } from './bases'
export type { Basis, BasisSource, Factor, FactorInUse, Reading } from './bases/basis'
export { checkPour } from './check-pour'
export { FAMILIES_OF_ZONE } from './checks/families'
export type { PourAsk } from './check-pour'
export { bySeverity, worstOf } from './severity'
export { edgeWedge, USUAL_SPREAD } from './wedge'
export type { EdgeWedge } from './wedge'
export { actsAsOne, closeAnchors, closeBelow } from './close-anchors'
export { coverChecks } from './checks/cover'
export { spacingChecks } from './checks/spacing'
export { straightLengthChecks } from './checks/straight-length'
