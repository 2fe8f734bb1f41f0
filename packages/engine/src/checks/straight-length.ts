/** Straight length behind an anchor, before the tendon curves. */

import { hardwareClause } from '../hardware-distances'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor } from '../model'
import type { Check } from '../result'
import type { Clause } from '../step'
import { distanceCheck } from './distance-check'

const USUAL: Clause = { source: 'Common practice', section: 'straight length behind an anchor', tag: 'practice' }
const USUAL_MIN = 500

/** Against the hardware's own least, with common practice beside; not covered where the length is not given. */
export function straightLengthChecks(index: LayoutIndex, anchor: Anchor): Check[] {
  const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
  const zoneId = `anchor:${anchor.id}`
  const head = { zoneId, family: 'straight-length', name: 'Straight length behind', plane: null, stage: null } as const
  const clause = hardwareClause(hardware, 'straight length')
  if (anchor.straightBehind === null) {
    const message = `The straight length behind the bearing face is not given; ${hardware.name} needs ${hardware.straightBehindMin} mm.`
    const refused = { kind: 'refused', status: 'not-covered', code: 'MISSING_INPUT', field: 'straightBehind' } as const
    return [{ ...head, ...refused, limitKind: 'H', clause, notes: [], message }]
  }
  return [
    distanceCheck({
      ...head,
      notes: [],
      limitKind: 'H',
      clause,
      demand: anchor.straightBehind,
      limit: hardware.straightBehindMin,
      isClearance: false,
      steps: [],
      mend: { field: 'straightBehind', value: hardware.straightBehindMin },
    }),
    {
      ...head,
      kind: 'advice',
      notes: [],
      limitKind: 'P',
      clause: USUAL,
      measured: anchor.straightBehind,
      usual: `${USUAL_MIN} or more`,
      unit: 'mm',
      isUsual: anchor.straightBehind >= USUAL_MIN,
    },
  ]
}
