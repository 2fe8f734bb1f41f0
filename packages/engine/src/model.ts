/**
 * What the engine works on: plain data in N, mm, MPa and radians.
 *
 * x runs east, y north. Azimuths turn clockwise from north, elevations upwards going outward. Heights stand above the
 * pour's slab soffit datum. An edge holds no coordinates: the corners of its pour's outline do.
 */

import type { HairpinShape, LinksShape, SpiralShape, Steel } from './model-steel'

export type {
  EdgeBarsShape,
  HairpinShape,
  LinksShape,
  PlacedBarsShape,
  SpiralShape,
  Steel,
  SteelKind,
  SteelShape,
  SteelZone,
  TransverseBarsShape,
  WedgeBarsShape,
} from './model-steel'

export interface Point {
  readonly x: number
  readonly y: number
}

export interface Layout {
  readonly job: Job
  readonly levels: readonly Level[]
  readonly gridLines: readonly GridLine[]
  readonly strandTypes: readonly StrandType[]
  readonly jacks: readonly Jack[]
  readonly hardware: readonly Hardware[]
  readonly edgeLines: readonly EdgeLine[]
  readonly joints: readonly Joint[]
  readonly obstructions: readonly Obstruction[]
  readonly pours: readonly Pour[]
  readonly edges: readonly Edge[]
  readonly pans: readonly Pan[]
  readonly tendons: readonly Tendon[]
  readonly anchors: readonly Anchor[]
  readonly steel: readonly Steel[]
  readonly barMarks: readonly BarMark[]
  readonly concreteResults: readonly ConcreteResult[]
}

/** A mark once given to a bar keeps its bar: `key` holds type, size, shape and dimensions. Marks are never reused. */
export interface BarMark {
  readonly id: string
  readonly pourId: string
  readonly mark: number
  readonly key: string
}

/** A set of specimens from one pour, cured beside it or elsewhere. */
export interface ConcreteResult {
  readonly id: string
  readonly pourId: string
  readonly ageHours: number
  readonly cured: string
  readonly certificate: string
  readonly specimens: readonly number[]
}

export interface Job {
  readonly id: string
  readonly number: string
  readonly title: string
  readonly basis: string
  /** National factors that differ from the basis's recommended values, by the basis's own factor name. */
  readonly factors: readonly { readonly name: string; readonly value: number; readonly reason: string }[]
  readonly readings: readonly AcceptedReading[]
  readonly settings: JobSettings
}

export interface JobSettings {
  /** Clear concrete between a pocket and the nearest concrete face. */
  readonly pocketToFaceMin: number
  readonly pocketToPocketMin: number
  /** Clear gap that aggregate must pass between bodies. */
  readonly clearGapMin: number
  /** Share of the limit from which a result is called near; 0.90 to 1. */
  readonly nearFrom: number
  /** Reinforcement yield strength. */
  readonly fyk: number
  /** Largest stock length of a bar. */
  readonly stockLength: number
  readonly barStandard: string
  readonly reinforcementGrade: string
  /** Angle of spread chosen for edge wedges; null takes the basis's own. */
  readonly wedgeSpread: number | null
  /** Where the spread behind an anchor begins. */
  readonly spreadStart: 'bearing-face' | 'device-end'
  /** Wobble stands inside the bracket with mu (rad/mm), or beside it (1/mm). */
  readonly frictionFamily: 'inside' | 'outside'
  readonly frictionMu: number
  readonly frictionWobble: number
  /** The lowest credible pair leaves the most force at a dead end; the highest the least. */
  readonly frictionMuLow: number
  readonly frictionWobbleLow: number
  readonly frictionMuHigh: number
  readonly frictionWobbleHigh: number
  /** Force for anchorage checks at a dead end; after friction with the lowest credible pair. */
  readonly deadEndForce: 'jacking' | 'after-friction'
  /** Crack width aimed at in edge wedges. */
  readonly crackWidth: number
  /** Tensile strength of the concrete when it is expected to crack; null takes the 28-day mean. */
  readonly crackTensile: number | null
  readonly crackAgeDays: number | null
  /** Average compression that the engineer counts against cracking in edge wedges; 0 at edges and beside walls. */
  readonly crackCompression: number
  readonly exposure: string
  readonly restraint: string
  /** Bar sizes that a proposal may use. */
  readonly barSizes: readonly number[]
  /** Wedges whose bars differ by no more than this take one length. */
  readonly oneLengthWithin: number
  /** One length for all bars of a wedge unless it costs more than this, kg. */
  readonly oneLengthMass: number
  /** Taken off a bent bar that is made between two faces of concrete. */
  readonly bentDeduction: number
}

