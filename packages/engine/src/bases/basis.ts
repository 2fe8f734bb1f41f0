import type { AcceptedReading, Job, StrandType } from '../model'
import type { Clause, Step } from '../step'

/** A number that the code of practice recommends and a country or job may set otherwise, with a reason. */
export interface Factor {
  /** The name by which a job sets it. */
  readonly name: string
  readonly title: string
  readonly recommended: number
  readonly least: number
  readonly most: number
  readonly unit: string
  readonly clause: Clause
}

export interface FactorInUse extends Factor {
  readonly value: number
  /** Why it differs from the recommended value; null where it does not. */
  readonly reason: string | null
}

/** What a clause is taken to say where it is silent or stretched; an engineer accepts it once per job. */
export interface Reading {
  readonly id: string
  readonly title: string
  readonly text: string
  /** Where the reading holds; outside it the result stays a refusal. */
  readonly range: string
  readonly clause: Clause
  /** The one that a quick edge runs on; its alternatives have false. */
  readonly proposed: boolean
}

export interface BearingInput {
  /** Largest force while jacking at this stage, N, unfactored. */
  readonly P: number
  readonly plateWidth: number
  readonly plateHeight: number
  /** Area of the hole through the plate, mm2. */
  readonly holeArea: number
  /** Width along the edge and height that the spread may take up, concentric with the plate, mm. */
  readonly widthFree: number
  readonly heightFree: number
  /** Cylinder strength at this stage, MPa. */
  readonly strength: number
}

/** Demand and limit in MPa with every line that leads to them. */
export interface BearingRule {
  readonly demand: number
  readonly limit: number
  readonly clause: Clause
  readonly steps: readonly Step[]
}

export interface TieInput {
  /** Largest force while jacking at this stage, N, unfactored. */
  readonly P: number
  /** Plate dimension in the plane, mm. */
  readonly a: number
  /** Prism dimension in the plane, mm; more than `a`. */
  readonly b: number
}

/** Steel asked for behind one anchor in one plane; `area` mm2, `stress` MPa. */
export interface TieRule {
  readonly area: number
  readonly stress: number
  readonly clause: Clause
  readonly steps: readonly Step[]
}

/** Distances behind the bearing face between which steel counts, mm. */
export interface Window {
  readonly from: number
  readonly to: number
}

export interface AnchorageInput {
  readonly diameter: number
  /** Cylinder strength when the bar is needed, MPa. */
  readonly strength: number
  /** Stress that the bar must develop, MPa. */
  readonly stress: number
  /** Smallest of cover, side cover and half the clear gap, mm; null takes no credit for it. */
  readonly cd: number | null
  readonly isGoodBond: boolean
  readonly isBent: boolean
}

/** Lengths in mm, `bond` in MPa. */
export interface Anchorage {
  readonly bond: number
  readonly required: number
  readonly least: number
  readonly length: number
  readonly clause: Clause
}

/** A design basis as one job uses it: its factors, its readings and one function per rule. */
export interface Basis {
  readonly id: string
  readonly title: string
  readonly factors: readonly FactorInUse[]
  readonly readings: readonly Reading[]
  readonly isAccepted: (readingId: string) => boolean
  /** The reading by which bursting steel is sized, and the one that says where steel counts. */
  readonly steelReading: string
  readonly windowReading: string
  /** By which an anchor off centre is checked in its own prism alone, up to this plate over prism. */
  readonly ownPrismReading: { readonly id: string; readonly ratioMax: number }
  /** Largest force while jacking; the last step holds the limit, N. */
  readonly jackingLimit: (strand: StrandType, strands: number) => readonly Step[]
  /** Largest force after lock-off; the last step holds the limit, N. */
  readonly lockOffLimit: (strand: StrandType, strands: number) => readonly Step[]
  readonly bearing: (input: BearingInput) => BearingRule
  readonly tie: (input: TieInput) => TieRule
  readonly window: (b: number) => Window
  readonly anchorage: (input: AnchorageInput) => Anchorage
  /** Whether every bar of a section this deep lies in good bond, whatever its height in it. */
  readonly isGoodBond: (depth: number) => boolean
  /** Lap length, mm; `share` is the part of the bars lapped at one section, above 0 to 1. */
  readonly lap: (input: AnchorageInput, share: number) => number
  /** Angle of spread behind an anchor, rad. */
  readonly spread: { readonly value: number; readonly clause: Clause }
  /** Largest angle between tendon and the normal of the edge for which the tie rule is used, rad. */
  readonly inclinationMax: { readonly value: number; readonly clause: Clause }
  readonly clauses: {
    readonly jacking: Clause
    readonly tie: Clause
    readonly window: Clause
    readonly bearing: Clause
  }
}

/** What a basis is made from for one job. */
export interface BasisInput {
  readonly factors: Job['factors']
  readonly readings: readonly AcceptedReading[]
  readonly fyk: number
}

/** A published design basis. */
export interface BasisSource {
  readonly id: string
  readonly title: string
  readonly factors: readonly Factor[]
  readonly readings: readonly Reading[]
  readonly make: (input: BasisInput) => Basis
}
