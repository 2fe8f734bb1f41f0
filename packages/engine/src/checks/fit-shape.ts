/** Whether a set of bars can be bent, and whether it goes into the depth behind its plate. */

import type { FitBar } from '../fit/items'
import type { Member } from '../fit/members'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, SteelShape } from '../model'
import type { Check, Compared, Refused, Zone } from '../result'
import { bentShape } from '../schedule/bars'
import { shapeRuleOf, sizeOf, type ShapeLimit, type ShapeValues } from '../schedule/bar-standards'
import { barStandardById } from '../schedule/bs-8666'
import { sectionAt, sectionBehind, type Section } from '../section'
import { step, type Clause, type Step } from '../step'
import { comparison, refusal } from './outcome'

export interface SetOfBars {
  /** One of the set. */
  readonly bar: FitBar
  readonly member: Member
  readonly anchor: Anchor | null
  readonly shape: SteelShape
}

const PLATE: Clause = { source: 'Geometry', section: 'a turn behind the bearing face', tag: 'derived' }
const DEPTH: Clause = { source: 'Nominal cover of the pour or region', section: 'as entered', tag: 'practice' }

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)
const shown = (mm: number): string => String(Math.round(mm * 10) / 10)

/** The middle of a spiral's first turn stands at the bearing face, against the plate, or behind it. */
export function firstTurnCheck(zone: Zone, { bar, shape }: SetOfBars): Check[] {
  if (shape.kind !== 'spiral') return []
  const isInside = shape.first < -ROUNDING
  const notes = isInside
    ? [`The first turn stands ${shown(-shape.first)} in front of the bearing face: in the plate.`]
    : []
  return [
    compared(zone, {
      name: `${capital(bar.name)}, first turn behind the bearing face`,
      clause: PLATE,
      notes,
      demand: shape.first,
      limit: 0,
      status: isInside ? 'stop' : 'within',
      steps: [],
    }),
  ]
}

/** Outside size of local steel through the thickness, with both covers, against the depth of the section. */
export function depthCheck(index: LayoutIndex, zone: Zone, { bar, member, anchor, shape }: SetOfBars): Check[] {
  const outside = throughDepth(shape)
  if (outside === null || anchor === null) return []
  const pour = found(index.pours, bar.pourId, 'pour')
  const frame = member.edgeFrame
  const middle = { x: (bar.box.min.x + bar.box.max.x) / 2, y: (bar.box.min.y + bar.box.max.y) / 2 }
  const section = frame ? sectionBehind(pour, { frame, ...frame.local(middle) }) : sectionAt(pour, middle)
  const need = needed(section, { outside, isInLinks: shape.kind === 'spiral' })
  const depth = section.top - section.soffit
  const isShort = need.value > depth + ROUNDING
  return [
    compared(zone, {
      name: `Depth for ${bar.name} and its covers`,
      clause: DEPTH,
      notes: isShort ? ['At no height does it have its cover to top and soffit.'] : [],
      demand: depth,
      limit: need.value,
      status: isShort ? (outside >= depth - ROUNDING ? 'stop' : 'over') : 'within',
      steps: [need],
    }),
  ]
}

function throughDepth(shape: SteelShape): number | null {
  if (shape.kind === 'spiral') return shape.outside
  if (shape.kind === 'links') return shape.height
  return shape.kind === 'hairpins' && shape.lies === 'upright' ? shape.bend : null
}

/** A spiral lies inside a region's links; links and hairpins stand between them. */
function needed(
  { coverTop, coverSoffit, linkDiameter }: Section,
  { outside, isInLinks }: { outside: number; isInLinks: boolean },
): Step {
  return step(
    {
      symbol: 'D',
      meaning: 'depth that the steel and its covers take up',
      formula: 'h + ct + cs + 2 * dl',
      unit: 'mm',
      clause: DEPTH,
    },
    { h: outside, ct: coverTop, cs: coverSoffit, dl: isInLinks ? linkDiameter : 0 },
    (v) => v.h + v.ct + v.cs + 2 * v.dl,
  )
}

/** Dimensions against the least that can be bent: the worst one of a set. Straight bars have none. */
export function bendChecks(index: LayoutIndex, zone: Zone, { bar, shape }: SetOfBars): Check[] {
  const standard = barStandardById(index.layout.job.settings.barStandard)
  if (!standard) return []
  const bent = bentShape(shape)
  const rule = shapeRuleOf(standard, bent.code)
  const size = sizeOf(standard, bent.diameter)
  if (!rule || rule.limits.length === 0) return []
  if (!size) return [unknownSize(zone, bar, standard.name)]
  const values: ShapeValues = { dimensions: bent.dimensions, size }
  const measured = rule.limits.flatMap((limit) => {
    const value = bent.dimensions[limit.field]
    if (value === undefined) return []
    const bound = limit.bound(values)
    return [{ limit, value, bound, spare: limit.side === 'at-least' ? value - bound : bound - value }]
  })
  const [worst] = measured.sort((one, other) => one.spare - other.spare)
  return worst ? [bendCheck(zone, bar, worst)] : []
}

function bendCheck(
  zone: Zone,
  bar: FitBar,
  { limit, value, bound, spare }: { limit: ShapeLimit; value: number; bound: number; spare: number },
): Compared {
  const isShort = spare < -ROUNDING
  return compared(zone, {
    name: `Bending of ${bar.name}, dimension ${limit.field}`,
    clause: limit.clause,
    notes: [`${capital(limit.because)}.${isShort ? limit.otherwise : ''}`],
    demand: value,
    limit: bound,
    compares: limit.side,
    status: isShort ? 'stop' : 'within',
    steps: [],
  })
}

function unknownSize(zone: Zone, bar: FitBar, standard: string): Refused {
  const name = `Bending of ${bar.name}`
  const clause: Clause = { source: standard, section: 'bar sizes', tag: 'digest' }
  const head = {
    zoneId: zone.id,
    family: 'fit',
    name,
    plane: null,
    stage: null,
    limitKind: 'C',
    clause,
    notes: [],
  } as const
  return refusal(head, {
    code: 'OUTSIDE_METHOD',
    field: 'steel.diameter',
    message: `${bar.bar.diameter} mm is no bar size of ${standard}. Choose one that it lists.`,
  })
}

type Outcome = Pick<Compared, 'name' | 'clause' | 'notes' | 'demand' | 'limit' | 'status'> & {
  readonly steps: readonly Step[]
  readonly compares?: 'at-least' | 'at-most'
}

function compared(zone: Zone, { demand, limit, status, steps, compares = 'at-least', ...head }: Outcome): Compared {
  return comparison(
    { zoneId: zone.id, family: 'fit', stage: null, limitKind: 'C', ...head },
    { demand, limit, unit: 'mm', steps },
    {
      compares,
      status,
      statusOnceAccepted: status,
      utilisation: null,
      spare: compares === 'at-least' ? demand - limit : limit - demand,
      readingIds: [],
      mend: null,
    },
  )
}
