import type { Clause } from '../step'
import type { DimensionName, ShapeLimit, ShapeValues } from './bar-standards'

/** Limits on the dimensions of bent bars: BS 8666:2005, Tables 2 and 3; the editions share them. */

const TABLE_2: Clause = { source: 'BS 8666:2005', section: 'Table 2', tag: 'digest' }
const TABLE_3: Clause = { source: 'BS 8666:2005', section: 'Table 3', tag: 'digest' }
const FROM_RADIUS: Clause = { source: 'BS 8666:2005', section: 'Table 2, from the bend radius', tag: 'derived' }

type Bound = ShapeLimit['bound']

/** A dimension that must be a bound (mm) or more; Table 3. */
export const atLeast = (field: DimensionName, bound: Bound, because: string): ShapeLimit => ({
  field,
  side: 'at-least',
  bound,
  because,
  otherwise: '',
  clause: TABLE_3,
})

/** A dimension that must be a bound (mm) or less; Table 3. */
export const atMost = (field: DimensionName, bound: Bound, because: string): ShapeLimit => ({
  field,
  side: 'at-most',
  bound,
  because,
  otherwise: '',
  clause: TABLE_3,
})

const by = (clause: Clause, limit: ShapeLimit): ShapeLimit => ({ ...limit, clause })

/** The end past a bend: P of Table 2 or more. */
export const endAtLeast = (field: DimensionName): ShapeLimit =>
  by(
    TABLE_2,
    atLeast(field, (v) => v.size.endMin, 'the shortest end past a bend'),
  )

/** Overall between two bends: the smallest of Table 2 or more. */
export const betweenBends = (field: DimensionName): ShapeLimit =>
  by(
    TABLE_2,
    atLeast(field, (v) => v.size.betweenBendsMin, 'the shortest overall dimension between two bends'),
  )

const twoBends = (v: ShapeValues): number => 2 * (v.size.bendRadius + v.size.diameter)

const FULL_CIRCLE = 'twice the bend radius and bar'
export const ringOutside = by(FROM_RADIUS, atLeast('A', twoBends, FULL_CIRCLE))

/** A semicircle's width and the end that runs on from it. */
export const semicircle = (width: DimensionName, end: DimensionName): readonly ShapeLimit[] => [
  atLeast(width, twoBends, FULL_CIRCLE),
  endAtLeast(end),
  atLeast(end, (v) => (v.dimensions[width] ?? 0) / 2 + 5 * v.size.diameter, `5 d past the semicircle of ${width}`),
]

const LINK_REMEDY = ' Otherwise use links of a smaller bar, or pairs of hairpins (21).'
/**
 * Hooks C = D may be no longer than a side, and no shorter than P for links: so both sides must be P or more. Reported
 * on the side, where the mend is, and on the hook only when the hook itself is too long.
 */
const linkSide = (field: 'A' | 'B'): ShapeLimit => ({
  ...atLeast(field, (v) => v.size.linkEndMin, 'a hook may not be longer than a side, and the shortest hook is as long'),
  otherwise: LINK_REMEDY,
})

export const equalHooks: readonly ShapeLimit[] = [
  atLeast('D', (v) => v.dimensions.C ?? 0, 'both hooks are of one length'),
  atMost('D', (v) => v.dimensions.C ?? 0, 'both hooks are of one length'),
]

export const closedLinkLimits: readonly ShapeLimit[] = [
  linkSide('A'),
  linkSide('B'),
  by(
    TABLE_2,
    atLeast('C', (v) => v.size.linkEndMin, 'the shortest hook of a link'),
  ),
  atMost(
    'C',
    (v) => Math.max(v.size.linkEndMin, Math.min(v.dimensions.A ?? 0, v.dimensions.B ?? 0)),
    'a hook may not be longer than a side',
  ),
  ...equalHooks,
]

export const largeRadiusLimits: readonly ShapeLimit[] = [
  atLeast('A', (v) => (v.dimensions.R ?? 0) + 6 * v.size.diameter, 'the radius and 6 d'),
  atLeast('B', (v) => (v.dimensions.R ?? 0) + 6 * v.size.diameter, 'the radius and 6 d'),
  by(
    TABLE_2,
    atLeast('R', (v) => v.size.bendRadius, 'the smallest bend radius'),
  ),
]

export const helixLimits: readonly ShapeLimit[] = [
  ringOutside,
  by(
    FROM_RADIUS,
    atLeast('B', (v) => v.size.diameter, 'turns at a smaller pitch would lie in one another'),
  ),
  by(
    FROM_RADIUS,
    atLeast('C', () => 1, 'a helix has a turn or more'),
  ),
]

/** A crank's sloping length is longer than the offset that it makes. */
export const crankLimits: readonly ShapeLimit[] = [
  atMost('D', (v) => v.dimensions.B ?? 0, 'the offset of a crank is not more than its sloping length'),
]
