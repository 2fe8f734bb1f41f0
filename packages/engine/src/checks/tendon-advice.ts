/** What is usual for a tendon as a whole, with its forces and elongation for information. */

import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, Tendon } from '../model'
import type { Advice, Check, Zone } from '../result'
import type { Clause } from '../step'
import { bendsOf, isNoForce, type NoForce } from '../tendon/friction'
import { tendonForces, type TendonForces } from '../tendon/profile'
import { anchorMark } from '../zones'
import { refusal, type CheckContext } from './outcome'

const usual = (section: string): Clause => ({ source: 'Common practice', section, tag: 'practice' })
const LENGTH = usual('length of a slab tendon')
const ENDS = usual('live and dead ends along an edge')
const DIRECTION = usual('passing a void or a step')
const FORCE: Clause = { source: 'Statics', section: 'friction and draw-in along the tendon', tag: 'derived' }

/** mm, all from memory of common practice. */
const SHORTEST = 6_000
const PREFERRED = [12_000, 24_000] as const
const LONGEST_ONE_END = 40_000
const LONGEST_BOTH_ENDS = 70_000

/** A tendon is led past a void or a step at no more than 1 in 8, better 1 in 10. */
const STEEPEST = 8

/** Advice for a tendon, and its forces; not covered where what they need is not entered. */
export function tendonChecks({ index }: CheckContext, zone: Zone): Check[] {
  const tendon = found(index.tendons, zone.id.slice('tendon:'.length), 'tendon')
  return [
    ...lengthAdvice(zone, tendon),
    ...endsAdvice(index, zone, tendon),
    ...directionAdvice(index, zone, tendon),
    ...forceAdvice(index, zone, tendon),
  ]
}

type Said = Pick<Advice, 'name' | 'measured' | 'usual' | 'unit' | 'isUsual' | 'clause'> & Partial<Pick<Advice, 'notes'>>

function advice(zone: Zone, said: Said): Advice {
  return {
    kind: 'advice',
    zoneId: zone.id,
    family: 'tendon',
    plane: null,
    stage: null,
    limitKind: 'P',
    notes: [],
    ...said,
  }
}

function lengthAdvice(zone: Zone, { length, stressedFrom }: Tendon): Advice[] {
  if (length === null) return []
  const isOneEnd = stressedFrom === 'one-end'
  const longest = isOneEnd ? LONGEST_ONE_END : LONGEST_BOTH_ENDS
  const longestText = isOneEnd ? 'about 40 m from one end' : 'about 60 to 70 m from both ends'
  const isPreferred = length >= PREFERRED[0] && length <= PREFERRED[1]
  return [
    advice(zone, {
      name: 'Length',
      measured: length,
      usual: `6 m or more, up to ${longestText}; 12 to 24 m preferred`,
      unit: 'mm',
      isUsual: length >= SHORTEST && length <= longest,
      clause: LENGTH,
      notes: isPreferred ? [] : ['Outside the 12 to 24 m that are preferred.'],
    }),
  ]
}

/** Beyond the preferred length friction takes so much that live and dead ends in turn even out the force of an edge. */
function endsAdvice(index: LayoutIndex, zone: Zone, tendon: Tendon): Advice[] {
  if (tendon.length === null || tendon.length <= PREFERRED[1] || tendon.stressedFrom === 'both-ends') return []
  const runs = (index.anchorsOfTendon.get(tendon.id) ?? []).flatMap((anchor) => sameEndsInRow(index, anchor))
  if (runs.length === 0) return []
  const measured = Math.max(...runs)
  return [
    advice(zone, {
      name: 'Tendons in a row with the same kind of end',
      measured,
      usual: '1, live and dead ends in turn as tendons grow longer than 24 m',
      unit: '-',
      isUsual: measured === 1,
      clause: ENDS,
    }),
  ]
}