export interface AcceptedReading {
  readonly readingId: string
  readonly acceptedBy: string
  readonly acceptedAtMs: number
  readonly reason: string
}

export interface Level {
  readonly id: string
  readonly mark: string
  readonly title: string
}

/** A named line of the building through a point. */
export interface GridLine {
  readonly id: string
  readonly name: string
  readonly x: number
  readonly y: number
  readonly azimuth: number
}

export interface StrandType {
  readonly id: string
  readonly name: string
  readonly diameter: number
  /** Area of one strand. */
  readonly area: number
  /** Characteristic breaking load of one strand, N. */
  readonly breakingLoad: number
  /** Characteristic 0.1 % proof load of one strand, N. */
  readonly proofLoad: number
  readonly modulus: number
}

export interface Jack {
  readonly id: string
  readonly name: string
  readonly description: string
  readonly closedLength: number
  readonly stroke: number
  readonly strandTail: number
  readonly handRoom: number
  readonly bodyDiameter: number
  readonly noseDiameter: number
  readonly noseLength: number
  readonly bentNoseMax: number
  readonly sideRoom: number
  readonly roomAbove: number
}

export interface Rectangle {
  readonly width: number
  readonly height: number
}

/** A hole or duct: a circle has equal width and height and `isRound`. */
export interface Opening extends Rectangle {
  readonly isRound: boolean
}

/** One line of an approval: from this strength on, this share of the full force, with these distances. */
export interface ApprovalStrength {
  /** Share of the anchorage's full jacking force, above 0 to 1. */
  readonly share: number
  readonly strengthMin: number
  readonly spacingAlongMin: number
  readonly spacingHeightMin: number
  /** Anchor centre to the end of the edge or another face, along the edge. */
  readonly edgeAlongMin: number
  /** Anchor centre to soffit or top. */
  readonly edgeHeightMin: number
}

export interface Approval {
  readonly reference: string
  readonly strengths: readonly ApprovalStrength[]
}

/** Local steel that belongs to the hardware: as tested for its approval, or designed for a plate without one. */
export type LocalSteel = { readonly isTested: boolean } & (SpiralShape | LinksShape | HairpinShape)

export interface Hardware {
  readonly id: string
  readonly name: string
  readonly description: string
  /** How the force reaches the concrete. */
  readonly kind: 'plate' | 'bonded-splay'
  readonly ends: 'live' | 'dead' | 'both'
  readonly strandsMax: number
  readonly approval: Approval | null
  /** Plate, or the splay of a bonded dead end. */
  readonly plate: Rectangle
  /** Hole through the plate; null at a bonded dead end. */
  readonly hole: Opening | null
  readonly duct: Opening
  /** Pocket at the edge; null where there is none. */
  readonly pocket: (Rectangle & { readonly depth: number }) | null
  /** From the bearing face to the end of the anchor device, where a basis starts the spread there. */
  readonly deviceLength: number
  /** Length of the splay behind the bulbs; null for a plate. */
  readonly splayLength: number | null
  /** Transmission length, upper value (EN's lpt2); null for a plate. */
  readonly transmissionLength: number | null
  readonly spacingAlongMin: number
  readonly spacingHeightMin: number
  readonly edgeAlongMin: number
  readonly edgeHeightMin: number
  readonly straightBehindMin: number
  readonly strandTailMin: number
  readonly drawIn: number
  readonly localSteel: LocalSteel | null
  readonly jackId: string | null
}

/** A straight line of a level; chainage counts from (x, y) in the direction of the azimuth. */
export interface EdgeLine {
  readonly id: string
  readonly levelId: string
  readonly mark: string
  readonly x: number
  readonly y: number
  readonly azimuth: number
}

export interface Joint {
  readonly id: string
  readonly edgeLineId: string
  readonly kind: 'construction' | 'movement'
  readonly firstPourId: string
}

export interface Obstruction {
  readonly id: string
  readonly levelId: string
  readonly kind: 'column' | 'wall' | 'opening' | 'sleeve' | 'upstand'
  readonly mark: string
  readonly note: string
  readonly outline: readonly Point[]
  /** Cover to a column's or wall's cage; null where it has none or none is known. */
  readonly cageCover: number | null
  readonly cageBars: string
}

export interface Stage {
  readonly id: string
  readonly name: string
  /** Share of the jacking force applied by the end of this stage, above 0 to 1. */
  readonly share: number
  /** Concrete strength required before it, cylinder, MPa. */
  readonly strength: number
}

export interface Corner extends Point {
  readonly id: string
}

