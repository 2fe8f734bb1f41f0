/** The angles of spread that a job's wedges are shown by, and the length behind bulbs before which none is counted. */

import { basisOf } from '../bases'
import type { Basis } from '../bases/basis'
import { jackingForce } from '../force'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor } from '../model'
import type { Clause } from '../step'
import { USUAL_SPREAD } from './closed-form'

export interface ShownSpread {
  /** As it is named beside a depth. */
  readonly title: string
  /** rad */
  readonly angle: number
  readonly clause: Clause
  /** The one that the job's wedges are taken by. */
  readonly isUsed: boolean
}

const USUAL: Clause = { source: 'Common practice', section: 'spread at about 45 degrees', tag: 'practice' }
const OWN: Clause = { source: 'Job setting', section: 'angle of spread', tag: 'practice' }

/** The basis's own angle, the usual 45 degrees, and the job's where it sets one; the one in use first. */
export function shownSpreads(index: LayoutIndex): readonly ShownSpread[] {
  const { job } = index.layout
  const basis = basisOf(job)
  const own = job.settings.wedgeSpread
  const isNew = (angle: number, among: readonly number[]) => among.every((other) => Math.abs(angle - other) > ROUNDING)
  const ofBasis = { title: basis.title, angle: basis.spread.value, clause: basis.spread.clause, isUsed: own === null }
  const usual = { title: 'common practice', angle: USUAL_SPREAD, clause: USUAL, isUsed: false }
  const ofJob = own === null ? [] : [{ title: 'the job’s own', angle: own, clause: OWN, isUsed: true }]
  return [...ofJob, ofBasis, ...(isNew(USUAL_SPREAD, [basis.spread.value, own ?? 0]) ? [usual] : [])]
}

/** The upper transmission length of a bonded dead end: of its hardware, otherwise by the basis; 0 at a plate, mm. */
export function bondLength(index: LayoutIndex, basis: Basis): (anchor: Anchor) => number {
  return (anchor) => {
    const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
    if (hardware.kind === 'plate') return 0
    if (hardware.transmissionLength !== null) return hardware.transmissionLength
    const tendon = found(index.tendons, anchor.tendonId, 'tendon')
    const strand = found(index.strandTypes, tendon.strandTypeId, 'strand type')
    const { stages, fck } = found(index.pours, anchor.castWithPourId, 'pour')
    const stress = jackingForce(tendon, strand).value / (tendon.strands * strand.area)
    return basis.transmission({ diameter: strand.diameter, stress, strength: stages.at(-1)?.strength ?? fck }).upper
  }
}
