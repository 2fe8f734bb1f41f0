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
