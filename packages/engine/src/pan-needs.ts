/** Steel that a pan asks for, purpose by purpose, and the bars that would meet it. */

import type { Anchorage, Basis } from './bases/basis'
import { jackingForce, stageForce } from './force'
import type { LayoutIndex } from './layout-index'
import type { PlacedBarsShape, Stage } from './model'
import { matCuts, type MatCut } from './pan-cuts'
import { panPlace, type PanAnchor, type PanPlace } from './pan-place'
import { panStrip, type PanStrip } from './pan-strip'
import { step, type Clause, type Step } from './step'
import { bondPlace } from './steel/bond'
import {
  barArea,
  besideRecess,
  countStripBars,
  countTieBack,
  countTrimmers,
  type AnchorageOf,
  type CountedBars,
  type Face,
} from './steel/pan-steel'

/** One purpose of bars round a pan. */
export interface PanNeed {
  readonly purpose: 'tie-back' | 'cut-bars' | 'strip'
  /** As a check calls it. */
  readonly name: string
  readonly kind: PlacedBarsShape['kind']
  readonly runs: PlacedBarsShape['runs']
  /** Null where either face counts. */
  readonly face: Face | null
  /** The stage that asks for it; null for steel of the finished slab. */
  readonly stage: string | null
  /** Steel asked for, mm2. */
  readonly area: number
  /** Bars are replaced in their own diameter; null where any will do. */
  readonly diameter: number | null
  readonly clause: Clause
  readonly readingIds: readonly string[]
  readonly steps: readonly Step[]
  readonly notes: readonly string[]
  readonly count: (shapes: readonly PlacedBarsShape[]) => CountedBars
  /** The least set of bars of this diameter that meets it by itself; null where no set within the limits does. */
  readonly shapeOf: (diameter: number) => PlacedBarsShape | null
}

/** Bars closer than this at their centres are no help to whoever fixes them, mm. */
const PITCH_MIN = 75
const BARS_MAX = 40
/** Lengths of bars are asked for in steps of this, mm. */
const LENGTH_STEP = 25

/** All needs of a pan, each stage of stressing counted for the tie; empty where no live anchor stands in it. */
export function panNeeds(index: LayoutIndex, basis: Basis, panId: string): PanNeed[] {
  const place = panPlace(index, panId)
  const { at } = place
  const cuts = cutNeeds(place, basis)
  if (!at) return cuts
  const strip = panStrip(index, place, basis.spread.value)
  return [
    ...place.pour.stages.map((stage) => tieBackNeed({ place, at, basis, stage })),
    ...cuts,
    ...(strip ? stripNeeds(index, { place, at, basis, strip }) : []),
  ]
}

/** Length past a line that a bar round a pan needs at a stress and strength, by the face that it lies at. */
function anchorageAt(place: PanPlace, basis: Basis, of: { readonly stress: number; readonly strength: number }) {
  const covered = { ...place, depth: place.top - place.soffit }
  return (diameter: number, face: Face): Anchorage =>
    basis.anchorage({
      ...of,
      diameter,
      cd: Math.min(place.coverTop, place.coverSoffit),
      isGoodBond: basis.isGoodBond(bondPlace(covered, { layers: face, diameter })),
      isBent: false,
    })
}

// Tie behind the anchor -----------------------------------------------------------------------------------------------

interface TieInput {
  readonly place: PanPlace
  readonly at: PanAnchor
  readonly basis: Basis
  readonly stage: Stage
}

function tieBackNeed({ place, at, basis, stage }: TieInput): PanNeed {
  const { tieBackForce, tieBackReason } = place.pan
  const jacking = jackingForce(at.tendon, at.strand)
  const P = stageForce(jacking.value, stage)
  const own = tieBackForce === null ? null : stage.share * tieBackForce
  const rule = basis.tieBack.rule({ P: P.value, own })
  const anchorageOf = anchorageAt(place, basis, { stress: rule.stress, strength: stage.strength })
  const others = basis.tieBack.beside(P.value).map(({ title, force }) => `${title}: ${(force / 1000).toFixed(1)} kN`)
  const reason = tieBackReason === '' ? 'No reason is written beside it.' : `Reason: ${tieBackReason}`
  return {
    purpose: 'tie-back',
    name: 'Tie behind the anchor',
    kind: 'tie-back-bars',
    runs: 'along',
    face: null,
    stage: stage.name,
    area: rule.area,
    diameter: null,
    clause: rule.clause,
    readingIds: [own === null ? basis.tieBack.readingId : basis.tieBack.ownReadingId],
    steps: [jacking, P, ...rule.steps],
    notes: [
      ...rule.notes,
      ...(own === null ? [] : [`The tie force is the engineer's own. ${reason}`]),
      ...(others.length > 0 ? [`Beside it, for information: ${others.join('; ')}.`] : []),
    ],
    count: (shapes) => countTieBack(place, shapes, anchorageOf),
    shapeOf: (diameter) =>
      tieBackShape(place, { diameter, area: rule.area, length: anchorageOf(diameter, 'top').length }),
  }
}

