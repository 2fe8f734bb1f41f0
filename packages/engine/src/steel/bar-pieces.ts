/** Long straight bars as the yard delivers them: pieces within the stock length, with their laps. */

import type { AnchorageInput, Basis } from '../bases/basis'
import { found, type LayoutIndex } from '../layout-index'
import type { EdgeBarsShape, Pour } from '../model'
import { edgeBars } from '../placed/along-edge'
import { sectionBehind, type Section } from '../section'
import { bondPlace, type Layers } from './bond'
import { cutRun, lapsOf, type Cut, type Run, type Span } from './cut-run'
import { handSteelOf } from './steel-of-anchor'

export interface BarPiece extends Span {
  readonly layer: 'top' | 'bottom'
  /** Which bar of its layer, from the slab edge inwards; 0 is the first. */
  readonly bar: number
}

export interface BarPieces {
  /** In chainage of the edge line for edge bars; along the bar, from its end, for others. */
  readonly pieces: readonly BarPiece[]
  readonly laps: readonly BarPiece[]
  /** Lap length asked for, mm: the longest of the parts that are lapped; null where none is. */
  readonly lapNeeded: number | null
  /** Share of a layer's bars that are lapped at one section. */
  readonly share: number
  /** Least distance of a lap from an anchor's plate or local steel; below 0 it lies over one. */
  readonly clearance: number
  /** Whole sentences for whoever reads the schedule. */
  readonly notes: readonly string[]
}

interface Counts {
  readonly countTop: number
  readonly countBottom: number
}

interface EdgeBars {
  readonly shape: EdgeBarsShape
  readonly edgeId: string
}

/** Pieces are laid out in steps; what a lap asks for is taken up to the next of these. */
const LAP_STEP = 5

/**
 * The pieces of a set of edge bars: cut where the edge's top or soffit steps, and split at the job's stock length with
 * laps of the basis, every second bar the other way round, clear of plates, spirals and links.
 */
export function edgeBarPieces(index: LayoutIndex, basis: Basis, { shape, edgeId }: EdgeBars): BarPieces {
  const frame = found(index.frames, edgeId, 'edge')
  const pour = found(index.pours, found(index.edges, edgeId, 'edge').pourId, 'pour')
  const [from, to] = [Math.min(shape.from, shape.to), Math.max(shape.from, shape.to)]
  const keepClear = anchorBodies(index, edgeId)
  const parts = new Map<string, Part>()
  const runs = edgeBars({ ...shape, from, to }, { pour, frame }).map(({ layer: face, path }): LaidPart => {
    const layer = face === 'top' ? 'top' : 'bottom'
    const [start, end] = [path[0]?.chainage ?? from, path.at(-1)?.chainage ?? to]
    const input = edgeBarInput(index, basis, { shape, edgeId, at: (start + end) / 2, layer, beside: 2 })
    const lapOf = (share: number) => basis.lap(input, share)
    const key = `${start} to ${end}, ${input.isGoodBond}`
    const part = parts.get(key) ?? partOf({ from: start, to: end, keepClear }, { counts: shape, lapOf, index, basis })
    parts.set(key, part)
    const bar = shape.pitch > 0 ? Math.round(((path[0]?.depth ?? shape.first) - shape.first) / shape.pitch) : 0
    return { layer, bar, part }
  })
  const steps = frame.steps.filter((at) => at > from && at < to)
  const stepNote =
    steps.length > 0 ? [`Cut where the edge steps, at chainage ${steps.map(Math.round).join(', ')}.`] : []
  const made = assembled(shape, runs, index)
  return { ...made, notes: [...stepNote, ...made.notes] }
}

interface LongBars extends Counts {
  readonly diameter: number
  readonly length: number
  readonly pour: Pour
}

