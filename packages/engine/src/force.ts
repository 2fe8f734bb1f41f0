/** The force while jacking, from strand and ratio to each stage, and the force that the checks of one anchor use. */

import { found, type LayoutIndex } from './layout-index'
import type { Anchor, Stage, StrandType, Tendon } from './model'
import { step, type Clause, type Step } from './step'
import { courseOf, forceAfterFriction, frictionExponent, frictionPair, isNoForce } from './tendon/friction'

const STATICS: Clause = { source: 'Statics', section: 'strands times force', tag: 'derived' }

/** By tendon and strand: rows of a layout stay the same objects until they are changed. */
const jackingForces = new WeakMap<Tendon, { readonly strand: StrandType; readonly force: Step }>()

/** Force of the whole tendon at the end of stressing, N. */
export function jackingForce(tendon: Tendon, strand: StrandType): Step {
  const known = jackingForces.get(tendon)
  if (known?.strand === strand) return known.force
  const force = madeForce(tendon, strand)
  jackingForces.set(tendon, { strand, force })
  return force
}

function madeForce(tendon: Tendon, strand: StrandType): Step {
  return step(
    { symbol: 'Pjack', meaning: 'Force while jacking', formula: 'n * (r * Fpk)', unit: 'N', clause: STATICS },
    { n: tendon.strands, r: tendon.jackingRatio, Fpk: strand.breakingLoad },
    (v) => v.n * (v.r * v.Fpk),
  )
}

/** The part of it that a stage applies, N. */
export function stageForce(jacking: number, stage: Stage): Step {
  return step(
    {
      symbol: 'P',
      meaning: `Force at the end of stage ${stage.name}`,
      formula: 'share * Pjack',
      unit: 'N',
      clause: STATICS,
    },
    { share: stage.share, Pjack: jacking },
    (v) => v.share * v.Pjack,
  )
}

export interface AnchorageForce {
  /** N, while jacking, all stages done; a stage takes its share of it. */
  readonly value: number
  /** The last one holds the value. */
  readonly steps: readonly Step[]
  /** Whole sentences that a reader must know: which rule of the job gave the force. */
  readonly notes: readonly string[]
}

/**
 * The force that bearing, bursting and spalling at an anchor are checked for, N.
 *
 * Live: the tendon's own jacking force. Dead: the same, or, where the job says so, what the lowest credible friction
 * leaves of it; without the tendon's length or drape the jacking force counts, which is never less.
 */
export function anchorageForce(index: LayoutIndex, anchor: Anchor): AnchorageForce {
  const tendon = found(index.tendons, anchor.tendonId, 'tendon')
  const jacking = jackingForce(tendon, found(index.strandTypes, tendon.strandTypeId, 'strand type'))
  const { settings } = index.layout.job
  const whole = { value: jacking.value, steps: [jacking], notes: [] }
  if (anchor.end === 'live' || settings.deadEndForce === 'jacking') return whole
  const course = courseOf(index, tendon)
  if (isNoForce(course)) return { ...whole, notes: [`${course.message} Until then the jacking force counts here.`] }
  const exponent = frictionExponent(course, frictionPair(settings, 'low'))
  const far = forceAfterFriction(jacking.value, exponent)
  return {
    value: far.value,
    steps: [jacking, ...course.steps, exponent, far],
    notes: ['The force at this dead end is that after friction with the lowest credible pair, as the job is set.'],
  }
}
