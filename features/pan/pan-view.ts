import { ahead, barsOfPan, beside, found, jackLength, panOutline, panPlace } from '@wedgeline/engine/geometry'
import type { Check, Compared, InTheWay, LayoutIndex, PanPlace, PlacedBar, Point } from '@wedgeline/engine'

/** What the drawings of a pan show: the pan lies with its jack's axis to the right, north-up forgotten. */
export interface PanView {
  readonly place: PanPlace
  readonly bars: readonly PlacedBar[]
  /** Range along the axis from the bearing face, and to each side of it, mm. */
  readonly from: number
  readonly to: number
  readonly side: number
  readonly slab: readonly Spot[]
  readonly obstructions: readonly Body[]
  readonly otherPans: readonly Body[]
  /** What the chosen jack takes up from the bearing face, along its axis; null without a jack. */
  readonly needMm: number | null
  readonly ahead: InTheWay | null
  readonly beside: InTheWay | null
}

/** A place in the pan's own plan: along the axis, across to the left of it, mm. */
export interface Spot {
  readonly along: number
  readonly across: number
}

export interface Body {
  readonly name: string
  readonly outline: readonly Spot[]
  /** Stands above the slab, so that a jack meets it. */
  readonly isStanding: boolean
}

/** Slab shown behind the bearing face, and beyond whatever ends the drawing in front, mm; less of it on a phone. */
const BEHIND = { wide: 1500, phone: 550 }
const BEYOND = { wide: 350, phone: 200 }
const IN_FRONT_MAX = { wide: 3600, phone: 1900 }
const SIDE = { least: 620, most: 1000, beyondBars: 60 }

export function panView(index: LayoutIndex, panId: string, size: 'wide' | 'phone'): PanView {
  const place = panPlace(index, panId)
  const bars = barsOfPan(index, panId)
  const reach = Math.max(0, ...bars.flatMap(({ path }) => path.map(({ chainage }) => Math.abs(chainage))))
  const { pan, pour, jack, local } = place
  const needMm = jack ? jackLength(jack).value : null
  const half = (jack?.bodyDiameter ?? 0) / 2
  const front = ahead(index, place, half)
  const wanted = Math.max(pan.along, needMm ?? 0, front?.distance ?? 0)
  const spots = (outline: readonly Point[]) => outline.map(local)
  return {
    place,
    bars,
    from: -BEHIND[size],
    to: Math.min(wanted, Math.max(IN_FRONT_MAX[size], needMm ?? 0)) + BEYOND[size],
    side: Math.max(SIDE.least, pan.across / 2 + 400, Math.min(SIDE.most, reach + SIDE.beyondBars)),
    slab: spots(pour.outline),
    obstructions: index.layout.obstructions
      .filter(({ levelId }) => levelId === pour.levelId)
      .map(({ kind, mark, outline }) => ({
        name: `${kind} ${mark}`,
        outline: spots(outline),
        isStanding: kind === 'wall' || kind === 'column' || kind === 'upstand',
      })),
    otherPans: (index.pansOfPour.get(pour.id) ?? [])
      .filter(({ id }) => id !== panId)
      .map((other) => ({ name: other.mark, outline: spots(panOutline(other)), isStanding: false })),
    needMm,
    ahead: front,
    beside: jack && needMm !== null ? beside(index, place, { half, length: needMm * Math.cos(pan.jackTilt) }) : null,
  }
}

/** The pan's tendon by its mark; empty where no live anchor stands in it. */
export const tendonMark = (index: LayoutIndex, { at }: PanPlace): string =>
  at ? found(index.tendons, at.tendon.id, 'tendon').mark : ''

/** One comparison of a pan by its name. */
export const comparedBy = (checks: readonly Check[], name: string): Compared | null =>
  checks.find((check): check is Compared => check.kind === 'compared' && check.name === name) ?? null