/** The pieces of other straight bars that are longer than the stock length; nothing is known of what they must clear. */
export function straightBarPieces(index: LayoutIndex, basis: Basis, bars: LongBars): BarPieces {
  const { diameter, length, pour } = bars
  const goodBondIn = (layers: Layers) =>
    basis.isGoodBond(bondPlace({ ...pour, depth: pour.thickness }, { layers, diameter }))
  const partIn = (layers: Layers) => {
    const input = { ...developed(basis, pour), diameter, cd: null, isGoodBond: goodBondIn(layers) }
    const lapOf = (share: number) => basis.lap(input, share)
    return partOf({ from: 0, to: length, keepClear: [] }, { counts: bars, lapOf, index, basis })
  }
  const top = partIn('top')
  const parts = { top, bottom: goodBondIn('top') === goodBondIn('bottom') ? top : partIn('bottom') }
  const runs = (['top', 'bottom'] as const).flatMap((layer) => {
    const count = layer === 'top' ? bars.countTop : bars.countBottom
    return Array.from({ length: count }, (_, bar) => ({ layer, bar, part: parts[layer] }))
  })
  return assembled(bars, runs, index)
}

/** Strength when the whole force acts first, and the stress of a bar that is used in full. */
export function developed(basis: Basis, pour: Pour): Pick<AnchorageInput, 'strength' | 'stress' | 'isBent'> {
  return { strength: pour.stages.at(-1)?.strength ?? pour.fck, stress: basis.barStress, isBent: false }
}

interface EdgeLap extends EdgeBars {
  /** Chainage at which the section is looked at. */
  readonly at: number
  readonly layer: BarPiece['layer']
  /** Bars that lie side by side at each place: 2 where they are lapped, 1 elsewhere. */
  readonly beside: 1 | 2
}

/** What anchorage and laps of the edge bars of a layer are worked out from. */
export function edgeBarInput(index: LayoutIndex, basis: Basis, of: EdgeLap): AnchorageInput {
  const { shape, edgeId, at, layer, beside } = of
  const edge = found(index.edges, edgeId, 'edge')
  const pour = found(index.pours, edge.pourId, 'pour')
  const section = sectionBehind(pour, { frame: found(index.frames, edgeId, 'edge'), chainage: at, depth: shape.first })
  const covered = { ...section, depth: section.top - section.soffit }
  return {
    ...developed(basis, pour),
    diameter: shape.diameter,
    cd: coverAndGap(shape, section, beside),
    isGoodBond: basis.isGoodBond(bondPlace(covered, { layers: layer, diameter: shape.diameter })),
  }
}

/** Smallest of cover, side cover and half the clear gap. */
function coverAndGap(shape: EdgeBarsShape, section: Section, beside: number): number {
  const { diameter, first, pitch } = shape
  const cover = Math.min(section.coverTop, section.coverSoffit) + section.linkDiameter
  const hasNeighbour = Math.max(shape.countTop, shape.countBottom) > 1
  const halfGap = hasNeighbour ? (pitch - beside * diameter) / 2 : Infinity
  return Math.max(0, Math.min(cover, first - diameter / 2, halfGap))
}

/** Along the edge, the width of every anchor's plate, spiral and links. */
function anchorBodies(index: LayoutIndex, edgeId: string): readonly Span[] {
  return (index.anchorsOfEdge.get(edgeId) ?? []).map((anchor) => {
    const { plate, localSteel } = found(index.hardware, anchor.hardwareId, 'hardware')
    const widths = [...(localSteel ? [localSteel] : []), ...handSteelOf(index, anchor.id)].map((shape) => {
      if (shape.kind === 'spiral') return shape.outside
      return shape.kind === 'links' ? shape.width : 0
    })
    const half = Math.max(plate.width, ...widths) / 2
    return { from: anchor.chainage - half, to: anchor.chainage + half }
  })
}

// Parts -------------------------------------------------------------------------------------------------------------

/** One length of bar between two ends or steps. */
interface Part {
  /** Null where no lap fits: the bar stays whole and is longer than the stock length. */
  readonly cut: Cut | null
  readonly lap: number
  readonly share: number
  readonly from: number
  readonly to: number
}

/** Half of a layer's bars are lapped at one section where every second one is turned round. */
const staggeredShare = ({ countTop, countBottom }: Counts): number =>
  Math.max(...[countTop, countBottom].filter((count) => count > 0).map((count) => Math.ceil(count / 2) / count), 0.5)

