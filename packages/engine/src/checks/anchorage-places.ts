/** Anchorage and laps of bars in a gap, round a pan and across a joint. */

import type { AnchorageInput } from '../bases/basis'
import { found } from '../layout-index'
import type { PlacedBarsShape, Pour, SteelShape } from '../model'
import { panPlace, slabBeyond } from '../pan-place'
import type { Compared, Zone } from '../result'
import { sectionBehind, type Section } from '../section'
import { bondPlaceOf } from '../steel/bond'
import { jointStrips } from '../wedge/joint-strip'
import { wedgesOfEdge } from '../wedge/wedges-of-edge'
import { lapCheck, lapStep, pastCheck, pastLine, worstOfEach, type Past, type PastLine } from './anchorage-length'
import type { CheckContext } from './outcome'

const lastStrength = (pour: Pour): number => pour.stages.at(-1)?.strength ?? pour.fck

/** Wedge bars past the deepest place of their wedge. */
export function wedgeBarChecks(context: CheckContext, zone: Zone): readonly Compared[] {
  const { index } = context
  const wedge = wedgesOfEdge(index, zone.edgeId ?? '').get(zone.id)
  if (!wedge) return []
  const frame = found(index.frames, wedge.gap.edgeId, 'edge')
  const pour = found(index.pours, wedge.gap.pourId, 'pour')
  const { coverEdge } = sectionBehind(pour, { frame, chainage: wedge.apex.chainage, depth: 0 })
  const section = sectionBehind(pour, { frame, ...wedge.apex })
  return worstOfEach(
    shapesOf(context, zone).flatMap((shape): readonly Compared[] => {
      if (shape.kind !== 'wedge-bars') return []
      const values = { cover: coverEdge, l: shape.length, depth: wedge.depth }
      const past: PastLine = {
        meaning: 'Wedge bars past the deepest place of the wedge',
        formula: 'cover + l - depth',
        values: values,
      }
      const input = straight(context, shape, { section, strength: pour.fck })
      return [
        pastCheck(context, zone, {
          name: 'Wedge bars past the wedge',
          past: pastLine(past, coverEdge + shape.length - wedge.depth),
          input,
          countedBy: 'against cracks in the wedge',
        }),
      ]
    }),
  )
}

const shapesOf = ({ index }: CheckContext, zone: Zone): readonly SteelShape[] =>
  (index.steelOfZone.get(zone.id) ?? []).map(({ shape }) => shape)

type Across = Pick<Section, 'top' | 'soffit' | 'coverTop' | 'coverSoffit'>

const straight = (
  { basis }: CheckContext,
  shape: SteelShape,
  of: { readonly section: Across; readonly strength: number },
): AnchorageInput => ({
  diameter: shape.diameter,
  strength: of.strength,
  stress: basis.barStress,
  cd: null,
  isGoodBond: basis.isGoodBond(bondPlaceOf({ ...of.section, depth: of.section.top - of.section.soffit }, shape)),
  isBent: false,
})

/** Bars round a pan past what they pass or hold. */
export function panAnchorageChecks(context: CheckContext, zone: Zone): readonly Compared[] {
  const place = panPlace(context.index, zone.panId ?? '')
  const { pour, pan } = place
  return worstOfEach(
    shapesOf(context, zone).flatMap((shape): readonly Compared[] => {
      if (!('runs' in shape)) return []
      const isTie = shape.kind === 'tie-back-bars'
      const input = straight(context, shape, { section: place, strength: isTie ? lastStrength(pour) : pour.fck })
      const outward = isTie ? Math.max(0, slabBeyond(place) - pour.coverEdge) : Infinity
      const recess = shape.runs === 'along' ? pan.along : pan.across
      return [pastCheck(context, zone, { ...panPast(shape, recess, outward), input })]
    }),
  )
}

function panPast(
  { kind, length }: PlacedBarsShape,
  recess: number,
  outward: number,
): Pick<Past, 'name' | 'past' | 'countedBy'> {
  switch (kind) {
    case 'trimmers': {
      const past: PastLine = {
        meaning: 'Trimmers past each end of the recess',
        formula: '(l - recess) / 2',
        values: { l: length, recess },
      }
      return {
        name: 'Trimmers past the recess',
        past: pastLine(past, (length - recess) / 2),
        countedBy: 'for the bars cut',
      }
    }
    case 'diagonals': {
      const past: PastLine = {
        meaning: 'Diagonal bars past the corner of the recess',
        formula: 'l / 2',
        values: { l: length },
      }
      return { name: 'Diagonal bars past the corner', past: pastLine(past, length / 2), countedBy: null }
    }
    case 'tie-back-bars': {
      const shorter = Math.min(length / 2, outward)
      const isCut = outward < length / 2
      const past: PastLine = {
        meaning: 'Tie-back bars past the bearing face on the shorter side',
        formula: isCut ? 'slab' : 'l / 2',
        values: isCut ? { slab: outward } : { l: length },
      }
      return {
        name: 'Tie-back bars past the bearing face',
        past: pastLine(past, shorter),
        countedBy: 'in the tie behind the anchor',
      }
    }
    case 'lap-bars': {
      const past: PastLine = { meaning: 'Lap bars past the bearing face', formula: 'l / 2', values: { l: length } }
      return {
        name: 'Lap bars past the bearing face',
        past: pastLine(past, length / 2),
        countedBy: 'in the strip before the pan',
      }
    }
  }
}

/** Bars across a joint run past the strip without precompression on both sides by a lap. */
export function jointLapChecks(context: CheckContext, zone: Zone): readonly Compared[] {
  const { index } = context
  const pour = found(index.pours, zone.pourId, 'pour')
  const strips = jointStrips(index, zone.id.slice('joint:'.length)).flatMap(({ lengths }) => lengths)
  const strip = Math.max(0, ...strips.map(({ governing }) => Math.max(governing.first, governing.second)))
  return worstOfEach(
    shapesOf(context, zone).flatMap((shape): readonly Compared[] => {
      if (!('runs' in shape)) return []
      const { length } = shape
      const input = straight(context, shape, {
        section: { ...pour, top: pour.thickness, soffit: 0 },
        strength: pour.fck,
      })
      const past: PastLine = {
        meaning: 'Bars past the strip at the joint, on the deeper side',
        formula: 'l / 2 - strip',
        values: { l: length, strip },
      }
      const lap = lapStep(context, input, 1)
      return [
        lapCheck(zone, {
          name: 'Bars across the joint past the strip',
          past: pastLine(past, length / 2 - strip),
          lap,
          notes: [],
        }),
      ]
    }),
  )
}
