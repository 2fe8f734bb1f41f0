/** What the bars placed round a pan count for: tie behind the anchor, bars cut, strip in front. */

import type { Anchorage } from '../bases/basis'
import type { PlacedBarsShape } from '../model'
import { slabBeyond, type PanPlace } from '../pan-place'
import type { PanStrip } from '../pan-strip'
import { step, type Clause, type Step } from '../step'
import { developedShare } from './developed'

const COUNTING: Clause = {
  source: 'Statics',
  section: 'bars that cross the line, developed on both sides',
  tag: 'derived',
}

export type Face = 'top' | 'bottom'

/** Anchorage that a bar of this diameter needs at this face. */
export type AnchorageOf = (diameter: number, face: Face) => Anchorage

export interface CountedBars {
  /** mm2 */
  readonly area: number
  readonly steps: readonly Step[]
  readonly notes: readonly string[]
}

interface Row {
  readonly shape: PlacedBarsShape
  readonly face: Face
  /** Bars of the row that count. */
  readonly bars: number
  readonly share: number
  readonly notes: readonly string[]
}

export const barArea = (diameter: number): number => (Math.PI * diameter ** 2) / 4

export const facesOf = ({ layers }: PlacedBarsShape): readonly Face[] =>
  layers === 'both' ? ['top', 'bottom'] : [layers]

/** Places across the tendon at which the bars of one layer lie, symmetrical about it. */
export const offsetsOf = ({ count, pitch }: PlacedBarsShape): number[] =>
  Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * pitch)

/** Nearest to the tendon that a top bar may lie: beside the recess with cover to it. */
export const besideRecess = ({ pan, coverTop }: PanPlace, diameter: number): number =>
  pan.across / 2 + coverTop + diameter / 2

/** Bars that run on past the bearing face on both sides of it, symmetrical about the tendon. */
export function countTieBack(
  place: PanPlace,
  shapes: readonly PlacedBarsShape[],
  anchorageOf: AnchorageOf,
): CountedBars {
  const outward = slabBeyond(place) - place.pour.coverEdge
  const rows = ofKind(shapes, 'tie-back-bars', 'along').flatMap((shape) =>
    facesOf(shape).map((face) => {
      const past = Math.min(shape.length / 2, outward)
      return rowOf(place, { shape, face, past, anchorage: anchorageOf(shape.diameter, face), reach: null })
    }),
  )
  return total(rows, [...strayNotes(shapes, 'tie-back-bars'), ...oneFaceNotes(rows)])
}

/** Bars of one face across the strip in front of a pan: to the edge on one side, past the wedge on the other. */
export function countStripBars(
  place: PanPlace,
  shapes: readonly PlacedBarsShape[],
  of: { readonly strip: PanStrip; readonly face: Face; readonly anchorageOf: AnchorageOf },
): CountedBars {
  const { strip, face, anchorageOf } = of
  const toEdge = strip.length - place.pour.coverEdge
  const rows = ofKind(shapes, 'lap-bars', 'along')
    .filter((shape) => facesOf(shape).includes(face))
    .map((shape): Row => {
      const half = shape.length / 2
      const reach = { left: strip.left, right: strip.right }
      const row = rowOf(place, {
        shape,
        face,
        past: half - strip.wedge,
        anchorage: anchorageOf(shape.diameter, face),
        reach,
      })
      if (half >= toEdge) return row
      const short = `Bars of ${shape.diameter} do not count across the strip: they end ${Math.ceil(toEdge - half)} before the edge.`
      return { ...row, bars: 0, notes: [short] }
    })
  return total(rows, strayNotes(shapes, 'lap-bars'))
}

/** Trimmers of one direction, in the face that is cut: half on each side, developed past both ends of the recess. */
export function countTrimmers(
  place: PanPlace,
  shapes: readonly PlacedBarsShape[],
  of: {
    readonly runs: PlacedBarsShape['runs']
    readonly face: Face
    readonly anchorageOf: AnchorageOf
  },
): CountedBars {
  const { runs, face, anchorageOf } = of
  const recess = runs === 'along' ? place.pan.along : place.pan.across
  const rows = ofKind(shapes, 'trimmers', runs)
    .filter((shape) => facesOf(shape).includes(face))
    .map((shape): Row => {
      const past = (shape.length - recess) / 2
      const { share, notes } = developed(shape, past, anchorageOf(shape.diameter, face))
      const odd = `Of ${shape.count} trimmers of ${shape.diameter} one is not counted: half stand on each side.`
      const bars = 2 * Math.floor(shape.count / 2)
      return { shape, face, bars, share, notes: bars === shape.count ? notes : [...notes, odd] }
    })
  return total(rows, [])
}

