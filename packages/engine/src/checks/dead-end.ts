/** A dead end: whether its hardware may stand there, and what a bonded one needs to give its force to the concrete. */

import { isBonded, type AnchorSite } from '../anchor-site'
import { hardwareClause } from '../hardware-distances'
import type { Stage } from '../model'
import type { Advice, Check, Compared, Refused } from '../result'
import { statusOfDistance } from '../status'
import type { Clause } from '../step'
import { transmissionAt } from './bursting-rule'
import { distanceCheck } from './distance-check'
import { comparison, refusal, type CheckContext, type Head } from './outcome'

/** Rules of detailing known from memory. */
const USUAL: Clause = { source: 'Common practice', section: 'bonded dead ends', tag: 'memory-unsure' }
const USUAL_TO_EDGE = 150

/** Checks of a dead end beside those that it shares with a live anchor; none at a live one. */
export function deadEndChecks(site: AnchorSite, context: CheckContext): Check[] {
  const { anchor, hardware } = site
  if (anchor.end === 'live') return []
  if (hardware.ends === 'live') {
    const message = `${hardware.name} is for live ends alone. Choose hardware for a dead end.`
    return [refusal(headOf(site, 'Hardware of a dead end'), { code: 'OUTSIDE_APPROVAL', field: 'hardwareId', message })]
  }
  if (!isBonded(site)) return []
  return [...bondChecks(site, context), ...splayChecks(site), toEdgeAdvice(site)]
}

function headOf({ anchor, hardware }: AnchorSite, name: string): Head {
  return {
    zoneId: `anchor:${anchor.id}`,
    family: 'dead-end',
    name,
    plane: null,
    stage: null,
    limitKind: 'H',
    clause: hardwareClause(hardware, 'bonded dead end'),
    notes: [],
  }
}

// Transmission length -----------------------------------------------------------------------------------------------

/** The hardware's upper transmission length against that of the basis, at the stage that asks for the most. */
function bondChecks(site: AnchorSite, context: CheckContext): (Compared | Refused)[] {
  const { hardware, pour, anchor } = site
  const head = headOf(site, 'Transmission length of the bonded strands')
  const given = hardware.transmissionLength
  if (given === null) {
    const message = `${hardware.name} has no transmission length. Enter its upper value, in mm behind the bulbs.`
    return [refusal(head, { code: 'MISSING_INPUT', field: 'hardware.transmissionLength', message })]
  }
  const { stage, bond } = longest(site, pour.stages, context)
  const spare = given - bond.upper
  const once = statusOfDistance(spare)
  const { deadEndReading } = context.basis
  const notes = [
    'No code formula covers strands with bulbs: the length of bonded strand without them is taken, as the reading says.',
    `No precompression counts before ${Math.round(anchor.setBack + given)} from the slab edge: ` +
      `${Math.round(anchor.setBack)} to the bulbs and ${Math.round(given)} of bond.`,
  ]
  return [
    comparison(
      { ...head, limitKind: 'C', stage: stage.name, clause: bond.clause, notes },
      { demand: given, limit: bond.upper, unit: 'mm', steps: bond.steps },
      {
        compares: 'at-least',
        status: context.basis.isAccepted(deadEndReading) ? once : 'needs-judgement',
        statusOnceAccepted: once,
        utilisation: null,
        spare,
        readingIds: [deadEndReading],
        mend: spare < 0 ? { field: 'hardware.transmissionLength', value: Math.ceil(bond.upper) } : null,
      },
    ),
  ]
}

function longest(site: AnchorSite, stages: readonly Stage[], context: CheckContext) {
  const all = stages.map((stage) => ({ stage, bond: transmissionAt(site, stage, context) }))
  return all.reduce((one, other) => (other.bond.upper >= one.bond.upper ? other : one))
}

// Splay -------------------------------------------------------------------------------------------------------------

/** The strands spread from the duct to the bulbs over the splay, so that the tendon must be straight as far as that. */
function splayChecks(site: AnchorSite): Check[] {
  const { anchor, hardware } = site
  const { splayLength, plate, duct } = hardware
  const head = headOf(site, 'Straight length for the splay')
  if (splayLength === null) {
    const message = `${hardware.name} has no length of splay. Enter it, in mm behind the bulbs.`
    return [refusal(head, { code: 'MISSING_INPUT', field: 'hardware.splayLength', message })]
  }
  // Without it the straight length says by itself that it is missing.
  if (anchor.straightBehind === null) return []
  const angle = Math.atan(Math.max(0, plate.width - duct.width) / 2 / splayLength)
  return [
    distanceCheck({
      ...head,
      notes: [
        `The outer strands spread by ${((angle * 180) / Math.PI).toFixed(1)} degrees, from ${duct.width} in the duct ` +
          `to ${plate.width} at the bulbs.`,
      ],
      demand: anchor.straightBehind,
      limit: splayLength,
      isClearance: false,
      steps: [],
      mend: { field: 'straightBehind', value: splayLength },
    }),
  ]
}

function toEdgeAdvice(site: AnchorSite): Advice {
  return {
    ...headOf(site, 'Bulbs from the slab edge'),
    kind: 'advice',
    limitKind: 'P',
    clause: USUAL,
    measured: site.anchor.setBack,
    usual: `${USUAL_TO_EDGE} or more`,
    unit: 'mm',
    isUsual: site.anchor.setBack >= USUAL_TO_EDGE,
  }
}
