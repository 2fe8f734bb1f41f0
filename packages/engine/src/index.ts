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
