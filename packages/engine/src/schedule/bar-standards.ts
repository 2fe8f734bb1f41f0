import type { Clause, Step } from '../step'

/** Columns of dimensions on a schedule; E and R share one. */
export const DIMENSION_NAMES = ['A', 'B', 'C', 'D', 'E', 'R'] as const
export type DimensionName = (typeof DIMENSION_NAMES)[number]

/** Outside dimensions in mm. In a helix (77) A is the outside diameter, B the pitch and C a number of turns. */
export type Dimensions = Readonly<Partial<Record<DimensionName, number>>>

/** One bar before it has a mark. */
export interface BarShape {
  readonly code: string
  readonly diameter: number
  readonly dimensions: Dimensions
  /** Cut length typed beside a drawn shape (99); null for every other shape. */
  readonly typedLength: number | null
  /** Turns of a helix that lie flat; they are part of C. 0 elsewhere. */
  readonly flatTurns: number
}

/** What a standard says of one bar size; mm, mm2 and kg/m. */
export interface BarSize {
  readonly diameter: number
  readonly isPreferred: boolean
  readonly area: number
  readonly massPerMetre: number
  /** Smallest inside radius of a bend. */
  readonly bendRadius: number
  readonly formerDiameter: number
  /** Smallest end length P past a bend, in general and for the hooks of links. */
  readonly endMin: number
  readonly linkEndMin: number
  /** Smallest overall dimension between two bends. */
  readonly betweenBendsMin: number
}

/** What limits and lengths are computed from: the dimensions given and the data of the size. */
export interface ShapeValues {
  readonly dimensions: Dimensions
  readonly size: BarSize
}

export interface ShapeLimit {
  readonly field: DimensionName
  readonly side: 'at-least' | 'at-most'
  readonly bound: (values: ShapeValues) => number
  /** Why, in trade words; it follows a colon. */
  readonly because: string
  /** What else would be right, beside changing the dimension. */
  readonly otherwise: string
  readonly clause: Clause
}

export interface ShapeRule {
  readonly code: string
  readonly title: string
  /** Dimensions that must be given. */
  readonly needs: readonly DimensionName[]
  /** Dimensions that may be given: they fix an angle or repeat another one and are not part of the length. */
  readonly also: readonly DimensionName[]
  /** The dimension that takes up the tolerance; null where there is none. */
  readonly free: DimensionName | null
  /** The cut length as the standard's formula; null for a drawn shape, whose length is typed. */
  readonly length: ((values: ShapeValues) => Step) | null
  readonly limits: readonly ShapeLimit[]
}

/** A standard for bar schedules, one edition of it. */
export interface BarStandard {
  readonly id: string
  readonly name: string
  readonly sizes: readonly BarSize[]
  readonly shapes: readonly ShapeRule[]
  /** Dimensions are rounded to the nearest of these, lengths up to the next. */
  readonly dimensionStep: number
  readonly lengthStep: number
  readonly roundingClause: Clause
  /** What the schedule must say about where its tables come from. Whole sentences. */
  readonly provenance: readonly string[]
}

export interface ShapeProblem {
  /** Dimension, or code, diameter, length. */
  readonly field: string
  readonly severity: 'error' | 'warning'
  /** What is wrong and what would be right. */
  readonly message: string
}

/** A bar size by its nominal diameter, mm; undefined where the standard does not list it. */
export const sizeOf = (standard: BarStandard, diameter: number): BarSize | undefined =>
  standard.sizes.find((size) => size.diameter === diameter)

/** A shape's rule by its code; undefined where the standard does not list it. */
export const shapeRuleOf = (standard: BarStandard, code: string): ShapeRule | undefined =>
  standard.shapes.find((rule) => rule.code === code)