/** How many neighbours along the edge, the anchor among them, have its kind of end without a break; none alone. */
function sameEndsInRow(index: LayoutIndex, anchor: Anchor): number[] {
  const row = index.anchorsOfEdge.get(anchor.edgeId ?? '') ?? []
  if (row.length < 2) return []
  const at = row.findIndex(({ id }) => id === anchor.id)
  let [from, to] = [at, at]
  while (row[from - 1]?.end === anchor.end) from -= 1
  while (row[to + 1]?.end === anchor.end) to += 1
  return [to - from + 1]
}

function directionAdvice(index: LayoutIndex, zone: Zone, tendon: Tendon): Advice[] {
  const bends = bendsOf(index, tendon)
  if (isNoForce(bends)) return []
  const sharpest = bends.reduce((most, bend) => Math.max(most, bend), 0)
  if (sharpest === 0) return []
  const oneIn = sharpest < Math.PI / 2 ? 1 / Math.tan(sharpest) : 0
  return [
    advice(zone, {
      name: 'Sharpest bend in plan, 1 in',
      measured: oneIn,
      usual: '8 or more, better 10, past a void or a step',
      unit: '-',
      isUsual: oneIn >= STEEPEST,
      clause: DIRECTION,
    }),
  ]
}

// Forces and elongation ---------------------------------------------------------------------------------------------

interface Pairs {
  readonly nominal: TendonForces
  readonly low: TendonForces
  readonly high: TendonForces
}

function forceAdvice(index: LayoutIndex, zone: Zone, { id }: Tendon): Check[] {
  const pairs = pairsOf(index, id)
  if (!isNoForce(pairs)) {
    return [
      elongationAdvice(zone, pairs),
      ...pairs.nominal.ends.map((anchor) => endAdvice(index, { zone, anchor, pairs })),
    ]
  }
  const head = { zoneId: zone.id, family: 'tendon', name: 'Forces and elongation', plane: null, stage: null } as const
  return [refusal({ ...head, limitKind: 'P', clause: FORCE, notes: [] }, pairs)]
}

function pairsOf(index: LayoutIndex, tendonId: string): Pairs | NoForce {
  const nominal = tendonForces(index, tendonId, 'nominal')
  if (isNoForce(nominal)) return nominal
  const low = tendonForces(index, tendonId, 'low')
  if (isNoForce(low)) return low
  const high = tendonForces(index, tendonId, 'high')
  return isNoForce(high) ? high : { nominal, low, high }
}

const shown = (value: number): string => value.toFixed(1)

function elongationAdvice(zone: Zone, { nominal, low, high }: Pairs): Advice {
  return advice(zone, {
    name: 'Elongation while jacking',
    measured: nominal.elongation,
    usual: `${shown(high.elongation)} to ${shown(low.elongation)} by the job's high and low friction`,
    unit: 'mm',
    isUsual: true,
    clause: FORCE,
    notes: [`${shown(nominal.net)} mm after draw-in. With the high pair ${shown(high.elongation)} mm while jacking.`],
  })
}

function endAdvice(index: LayoutIndex, of: { zone: Zone; anchor: Anchor; pairs: Pairs }): Advice {
  const { anchor, pairs } = of
  const mark = anchorMark(index, anchor)
  const place = anchor.id === pairs.nominal.ends[0].id ? 0 : pairs.nominal.length
  const kN = ({ jackedAt, lockedAt }: TendonForces, isLocked: boolean) =>
    shown((isLocked ? lockedAt : jackedAt)(place) / 1000)
  const jacked = `While jacking ${kN(pairs.nominal, false)} kN (${kN(pairs.high, false)} with the high pair).`
  const ends = [kN(pairs.high, true), kN(pairs.low, true)].map(Number).sort((one, other) => one - other)
  return advice(of.zone, {
    name: `Force at ${mark} after lock-off, ${anchor.end} end`,
    measured: pairs.nominal.lockedAt(place),
    usual: `${ends.map(shown).join(' to ')} kN by the job's high and low friction`,
    unit: 'N',
    isUsual: true,
    clause: FORCE,
    notes: [`${jacked} After lock-off ${kN(pairs.high, true)} kN with the high pair.`],
  })
}
