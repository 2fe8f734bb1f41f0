/** Candidates of steel behind one anchor: through the thickness, in plan, or both. */

import { siteOfAnchor, type AnchorSite } from '../anchor-site'
import type { Window } from '../bases/basis'
import { found } from '../layout-index'
import type { Stage, SteelShape } from '../model'
import type { Compared, Zone } from '../result'
import { sectionBehind } from '../section'
import { sectionStepNear } from '../section-step'
import { bondPlace } from '../steel/bond'
import { countPlaceOf } from '../steel/count-place'
import { contextWith, isFixable, perBench, type Bench, type Place } from './bench'
import type { Candidate } from './candidate'
import { thicknessSets, type ThicknessNeed, type ThicknessSet } from './thickness-steel'
import { transverseBars, transverseSets, type StraightBar, type TransverseNeed } from './transverse-bars'
import { needsOf, unmetOf } from './verdict'

/** Sets through the thickness that are joined with bars in plan: the lightest of them. */
const THICKNESS_KEPT = { links: 12, hairpins: 4, spiral: 4 } as const

/** A step of the section this near may stand in the way of bars of one of the faces, mm. */
const STEP_REACH = 2000

export interface AnchorSteel {
  readonly candidates: readonly Candidate[]
  /** Bars in plan that would suit this anchor, for others to share. */
  readonly bars: readonly StraightBar[]
}

/** @param shared bars in plan that other anchors would like; tried beside the anchor's own. */
export function anchorSteel(bench: Bench, place: Place, shared: readonly StraightBar[]): AnchorSteel {
  const site = siteOf(bench, place.zone)
  if (!site) return { candidates: [], bars: [] }
  const { sets, isBlocked } = uprightSets(bench, place)
  if (isBlocked) return { candidates: sets.map((shapes) => ({ shapes })), bars: [] }
  const made = sets.map((shapes) => ({ shapes, ...planPart(bench, place, { site, shapes, shared }) }))
  return {
    candidates: made.flatMap(({ shapes, sets }) => sets.map((set) => ({ shapes: [...shapes, ...set] }))),
    bars: made.flatMap(({ bars }) => bars),
  }
}

interface Upright {
  readonly sets: readonly SteelShape[][]
  /** None of them can be fixed. */
  readonly isBlocked: boolean
}

/** Steel through the thickness, as far as it is asked for, by itself. */
const uprightSets = perBench((bench, place): Upright => {
  const site = siteOf(bench, place.zone)
  const need = unmetOf(needsOf(bench.context, place.zone)).find(({ plane }) => plane === 'thickness')
  return site && need
    ? lightest(bench, place, thicknessSets(thicknessNeed(bench, site, need)))
    : { sets: [[]], isBlocked: false }
})

/** The surroundings of an anchor; null for any other zone. */
export function siteOf({ context: { index } }: Bench, { kind, id }: Zone): AnchorSite | null {
  return kind === 'anchor' ? siteOfAnchor(index, found(index.anchors, id.slice('anchor:'.length), 'anchor')) : null
}

/** The lightest of each kind that can be fixed; where none can, the lightest one, for its reason to be named. */
function lightest(bench: Bench, place: Place, sets: readonly ThicknessSet[]): Upright {
  const ordered = sets.map((shape, at) => ({ shape, at, mass: bench.roughly([shape]) }))
  ordered.sort((a, b) => a.mass - b.mass || a.at - b.at)
  const kept: SteelShape[][] = []
  const counts = new Map<string, number>()
  for (const { shape } of ordered) {
    const count = counts.get(shape.kind) ?? 0
    if (count >= THICKNESS_KEPT[shape.kind] || !isFixable(bench, place, [shape])) continue
    counts.set(shape.kind, count + 1)
    kept.push([shape])
  }
  const isBlocked = kept.length === 0
  const named = ordered.slice(0, THICKNESS_KEPT.hairpins).map(({ shape }) => [shape])
  return { sets: isBlocked ? named : kept, isBlocked }
}

/** Bars in plan beside what already stands upright, which may count in plan as well. */
function planPart(
  bench: Bench,
  place: Place,
  of: { readonly site: AnchorSite; readonly shapes: readonly SteelShape[]; readonly shared: readonly StraightBar[] },
): { readonly sets: readonly SteelShape[][]; readonly bars: readonly StraightBar[] } {
  const context = of.shapes.length > 0 ? contextWith(bench, place, of.shapes) : bench.context
  const plan = unmetOf(needsOf(context, place.zone)).find((need) => need.plane === 'plan')
  const need = plan && planNeed(bench, of.site, plan)
  if (!need) return { sets: [[]], bars: [] }
  const own = transverseBars(need)
  const sets = unique([...own, ...of.shared]).flatMap((bar) => transverseSets(need, bar))
  return { sets: sets.map((set) => [set]), bars: own }
}

