import type { Status, Zone } from '../result'
import type { Steel, SteelShape, SteelZone } from '../model'

export interface ProposeAsk {
  readonly pourId: string
  /** Only these zones get steel; the whole pour without it. */
  readonly zoneIds?: readonly string[]
  /** Mass that one different bar mark less is worth, kg. */
  readonly massPerMark?: number
  /** Most different new marks that may be used: a point of the curve that somebody picked. */
  readonly marksAtMost?: number
}

/** One layout of steel that was looked at for a zone and does not do, and the check that says so. */
export interface Blocked {
  /** In words: 8 transverse bars H10, 800 long. */
  readonly candidate: string
  readonly check: string
  /** How far it is out: 1.12 of the limit, short by 13. */
  readonly by: string
}

/** The worst comparison of a zone, as a list shows it. */
export interface WorstCheck {
  readonly name: string
  readonly status: Status
  readonly by: string
}

export interface ProposedZone {
  readonly zone: Zone
  /** Where the new steel belongs. */
  readonly place: SteelZone
  /** The pour that the new steel is scheduled with. */
  readonly pourId: string
  readonly old: readonly Steel[]
  /** Ids among `old` that the proposal takes out: steel proposed before. Steel set by hand or locked never is. */
  readonly removes: readonly string[]
  readonly adds: readonly SteelShape[]
  /** Mass of all steel of the zone before and after, kg; local steel of the hardware is in neither. */
  readonly massOld: number
  readonly massNew: number
  readonly before: WorstCheck | null
  readonly after: WorstCheck | null
  /** Empty where a proposal stands. */
  readonly blocked: readonly Blocked[]
  /** Whole sentences. */
  readonly notes: readonly string[]
}

/** So many different new marks, and the least mass with them, kg. */
export interface CurvePoint {
  readonly marks: number
  readonly mass: number
}

export interface Proposal {
  readonly pourId: string
  /** Zones whose steel changes, and zones in which nothing passes; in the order of the pour's zones. */
  readonly zones: readonly ProposedZone[]
  /** Mass of what is added, kg, and the different marks in it that the pour's other bars do not have. */
  readonly mass: number
  readonly marks: number
  /** Before places look again for bars that pass beside those of their neighbours. */
  readonly curve: readonly CurvePoint[]
  /** Marks of the point of the curve that was taken. */
  readonly point: number
  /** False where the search was cut short, so that a lighter choice may exist. */
  readonly isExact: boolean
  readonly notes: readonly string[]
}