/** A part of the pour of another thickness. */
export interface Region {
  readonly id: string
  readonly mark: string
  readonly kind: 'edge-beam' | 'band' | 'drop' | 'fold'
  readonly outline: readonly Point[]
  readonly top: number
  readonly soffit: number
  readonly cover: number
  /** Diameter of the region's own links; 0 without. */
  readonly linkDiameter: number
}

export interface MatLayer {
  readonly id: string
  readonly face: 'top' | 'bottom'
  /** Azimuth of the bars. */
  readonly azimuth: number
  readonly diameter: number
  readonly spacing: number
  readonly isOuter: boolean
  /** Share that a named person says is spare; 0 to 1. */
  readonly spareShare: number
  readonly spareBy: string | null
}

export interface Pour {
  readonly id: string
  readonly levelId: string
  readonly mark: string
  readonly title: string
  readonly thickness: number
  readonly concrete: string
  /** Characteristic cylinder strength at 28 days. */
  readonly fck: number
  readonly aggregate: number
  readonly coverTop: number
  readonly coverSoffit: number
  readonly coverEdge: number
  /** Corners counter-clockwise, so that the slab lies left of each side. */
  readonly outline: readonly Corner[]
  readonly regions: readonly Region[]
  readonly mats: readonly MatLayer[]
  /** In order of stressing; the last has share 1. */
  readonly stages: readonly Stage[]
  /** Written before each bar mark's number. */
  readonly markPrefix: string
  readonly firstMark: number
  readonly deliveries: readonly Delivery[]
}

/** Bars that reach the site together, by the edges and pans that they are for. */
export interface Delivery {
  readonly id: string
  readonly name: string
  /** Day as ISO 8601 writes it; null where none is agreed. */
  readonly neededOn: string | null
  readonly edgeIds: readonly string[]
  readonly panIds: readonly string[]
}

export type LengthKind = 'free' | 'construction-joint' | 'movement-joint' | 'against-wall'

/** A length of an edge, in chainage of its edge line. */
export interface EdgeLength {
  readonly id: string
  readonly from: number
  readonly to: number
  readonly kind: LengthKind
  readonly top: number
  readonly soffit: number
  /** Clear room outside the edge for the jack; null where not known. */
  readonly jackClear: number | null
  readonly access: string
}

/** One side of a pour's outline: from its corner to the next. */
export interface Edge {
  readonly id: string
  readonly pourId: string
  readonly edgeLineId: string
  readonly mark: string
  readonly cornerId: string
  /** The side stands for a curved edge. */
  readonly isChord: boolean
  readonly lengths: readonly EdgeLength[]
}

/** A stressing pan: a recess with one anchor's bearing face at (x, y). */
export interface Pan {
  readonly id: string
  readonly pourId: string
  readonly mark: string
  readonly x: number
  readonly y: number
  /** Outward axis of the jack in plan. */
  readonly azimuth: number
  readonly along: number
  readonly across: number
  readonly depth: number
  readonly jackId: string | null
  readonly jackTilt: number
  readonly bentNose: number
  readonly headroom: number | null
  /** The engineer's own tie force behind the pan, N; null takes the basis's reading. */
  readonly tieBackForce: number | null
  readonly tieBackReason: string
}

export interface Tendon {
  readonly id: string
  readonly pourId: string
  readonly mark: string
  readonly strandTypeId: string
  readonly strands: number
  /** Jacking force over characteristic breaking load. */
  readonly jackingRatio: number
  readonly stressedFrom: 'one-end' | 'both-ends'
  /** Bends in plan between the two ends. */
  readonly path: readonly Point[]
  /** Plan length; null until both ends are known. */
  readonly length: number | null
  /** Total change of angle in height; null where no drape is entered. */
  readonly drape: number | null
}

export type AnchorEnd = 'live' | 'dead'

export interface Anchor {
  readonly id: string
  readonly tendonId: string
  /** An anchor stands at an edge or in a pan; exactly one is set. */
  readonly edgeId: string | null
  readonly panId: string | null
  /** Number within its edge: E6 and 3 read E6-03. */
  readonly number: number
  readonly end: AnchorEnd
  readonly hardwareId: string
  readonly castWithPourId: string
  readonly stressedWithPourId: string
  /** Along the edge line; for an anchor in a pan 0. */
  readonly chainage: number
  readonly height: number
  /** From the edge to the bearing face, or to the bulbs of a bonded dead end. */
  readonly setBack: number
  /** Outward tendon axis less outward edge normal, positive clockwise. */
  readonly skew: number
  readonly elevation: number
  /** Straight length behind the bearing face; null where not given. */
  readonly straightBehind: number | null
}