export function unique(bars: readonly StraightBar[]): StraightBar[] {
  return [...new Map(bars.map((bar) => [`${bar.diameter}x${bar.length}`, bar])).values()]
}

// Needs -------------------------------------------------------------------------------------------------------------

/** The prism that a need was worked out with: its step `b`. */
const prismOf = ({ steps }: Compared): number | null => steps.find(({ symbol }) => symbol === 'b')?.value ?? null

/** The basis's window behind a plate; behind a bonded end the check's own, which ends at its step `xTo`. */
function windowOf({ context: { basis } }: Bench, { steps }: Compared, b: number): Window {
  const to = steps.find(({ symbol }) => symbol === 'xTo')?.value
  return to === undefined ? basis.window(b) : { from: 0, to }
}

const shortOf = ({ demand, limit }: Compared): number => Math.max(0, demand - limit)

const stageOf = ({ pour }: AnchorSite, need: Compared): Stage | undefined =>
  pour.stages.find(({ name }) => name === need.stage) ?? pour.stages.at(-1)

/** What bars in plan must do at an anchor; null where its check does not say with which prism it was worked out. */
export function planNeed(bench: Bench, site: AnchorSite, need: Compared): TransverseNeed | null {
  const b = prismOf(need)
  const short = shortOf(need)
  if (b === null || short <= 0) return null
  return {
    short,
    window: windowOf(bench, need, b),
    developed: developedAt(bench, site, need),
    sizes: bench.sizes.map(({ diameter }) => diameter),
    plateWidth: site.hardware.plate.width,
    aside: 0,
    toEnd: Math.min(site.toStart ?? Infinity, site.toEnd ?? Infinity) - coverInside(site),
    layers: sectionStepNear(site, STEP_REACH) === null ? ['both'] : ['both', 'top', 'bottom'],
    clearGap: clearGapOf(bench, site),
  }
}

/** Cover of bar ends at a side of the concrete, inside a region's links. */
function coverInside({ pour, frame, anchor }: AnchorSite): number {
  const { coverEdge, linkDiameter } = sectionBehind(pour, { frame, chainage: anchor.chainage, depth: anchor.setBack })
  return coverEdge + linkDiameter
}

function thicknessNeed(bench: Bench, site: AnchorSite, need: Compared): ThicknessNeed {
  const { frame, pour, anchor, hardware } = site
  const { settings } = bench.context.index.layout.job
  const section = sectionBehind(pour, { frame, chainage: anchor.chainage, depth: anchor.setBack })
  const toCover = Math.min(site.toTop - section.coverTop, site.toSoffit - section.coverSoffit) - section.linkDiameter
  const developed = developedAt(bench, site, need)
  return {
    short: shortOf(need),
    window: windowOf(bench, need, prismOf(need) ?? site.top - site.soffit),
    toCover,
    plate: hardware.plate,
    depth: site.top - site.soffit,
    local: hardware.localSteel,
    sizes: bench.sizes,
    clearGap: clearGapOf(bench, site),
    deduction: settings.bentDeduction,
    legOf: (diameter) => developed(diameter).length,
  }
}

/** Aggregate must pass: the basis's gap for the thinnest bar, not less than the job's own. */
const clearGapOf = ({ context: { basis }, clearGap }: Bench, { pour }: AnchorSite): number =>
  Math.max(clearGap, basis.clearGap({ diameter: 0, aggregate: pour.aggregate }).value)

function developedAt(bench: Bench, site: AnchorSite, need: Compared): TransverseNeed['developed'] {
  const { basis } = bench.context
  const b = prismOf(need) ?? site.top - site.soffit
  const a = need.plane === 'plan' ? site.hardware.plate.width : site.hardware.plate.height
  const { stress } = basis.tie({ P: site.force.value, a: Math.min(a, b / 2), b })
  const strength = stageOf(site, need)?.strength ?? site.pour.fck
  const place = countPlaceOf(site)
  const isGoodBond = (diameter: number) => basis.isGoodBond(bondPlace(place, { layers: 'both', diameter }))
  return (diameter) =>
    basis.anchorage({ diameter, strength, stress, cd: null, isGoodBond: isGoodBond(diameter), isBent: false })
}
