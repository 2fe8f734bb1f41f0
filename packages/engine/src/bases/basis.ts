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
  /** The question that it is one of several answers to: accepting one answer takes the place of another. */
  readonly choice?: string
}

/** The question how much crack control edge wedges need. */
export const CRACK_CHOICE = 'edge-wedge-cracks'

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
  /** What a reader should see beside the rule; empty where there is nothing to say. */
  readonly notes: readonly string[]
}

export interface TieInput {
  /** Largest force while jacking at this stage, N, unfactored. */
  readonly P: number
  /** Plate dimension in the plane, mm. */
  readonly a: number
  /** Prism dimension in the plane, mm; more than `a`. */
  readonly b: number
}

/** Steel asked for by one tie; `area` mm2, `stress` MPa. */
export interface TieRule {
  readonly area: number
  readonly stress: number
  readonly clause: Clause
  readonly steps: readonly Step[]
  /** What a reader should see beside the rule; empty where there is nothing to say. */
  readonly notes: readonly string[]
}

/** Tension along the face beside or between anchors. */
export interface FaceInput {
  /** Force along the face, N, unfactored. */
  readonly T: number
  /** Largest force while jacking of the anchors beside, N, unfactored. */
  readonly P: number
}

/** How anchors of one row are covered in plan by the prism rule. */
export interface PlanRow {
  /** The reading on which a near-equal row rests; null where the clause itself covers it. */
  readonly equalReadingId: string | null
  /** Whether the prism rule holds for more than two anchors with gaps that differ. */
  readonly isUnevenCovered: boolean
  readonly clause: Clause
}

/** A place in a slab without precompression that may crack, mm and MPa. */
export interface CrackInput {
  readonly thickness: number
  /** From the concrete face to the surface of the bar. */
  readonly cover: number
  readonly diameter: number
  /** Characteristic cylinder strength at 28 days. */
  readonly fck: number
  /** Tensile strength when the concrete is expected to crack; null takes the 28-day mean. */
  readonly tensile: number | null
  readonly crackWidth: number
  /** Average compression that the engineer counts against cracking. */
  readonly compression: number
}

export interface CrackRule {
  /** mm2 per metre, both faces together. */
  readonly areaPerMetre: number
  /** Largest spacing of the bars, mm; null where the rule sets none. */
  readonly spacingMax: number | null
  readonly clause: Clause
  readonly steps: readonly Step[]
}

/** One degree of crack control for edge wedges; a job makes its choice by accepting the reading of one of them. */
export interface CrackChoice {
  readonly readingId: string
  readonly title: string
  /** Null where the choice asks for no steel of its own. */
  readonly steel: (input: CrackInput) => CrackRule | null
}

/** A rule of another code, shown for information; `force` N. */
export interface OtherRule {
  readonly title: string
  readonly force: number
  readonly clause: Clause
}

/** The tie behind an anchor that stands inside the slab. */
export interface TieBack {
  /** By which a share of the force is tied back. */
  readonly readingId: string
  /** By which the engineer's own force is. */
  readonly ownReadingId: string
  /** `P` largest force while jacking, N, unfactored; `own` the engineer's own tie force, N, or null. */
  readonly rule: (input: { readonly P: number; readonly own: number | null }) => TieRule
  /** What rules of other codes give, for information only. */
  readonly beside: (P: number) => readonly OtherRule[]
}

export interface TransmissionInput {
  /** Of one strand, mm. */
  readonly diameter: number
  /** Stress of the strand after lock-off, MPa. */
  readonly stress: number
  /** Cylinder strength when the strand is stressed, MPa. */
  readonly strength: number
}

/** Length over which a bonded strand gives its force to the concrete, mm: lower, mean and upper value. */
export interface Transmission {
  readonly lower: number
  readonly length: number
  readonly upper: number
  readonly clause: Clause
  readonly steps: readonly Step[]
}

/** Usual friction of strand in its duct; `mu` 1/rad, `wobble` rad/m inside the bracket with mu or 1/m beside it. */
export interface UsualFriction {
  readonly family: 'inside' | 'outside'
  readonly mu: string
  readonly wobble: string
  /** With what a job of this basis begins: mu in 1/rad, wobble per metre. */
  readonly begin: Readonly<Record<'nominal' | 'low' | 'high', { readonly mu: number; readonly wobblePerM: number }>>
  readonly clause: Clause
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

/** Bars side by side, mm. */
export interface GapInput {
  /** Of the thicker bar. */
  readonly diameter: number
  /** Largest size of the aggregate. */
  readonly aggregate: number
}

/** Where a level bar lies in its section, mm. */
export interface BondPlace {
  readonly depth: number
  /** Height of the bar's centre above the soffit; null where it is not known, which takes the worst. */
  readonly fromSoffit: number | null
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
  /** The reading by which bursting steel is sized, and the one that says where steel counts; null where a clause does. */
  readonly steelReading: string | null
  readonly windowReading: string | null
  /** By which an anchor off centre is checked in its own prism alone, up to this plate over prism. */
  readonly ownPrismReading: { readonly id: string; readonly ratioMax: number }
  /** Largest force while jacking; the last step holds the limit, N. */
  readonly jackingLimit: (strand: StrandType, strands: number) => readonly Step[]
  /** Largest force after lock-off; the last step holds the limit, N. Null where the basis sets none. */
  readonly lockOffLimit: ((strand: StrandType, strands: number) => readonly Step[]) | null
  readonly bearing: (input: BearingInput) => BearingRule
  readonly tie: (input: TieInput) => TieRule
  readonly window: (b: number) => Window
  /** Steel at the loaded face: that of the force or the basis's own floor, whichever is more. */
  readonly faceSteel: (input: FaceInput) => TieRule
  readonly planRow: PlanRow
  /** From the least to the most; the first asks for ordinary edge bars only. */
  readonly crackChoices: readonly CrackChoice[]
  readonly tieBack: TieBack
  readonly transmission: (input: TransmissionInput) => Transmission
  /** The readings for bonded dead ends, and for the width of the strip without precompression at a joint. */
  readonly deadEndReading: string
  readonly jointReading: string
  /** The reading by which bars take the place of a tendon that stops short of its edge. */
  readonly shortfallReading: string
  readonly anchorage: (input: AnchorageInput) => Anchorage
  /** Whether a level bar at this place lies in good bond. */
  readonly isGoodBond: (place: BondPlace) => boolean
  /** Lap length, mm; `share` is the part of the bars lapped at one section, above 0 to 1. */
  readonly lap: (input: AnchorageInput, share: number) => number
  /** Between two laps that count as in different sections: from middle to middle, in lap lengths. */
  readonly lapStagger: number
  /** Least clear gap between two bars side by side, mm, whatever the job asks for beyond it. */
  readonly clearGap: (input: GapInput) => { readonly value: number; readonly clause: Clause }
  /** Stress that a bar anchored or lapped in full develops, MPa. */
  readonly barStress: number
  /** Straight length that the hook of a closed link needs past its bend, mm. */
  readonly linkHook: (diameter: number) => { readonly length: number; readonly clause: Clause }
  /** Angle of spread behind an anchor, rad. */
  readonly spread: { readonly value: number; readonly clause: Clause }
  /** Largest angle between tendon and the normal of the edge for which the tie rule is used, rad. */
  readonly inclinationMax: { readonly value: number; readonly clause: Clause }
  readonly clauses: {
    readonly jacking: Clause
    readonly tie: Clause
    readonly window: Clause
    readonly bearing: Clause
    readonly lap: Clause
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
  readonly friction: UsualFriction
  readonly make: (input: BasisInput) => Basis
}
