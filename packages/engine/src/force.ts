/** The force while jacking, from strand and ratio to each stage. */

import type { Stage, StrandType, Tendon } from './model'
import { step, type Clause, type Step } from './step'

const STATICS: Clause = { source: 'Statics', section: 'strands times force', tag: 'derived' }

/** Force of the whole tendon at the end of stressing, N. */
export function jackingForce(tendon: Tendon, strand: StrandType): Step {
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