interface PartInput {
  readonly counts: Counts
  readonly lapOf: (share: number) => number
  readonly index: LayoutIndex
  readonly basis: Basis
}

/** Cut with the laps of staggered bars; where they cannot be staggered, again with all of them lapped at one section. */
function partOf(span: Pick<Run, 'from' | 'to' | 'keepClear'>, { counts, lapOf, index, basis }: PartInput): Part {
  const { stockLength } = index.layout.job.settings
  const several = counts.countTop + counts.countBottom > 1
  const cutWith = (share: number): Part => {
    const lap = Math.ceil(lapOf(share) / LAP_STEP) * LAP_STEP
    return {
      from: span.from,
      to: span.to,
      lap,
      share,
      cut: cutRun({ ...span, lap, stockLength, isStaggered: several, stagger: basis.lapStagger }),
    }
  }
  const first = cutWith(staggeredShare(counts))
  return first.cut?.isStaggered === false && several ? cutWith(1) : first
}

/** A length of one bar of a layer. */
interface LaidPart {
  readonly layer: BarPiece['layer']
  readonly bar: number
  readonly part: Part
}

/** In both layers every second bar is turned round, and those below the others. */
function assembled({ countTop, countBottom }: Counts, runs: readonly LaidPart[], index: LayoutIndex): BarPieces {
  const laid = runs.map(({ layer, bar, part: { cut, from, to } }) => {
    const isTurned = (bar + Number(layer === 'bottom')) % 2 === 1
    const pieces = (isTurned ? cut?.mirrored : cut?.pieces) ?? [{ from, to }]
    return { layer, bar, pieces, laps: lapsOf(pieces) }
  })
  const whose = (part: Part): Whose => {
    const [layer, other] = new Set(runs.filter((run) => run.part === part).map((run) => run.layer))
    const isAlone = layer !== undefined && other === undefined && countTop > 0 && countBottom > 0
    return { layer: isAlone ? layer : null, isOne: countTop + countBottom === 1 }
  }
  const lapped = [...new Set(runs.map(({ part }) => part))].filter(({ cut }) => (cut?.pieces.length ?? 0) > 1)
  return {
    pieces: laid.flatMap(({ layer, bar, pieces }) => pieces.map((piece) => ({ ...piece, layer, bar }))),
    laps: laid.flatMap(({ layer, bar, laps }) => laps.map((lap) => ({ ...lap, layer, bar }))),
    lapNeeded: lapped.length > 0 ? Math.max(...lapped.map(({ lap }) => lap)) : null,
    share: Math.max(0, ...lapped.map(({ share }) => share)),
    clearance: Math.min(Infinity, ...lapped.map(({ cut }) => cut?.clearance ?? Infinity)),
    notes: [...new Set(lapped.flatMap((part) => notesOf(part, { whose: whose(part), index })))],
  }
}

interface Whose {
  /** The only layer that is cut so; null for both, or where there is one only. */
  readonly layer: BarPiece['layer'] | null
  /** Of a single bar. */
  readonly isOne: boolean
}

const SPLIT = { top: 'Top bars split', bottom: 'Bottom bars split' } as const

function notesOf({ cut, lap }: Part, { whose, index }: { whose: Whose; index: LayoutIndex }): readonly string[] {
  if (!cut) return []
  const { layer, isOne } = whose
  const lengths = cut.pieces.map(({ from, to }) => String(Math.round(to - from))).join(' + ')
  const order = cut.isStaggered ? 'every second bar the other way round' : 'not staggered: all laps at one section'
  const over = Math.round(-cut.clearance)
  return [
    `${layer === null ? 'Split' : SPLIT[layer]} at the stock length of ${index.layout.job.settings.stockLength}: ${lengths}, lapped ${lap}${isOne ? '' : `, ${order}`}.`,
    ...(cut.clearance < 0 ? [`No place clear of every anchor: a lap lies over an anchor's steel by ${over}.`] : []),
  ]
}
