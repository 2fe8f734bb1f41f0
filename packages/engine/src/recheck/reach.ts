/** How far from a change a check can feel it: never less than what the families look at. */

import type { Layout, Steel, SteelShape } from '../model'

export interface Reaches {
  /** Along the edge, between anchors and between their bodies and bars, mm. */
  readonly along: number
  /** In plan between two members: twice the longest that anything reaches from where it stands, mm. */
  readonly inPlan: number
  /** Along the edge to a gap, beside `gapShare` of its own width: plates, bonds and set-backs, mm. */
  readonly gapBase: number
  readonly gapShare: number
}

/** Past which a tendon's skew is taken to reach along the edge as far as one likes, rad. */
const MUCH_SKEW = 0.6

/** Upper transmission length where neither hardware nor anything else says less, mm. */
const LONG_BOND = 3000

/** The larger of what the layout asked for before an edit and after it. */
export function reachesOf(before: Layout, after: Layout): Reaches {
  const [one, other] = [reachesIn(before), reachesIn(after)]
  return {
    along: Math.max(one.along, other.along),
    inPlan: Math.max(one.inPlan, other.inPlan),
    gapBase: Math.max(one.gapBase, other.gapBase),
    gapShare: Math.max(one.gapShare, other.gapShare),
  }
}

function reachesIn(layout: Layout): Reaches {
  const skew = most(layout.anchors, (anchor) => Math.abs(anchor.skew))
  const sine = Math.sin(Math.min(skew, Math.PI / 2))
  const [behind, aside] = [behindOf(layout), asideOf(layout)]
  const spacing = most(layout.hardware, ({ spacingAlongMin, approval, plate, pocket }) =>
    Math.max(
      spacingAlongMin,
      3 * plate.width,
      (pocket?.width ?? 0) + layout.job.settings.pocketToPocketMin,
      ...(approval?.strengths ?? []).map((line) => line.spacingAlongMin),
    ),
  )
  const bond = most(layout.hardware, ({ kind, transmissionLength }) =>
    kind === 'plate' ? 0 : (transmissionLength ?? LONG_BOND),
  )
  const setBack = most(layout.anchors, (anchor) => anchor.setBack)
  const lean = skew < MUCH_SKEW ? Math.tan(Math.PI / 4 + skew) : Infinity
  const plate = most(layout.hardware, ({ plate: { width }, deviceLength }) => width + deviceLength)
  return {
    along: Math.max(spacing, 2 * (aside + sine * behind)) + 100,
    inPlan: 2 * (behind + aside) + 500,
    gapBase: plate + (bond + setBack) * lean + 100,
    gapShare: 1.6 * lean,
  }
}

/** Of anything from its edge inwards. */
function behindOf({ anchors, hardware, steel }: Layout): number {
  const bodies = most(hardware, ({ straightBehindMin, splayLength, pocket }) =>
    Math.max(straightBehindMin, splayLength ?? 0, pocket?.depth ?? 0),
  )
  const straight = most(anchors, ({ straightBehind, setBack }) => (straightBehind ?? bodies) + setBack)
  const local = most(hardware, ({ localSteel }) => (localSteel ? behindOfShape(localSteel) : 0))
  const setBack = most(anchors, (anchor) => anchor.setBack)
  return Math.max(
    straight,
    bodies + setBack,
    local + setBack,
    most(steel, ({ shape }) => behindOfShape(shape)) + setBack,
  )
}

/** To either side of the anchor or gap that it belongs to. */
function asideOf({ hardware, steel }: Layout): number {
  return Math.max(
    most(hardware, ({ plate, pocket, localSteel }) =>
      Math.max(plate.width / 2, (pocket?.width ?? 0) / 2, localSteel ? asideOfShape(localSteel) : 0),
    ),
    most(steel, ({ shape }: Steel) => asideOfShape(shape)),
  )
}

function behindOfShape(shape: SteelShape): number {
  switch (shape.kind) {
    case 'spiral':
      return shape.first + shape.turns * shape.pitch
    case 'links':
    case 'transverse-bars':
      return shape.first + shape.count * shape.pitch
    case 'hairpins':
      return shape.first + shape.leg
    case 'edge-bars':
      return shape.first + Math.max(shape.countTop, shape.countBottom) * shape.pitch
    case 'wedge-bars':
      return shape.length
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return shape.length + shape.count * shape.pitch
  }
}

function asideOfShape(shape: SteelShape): number {
  switch (shape.kind) {
    case 'spiral':
      return shape.outside / 2
    case 'links':
      return shape.width / 2
    case 'transverse-bars':
      return shape.length / 2
    case 'hairpins':
      return shape.bend / 2 + (shape.count * shape.pitch) / 2
    case 'edge-bars':
    case 'wedge-bars':
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return 0
  }
}

function most<T>(rows: readonly T[], of: (row: T) => number): number {
  let value = 0
  for (const row of rows) value = Math.max(value, of(row))
  return value
}
