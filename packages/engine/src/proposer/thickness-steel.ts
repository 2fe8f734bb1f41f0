/** Steel that crosses the horizontal plane behind an anchor: hairpins that stand upright, links, spirals. */

import type { Window } from '../bases/basis'
import type { HairpinShape, LinksShape, SpiralShape, SteelKind, SteelShape } from '../model'
import type { BarSize } from '../schedule/bar-standards'
import { area, downTo, upTo } from './candidate'

export interface ThicknessNeed {
  /** Area that is missing in the window, mm2. */
  readonly short: number
  readonly window: Window
  /** From the anchor's centre to the nearer cover, above or below, mm. */
  readonly toCover: number
  readonly plate: { readonly width: number; readonly height: number }
  /** Section depth at the anchor. */
  readonly depth: number
  /** Local steel that the hardware brings: its kind stays as it is, for steel of that kind would take its place. */
  readonly local: SteelShape | null
  readonly sizes: readonly BarSize[]
  readonly clearGap: number
  /** Taken off a bent bar between two faces of concrete. */
  readonly deduction: number
  readonly legOf: (diameter: number) => number
}

/** Bars behind a slab anchor are bent by hand into small shapes: larger ones are not (common practice). */
const DIAMETER_MAX = 16
const STEP = 5
const PITCH_STEP = 5
const LEG_STEP = 25
/** First link behind the plate (common practice: not more than 40 to 50). */
const FIRST_LINK = 30
const LINK_PITCHES = [50, 75, 100] as const
const MORE_LINKS = [0, 1, 2, 3, 4] as const
/** Beyond the plate on either side (common practice). */
const BESIDE_PLATE = [40, 20, 0] as const
const SPIRAL_PITCHES = [40, 50, 60] as const
/** A spiral fits a plate that is nearly square. */
const SQUARE_RATIO_MAX = 1.5

export type ThicknessSet = HairpinShape | LinksShape | SpiralShape

export function thicknessSets(need: ThicknessNeed): ThicknessSet[] {
  const sizes = need.sizes.filter(({ diameter }) => diameter <= DIAMETER_MAX)
  const isFree = (kind: SteelKind): boolean => need.local?.kind !== kind
  return sizes.flatMap((size) => [
    ...(isFree('links') ? links(need, size) : []),
    ...(isFree('spiral') ? spirals(need, size.diameter) : []),
    ...(isFree('hairpins') ? hairpins(need, size) : []),
  ])
}

/** Outside height between the covers, centred on the anchor. */
const heightOf = ({ toCover, deduction }: ThicknessNeed): number => downTo(2 * toCover - deduction, STEP)

/** Inside upright hairpins that the hardware brings, links stand between their legs. */
const linkHeights = (need: ThicknessNeed): number[] =>
  need.local?.kind === 'hairpins'
    ? [heightOf(need), downTo(need.local.bend - 2 * need.local.diameter, STEP)]
    : [heightOf(need)]

function links(need: ThicknessNeed, { diameter, linkEndMin }: BarSize): LinksShape[] {
  const hook = upTo(linkEndMin, STEP)
  const inside = Math.ceil(need.short / (2 * area(diameter)) - 1e-9)
  return linkHeights(need)
    .filter((height) => height >= hook)
    .flatMap((height) =>
      BESIDE_PLATE.flatMap((beside) =>
        setsOfLinks(need, inside).flatMap(({ pitch, count }): LinksShape[] => {
          const width = Math.max(upTo(need.plate.width + 2 * beside, 10), hook)
          // At its closing corner the hook of a link lies beside it and takes one bar more of the gap.
          const isTight = pitch - 2 * diameter < need.clearGap
          if (isTight) return []
          return [{ kind: 'links', diameter, width, height, hook, count, first: FIRST_LINK, pitch }]
        }),
      ),
    )
}

/** As many links as the window asks for at each pitch, and more of them, which run on into the window in plan. */
const setsOfLinks = ({ window }: ThicknessNeed, inside: number) =>
  LINK_PITCHES.flatMap((pitch) => {
    const before = Math.max(0, Math.ceil((window.from - FIRST_LINK) / pitch))
    const last = FIRST_LINK + (before + inside - 1) * pitch
    return last > window.to ? [] : MORE_LINKS.map((more) => ({ pitch, count: before + inside + more }))
  })

function spirals(need: ThicknessNeed, diameter: number): SpiralShape[] {
  const { width, height } = need.plate
  if (Math.max(width, height) > SQUARE_RATIO_MAX * Math.min(width, height)) return []
  const outside = Math.min(heightOf(need), upTo(Math.max(width, height) + 20, STEP))
  if (outside <= Math.max(width, height) || outside < 12 * diameter) return []
  return SPIRAL_PITCHES.flatMap((pitch) => {
    if (pitch - diameter < need.clearGap) return []
    const inside = Math.ceil(need.short / (2 * area(diameter)) - 1e-9)
    // Turns stand at half a pitch and on; one flat turn closes each end.
    const before = Math.max(0, Math.ceil(need.window.from / pitch - 0.5))
    const turns = before + inside
    if ((turns - 0.5) * pitch > need.window.to) return []
    return [{ kind: 'spiral', diameter, outside, pitch, turns: turns + 2, flatTurns: 2, first: 0 } as const]
  })
}

/** Two heights: against the covers, and inside the links that the hardware brings. */
function hairpins(need: ThicknessNeed, { diameter, betweenBendsMin, endMin, bendRadius }: BarSize): HairpinShape[] {
  const count = Math.ceil(need.short / area(diameter) - 1e-9)
  const pitch = upTo(diameter + need.clearGap, PITCH_STEP)
  const reach = need.plate.width / 2 + need.depth / 2
  if (((count - 1) * pitch) / 2 > reach) return []
  const inner = need.local?.kind === 'links' ? [downTo(need.local.height - 2 * need.local.diameter, STEP)] : []
  const leg = upTo(Math.max(need.legOf(diameter) + bendRadius + diameter, endMin), LEG_STEP)
  return [heightOf(need), ...inner]
    .filter((bend) => bend >= betweenBendsMin)
    .flatMap((bend) =>
      firstBends(need, diameter).map((first) => ({
        kind: 'hairpins',
        diameter,
        leg,
        bend,
        count,
        lies: 'upright',
        first,
        pitch,
      })),
    )
}

/** Places of the bend in the window, where the tension is largest first; clear of the hardware's links. */
function firstBends({ window, local, clearGap }: ThicknessNeed, diameter: number): number[] {
  const middle = upTo(window.from + 0.25 * (window.to - window.from), STEP)
  const behindLinks =
    local?.kind === 'links'
      ? upTo(local.first + (local.count - 1) * local.pitch + local.diameter + clearGap, STEP)
      : null
  const places = behindLinks === null || behindLinks === middle ? [middle] : [middle, behindLinks]
  return places.filter((first) => first + diameter / 2 >= window.from && first + diameter / 2 <= window.to)
}
