/** Bars round a pan: tie behind the anchor, bars cut, strip in front, corners, and the section under the recess. */

import type { LayoutIndex } from '../layout-index'
import type { PlacedBarsShape } from '../model'
import { panNeeds, type PanNeed } from '../pan-needs'
import { panPlace, type PanPlace } from '../pan-place'
import type { Advice, Check, Compared } from '../result'
import { step, type Clause } from '../step'
import { barArea, facesOf } from '../steel/pan-steel'
import { distanceCheck } from './distance-check'
import { byRatio, refusal, type CheckContext, type Head } from './outcome'

const CORNERS: Clause = { source: 'Common practice', section: 'diagonal bars at the corners of a pan', tag: 'practice' }
const UNDER: Clause = { source: 'Common practice', section: 'concrete left under a pan', tag: 'practice' }
const COVER: Clause = { source: 'Nominal cover of the pour or region', section: 'as entered', tag: 'practice' }
const MATS: Clause = { source: 'Statics', section: 'area cut is area replaced', tag: 'derived' }

/** Two bars of 12 at each corner, 1.0 to 1.2 m long (common practice). */
const CORNER = { count: 2, diameter: 12, lengthMin: 1000 }
const CORNERS_OF_PAN = 4
/** Re-entrant corner of JTG 3362-2018 8.2.6: 0.04 of 1.2 times the jacking force. */
const CORNER_SHARE = 0.04 * 1.2
const LEFT_UNDER = { least: 60, most: 80 }

/** Every need against the bars entered for the pan, the tie in the stage that is worst, and what is usual beside them. */
export function panBarsChecks(context: CheckContext, panId: string): Check[] {
  const { index, basis } = context
  const place = panPlace(index, panId)
  const shapes = placedAt(index, panId)
  const needs = panNeeds(index, basis, panId)
  const compared = needs.map((need) => needCheck(context, { need, shapes, panId }))
  const ties = compared.filter((_, at) => needs[at]?.purpose === 'tie-back')
  return [
    ...missing(place),
    ...worstOf(ties),
    ...compared.filter((_, at) => needs[at]?.purpose !== 'tie-back'),
    ...underRecess(place),
    cornerAdvice(place, shapes),
  ]
}

/** Bars round this pan that are placed by its axis. */
export function placedAt(index: LayoutIndex, panId: string): readonly PlacedBarsShape[] {
  return (index.steelOfZone.get(`pan:${panId}`) ?? []).flatMap(({ shape }) => (isPlaced(shape) ? [shape] : []))
}

const isPlaced = (shape: { readonly kind: string }): shape is PlacedBarsShape => 'runs' in shape && 'layers' in shape

const headOf = (panId: string, name: string, clause: Clause): Head => ({
  zoneId: `pan:${panId}`,
  family: 'pan-bars',
  name,
  plane: null,
  stage: null,
  limitKind: 'C',
  clause,
  notes: [],
})

interface Asked {
  readonly need: PanNeed
  readonly shapes: readonly PlacedBarsShape[]
  readonly panId: string
}

function needCheck(context: CheckContext, { need, shapes, panId }: Asked): Compared {
  const counted = need.count(shapes)
  return byRatio(
    context,
    {
      ...headOf(panId, need.name, need.clause),
      stage: need.stage,
      notes: [...need.notes, ...counted.notes],
    },
    {
      demand: need.area,
      limit: counted.area,
      unit: 'mm2',
      steps: [...need.steps, ...counted.steps],
      readings: need.readingIds,
    },
  )
}

/** Without any steel all stages are over by as much; the one that asks for most is shown. */
function worstOf(checks: readonly Compared[]): readonly Compared[] {
  const badness = ({ utilisation }: Compared) => utilisation ?? Number.MAX_VALUE
  return [...checks].sort((a, b) => badness(b) - badness(a) || b.demand - a.demand).slice(0, 1)
}

function missing({ pan, pour, at }: PanPlace): Check[] {
  const noAnchor = `No live anchor stands in ${pan.mark}, so the tie behind it and the strip in front are not known.`
  const noMats = `No mat is entered for pour ${pour.mark}, so the bars that the recess cuts are not known.`
  const refused = (name: string, field: string, message: string) =>
    refusal(headOf(pan.id, name, MATS), { code: 'MISSING_INPUT', field, message })
  return [
    ...(at ? [] : [refused('Tie behind the anchor', 'pan.anchor', noAnchor)]),
    ...(pour.mats.length > 0 ? [] : [refused('Bars cut', 'pour.mats', noMats)]),
  ]
}

/** What is left under the deepest place of the recess: cover to the soffit's bars at least, and what is usual. */
function underRecess({ pan, top, soffit, coverSoffit }: PanPlace): Check[] {
  const left = step(
    { symbol: 'hr', meaning: 'concrete under the recess', formula: 'zt - dp - zs', unit: 'mm', clause: COVER },
    { zt: top, dp: pan.depth, zs: soffit },
    (v) => v.zt - v.dp - v.zs,
  )
  const head = headOf(pan.id, 'Concrete under the recess', COVER)
  const caution =
    'Shear across the reduced section and the cover of bars and ducts under the recess are for the engineer to look at, ' +
    'until the recess is filled and after.'
  const advice: Advice = {
    ...head,
    kind: 'advice',
    limitKind: 'P',
    clause: UNDER,
    notes: [caution],
    measured: left.value,
    usual: `${LEFT_UNDER.least} to ${LEFT_UNDER.most}`,
    unit: 'mm',
    isUsual: left.value >= LEFT_UNDER.least,
  }
  return [
    distanceCheck({
      ...head,
      demand: left.value,
      limit: coverSoffit,
      isClearance: true,
      steps: [left],
      mend: null,
    }),
    advice,
  ]
}

/** Steel across one corner of the recess. */
function cornerAdvice({ pan, at }: PanPlace, shapes: readonly PlacedBarsShape[]): Advice {
  const diagonals = shapes.filter(({ kind }) => kind === 'diagonals')
  const areas = diagonals.map((shape) => shape.count * facesOf(shape).length * barArea(shape.diameter))
  const usual = CORNER.count * barArea(CORNER.diameter)
  const measured = areas.reduce((sum, area) => sum + area, 0)
  const short = diagonals.filter(({ length }) => length < CORNER.lengthMin)
  const force = at ? (CORNER_SHARE * at.tendon.strands * at.tendon.jackingRatio * at.strand.breakingLoad) / 1000 : null
  return {
    ...headOf(pan.id, 'Diagonals at each corner', CORNERS),
    kind: 'advice',
    limitKind: 'P',
    notes: [
      `Usual at each of the ${CORNERS_OF_PAN} corners: ${CORNER.count} bars of ${CORNER.diameter}, 1000 to 1200 long.`,
      ...short.map(({ length }) => `Bars ${length} long are shorter than is usual.`),
      ...(force === null
        ? []
        : [`JTG 3362-2018 8.2.6 for a re-entrant corner, for information: ${force.toFixed(1)} kN.`]),
    ],
    measured,
    usual: `${Math.ceil(usual)} or more`,
    unit: 'mm2',
    isUsual: measured >= usual && short.length === 0,
  }
}