/** Bars in both faces from the sides of the recess outwards, so that those at the top pass it. */
function tieBackShape(
  place: PanPlace,
  { diameter, area, length }: { readonly diameter: number; readonly area: number; readonly length: number },
): PlacedBarsShape | null {
  const count = 2 * Math.max(1, Math.ceil(area / barArea(diameter) / 4))
  if (count > BARS_MAX) return null
  const pitch = 2 * Math.ceil(besideRecess(place, diameter) / 5) * 5
  return { kind: 'tie-back-bars', diameter, length: upTo(2 * length), count, layers: 'both', runs: 'along', pitch }
}

const upTo = (length: number): number => Math.ceil(length / LENGTH_STEP) * LENGTH_STEP

// Bars cut by the recess ----------------------------------------------------------------------------------------------

const REPLACED: Clause = { source: 'Statics', section: 'area cut is area replaced', tag: 'derived' }

/** Direction by direction and face by face: as much as is cut, half of it on each side of the recess. */
function cutNeeds(place: PanPlace, basis: Basis): PanNeed[] {
  const cuts = matCuts(place)
  return (['along', 'across'] as const).flatMap((runs) =>
    (['top', 'bottom'] as const).flatMap((face) => {
      const here = cuts.filter((cut) => cut.runs === runs && cut.mat.face === face)
      return here.length > 0 ? [cutNeed(place, basis, { runs, face, cuts: here })] : []
    }),
  )
}

interface CutSet {
  readonly runs: PlacedBarsShape['runs']
  readonly face: Face
  readonly cuts: readonly MatCut[]
}

function cutNeed(place: PanPlace, basis: Basis, { runs, face, cuts }: CutSet): PanNeed {
  const total = step(
    {
      symbol: 'Acut',
      meaning: 'Area cut, to be replaced half on each side',
      formula: cuts.map(({ area }) => area.symbol).join(' + '),
      unit: 'mm2',
      clause: REPLACED,
    },
    Object.fromEntries(cuts.map(({ area }) => [area.symbol, area.value])),
    (v) => Object.values(v).reduce((sum, value) => sum + value, 0),
  )
  const diameter = Math.max(...cuts.map(({ mat }) => mat.diameter))
  const anchorageOf = anchorageAt(place, basis, { stress: basis.barStress, strength: place.pour.fck })
  const recess = runs === 'along' ? place.pan.along : place.pan.across
  const extra = 'Usual beside it: one bar more in the other direction at each end of the recess (common practice).'
  return {
    purpose: 'cut-bars',
    name: `Bars cut, ${runs} the pan, ${face}`,
    kind: 'trimmers',
    runs,
    face,
    stage: null,
    area: total.value,
    diameter,
    clause: REPLACED,
    readingIds: [],
    steps: [...cuts.flatMap(({ cut, counted, area }) => [cut, counted, area]), total],
    notes: [extra],
    count: (shapes) => countTrimmers(place, shapes, { runs, face, anchorageOf }),
    shapeOf: (size) => ({
      kind: 'trimmers',
      diameter: size,
      length: upTo(recess + 2 * anchorageOf(size, face).length),
      count: 2 * Math.ceil(total.value / barArea(size) / 2 - 1e-9),
      layers: face,
      runs,
      pitch: PITCH_MIN,
    }),
  }
}

// Strip in front ------------------------------------------------------------------------------------------------------

const EQUIVALENCE: Clause = {
  source: 'Statics',
  section: 'bars for the force and the moment of the tendon that stops short',
  tag: 'derived',
}

interface StripInput {
  readonly place: PanPlace
  readonly at: PanAnchor
  readonly basis: Basis
  readonly strip: PanStrip
}

/** Bars of each face across the strip: the tendon's force and moment, and the job's crack steel where it asks for any. */
function stripNeeds(index: LayoutIndex, input: StripInput): PanNeed[] {
  const { settings } = index.layout.job
  const largest = Math.max(...settings.barSizes)
  const crack = crackSteel(index, input)
  return (['top', 'bottom'] as const).map((face) => stripNeed(input, { face, largest, fyk: settings.fyk, crack }))
}

interface OfFace {
  readonly face: Face
  readonly largest: number
  readonly fyk: number
  readonly crack: readonly Step[]
}