const ofKind = (shapes: readonly PlacedBarsShape[], kind: PlacedBarsShape['kind'], runs: PlacedBarsShape['runs']) =>
  shapes.filter((shape) => shape.kind === kind && shape.runs === runs)

interface RowInput {
  readonly shape: PlacedBarsShape
  readonly face: Face
  /** Length past the line at which the bar has to be developed, mm. */
  readonly past: number
  readonly anchorage: Anchorage
  /** Width over which bars count, left and right of the tendon; null for any. */
  readonly reach: { readonly left: number; readonly right: number } | null
}

function rowOf(place: PanPlace, { shape, face, past, anchorage, reach }: RowInput): Row {
  const offsets = offsetsOf(shape)
  const inReach = reach ? offsets.filter((x) => x <= reach.left && -x <= reach.right) : offsets
  const nearest = besideRecess(place, shape.diameter)
  const clear = face === 'top' ? inReach.filter((x) => Math.abs(x) >= nearest) : inReach
  const { share, notes } = developed(shape, past, anchorage)
  const outside = offsets.length - inReach.length
  const cut = inReach.length - clear.length
  return {
    shape,
    face,
    bars: clear.length,
    share,
    notes: [
      ...notes,
      ...(cut > 0
        ? [`${bars(cut, shape)} at the ${face} not counted: the recess or the cover to it takes the place.`]
        : []),
      ...(outside > 0 ? [`${bars(outside, shape)} at the ${face} not counted: they lie outside the strip.`] : []),
    ],
  }
}

const bars = (count: number, { diameter }: PlacedBarsShape): string =>
  `${count} ${count === 1 ? 'bar' : 'bars'} of ${diameter}`

function developed(shape: PlacedBarsShape, past: number, anchorage: Anchorage) {
  const share = developedShare(past, anchorage)
  if (share === 1) return { share, notes: [] }
  const at = `${Math.max(0, Math.floor(past))} past the line`
  const note =
    share === 0
      ? `Bars of ${shape.diameter} do not count: ${at}, ${Math.ceil(anchorage.least)} is the least.`
      : `Bars of ${shape.diameter} count with ${share.toFixed(2)}: ${at}, ${Math.ceil(anchorage.length)} wanted.`
  return { share, notes: [note] }
}

function strayNotes(shapes: readonly PlacedBarsShape[], kind: PlacedBarsShape['kind']): string[] {
  return ofKind(shapes, kind, 'across').map(
    (shape) => `${bars(shape.count, shape)} not counted: they run across the tendon, not along it.`,
  )
}

function oneFaceNotes(rows: readonly Row[]): string[] {
  const areaAt = (face: Face) => rows.filter((row) => row.face === face).reduce((sum, row) => sum + areaOf(row), 0)
  const [top, bottom] = [areaAt('top'), areaAt('bottom')]
  if (top + bottom === 0 || (top > 0 && bottom > 0)) return []
  return [`All of it lies at the ${top > 0 ? 'top' : 'bottom'}: a tie stands in both faces as a rule.`]
}

const areaOf = ({ bars: count, share, shape }: Row): number => count * barArea(shape.diameter) * share

function total(rows: readonly Row[], notes: readonly string[]): CountedBars {
  const counted = rows.filter((row) => areaOf(row) > 0)
  const lines = counted.map(({ shape, face, bars: count, share }, at) =>
    step(
      {
        symbol: `As${at + 1}`,
        meaning: `${bars(count, shape)} at the ${face}`,
        formula: 'n * A * share',
        unit: 'mm2',
        clause: COUNTING,
      },
      { n: count, A: barArea(shape.diameter), share },
      (v) => v.n * v.A * v.share,
    ),
  )
  const sum = step(
    {
      symbol: 'AsCounted',
      meaning: 'Steel counted',
      formula: lines.length > 0 ? lines.map(({ symbol }) => symbol).join(' + ') : '0',
      unit: 'mm2',
      clause: COUNTING,
    },
    Object.fromEntries(lines.map(({ symbol, value }) => [symbol, value])),
    (v) => Object.values(v).reduce((all, value) => all + value, 0),
  )
  return {
    area: sum.value,
    steps: [...lines, sum],
    notes: [...new Set([...rows.flatMap((row) => row.notes), ...notes])],
  }
}