function stripNeed(input: StripInput, of: OfFace): PanNeed {
  const { place, basis, strip } = input
  const { face } = of
  const asked = stripSteps(input, of)
  const area = asked.at(-1)?.value ?? 0
  const anchorageOf = anchorageAt(place, basis, { stress: basis.barStress, strength: place.pour.fck })
  const counting = { strip, face, anchorageOf }
  return {
    purpose: 'strip',
    name: `Bars across the strip in front, ${face}`,
    kind: 'lap-bars',
    runs: 'along',
    face,
    stage: null,
    area,
    diameter: null,
    clause: EQUIVALENCE,
    readingIds: [basis.shortfallReading],
    steps: asked,
    notes: [
      `The tendon stops ${Math.round(strip.length)} short of edge ${strip.edgeMark}; the strip is ` +
        `${Math.round(strip.left + strip.right)} wide, half way to the next tendon on each side. Mat bars are not counted.`,
    ],
    count: (shapes) => countStripBars(place, shapes, counting),
    shapeOf: (diameter) => stripShape(place, { diameter, area, ...counting }),
  }
}

/** Yield of the bars against proof load of the strand: partial factors stand on both sides and fall out. */
function stripSteps({ place, at }: StripInput, { face, largest, fyk, crack }: OfFace): Step[] {
  const { top, soffit, coverTop, coverSoffit } = place
  const h = top - soffit
  const line = { unit: 'mm2', clause: EQUIVALENCE }
  const force = step(
    { ...line, symbol: 'AsF', meaning: 'Bars of both faces for the force of the tendon', formula: 'n * Fp01k / fyk' },
    { n: at.tendon.strands, Fp01k: at.strand.proofLoad, fyk },
    (v) => (v.n * v.Fp01k) / v.fyk,
  )
  const up = at.anchor.height - soffit
  const moment = step(
    { ...line, symbol: 'AsM', meaning: `Bars at the ${face} for its moment`, formula: 'AsF * dp / (h - c - phi)' },
    {
      AsF: force.value,
      dp: face === 'top' ? up : h - up,
      h,
      c: face === 'top' ? coverTop : coverSoffit,
      phi: largest,
    },
    (v) => (v.AsF * v.dp) / (v.h - v.c - v.phi),
  )
  const cracks = crack.at(-1)?.value ?? 0
  const asked = step(
    { ...line, symbol: 'As', meaning: `Bars asked for at the ${face}`, formula: 'max(AsM, AsF / 2, AsC / 2)' },
    { AsM: moment.value, AsF: force.value, AsC: cracks },
    (v) => Math.max(v.AsM, v.AsF / 2, v.AsC / 2),
  )
  return [force, moment, ...crack, asked]
}

/** Crack steel of the strip by the choice that the job has accepted for edges; nothing where none asks for any. */
function crackSteel({ layout }: LayoutIndex, { place, basis, strip }: StripInput): readonly Step[] {
  const choice = basis.crackChoices.findLast(({ readingId }) => basis.isAccepted(readingId))
  const { settings } = layout.job
  const rule = choice?.steel({
    thickness: place.top - place.soffit,
    cover: Math.max(place.coverTop, place.coverSoffit),
    diameter: Math.max(...settings.barSizes),
    fck: place.pour.fck,
    tensile: settings.crackTensile,
    crackWidth: settings.crackWidth,
    compression: settings.crackCompression,
  })
  if (!rule) return []
  const area = step(
    {
      symbol: 'AsC',
      meaning: 'Crack steel of the strip, both faces',
      formula: 'am * w / 1000',
      unit: 'mm2',
      clause: rule.clause,
    },
    { am: rule.areaPerMetre, w: strip.left + strip.right },
    (v) => (v.am * v.w) / 1000,
  )
  return [...rule.steps, area]
}

/** As few bars as meet the area, spread over the strip; at the top those in the way of the recess do not count. */
function stripShape(
  place: PanPlace,
  of: {
    readonly diameter: number
    readonly area: number
    readonly strip: PanStrip
    readonly face: Face
    readonly anchorageOf: AnchorageOf
  },
): PlacedBarsShape | null {
  const { diameter, area, strip, face } = of
  const toEdge = strip.length - place.pour.coverEdge
  const length = upTo(2 * Math.max(toEdge, strip.wedge + of.anchorageOf(diameter, face).length))
  const width = 2 * Math.min(strip.left, strip.right)
  const least = Math.max(2, Math.ceil(area / barArea(diameter)))
  for (let count = least; count <= BARS_MAX && width / count >= PITCH_MIN; count += 1) {
    const pitch = Math.floor(width / count / 5) * 5
    const shape: PlacedBarsShape = { kind: 'lap-bars', diameter, length, count, layers: face, runs: 'along', pitch }
    if (countStripBars(place, [shape], of).area >= area) return shape
  }
  return null
}
