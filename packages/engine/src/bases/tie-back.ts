import { step, type Clause, type Step } from '../step'
import type { OtherRule, TieRule } from './basis'

/** Tie behind an anchor inside the slab. No basis in use gives it a number, so each offers the same readings of its own. */
const SHARE: Clause = {
  source: 'AASHTO LRFD',
  section: 'intermediate anchors, without credit for compression',
  tag: 'memory',
}
const OWN: Clause = { source: 'Engineer of the job', section: 'own tie force', tag: 'practice' }
const ACI: Clause = { source: 'ACI 318-19', section: '25.9.4.4.3', tag: 'digest' }
const BRIDGES: Clause = { source: 'JTG 3362-2018', section: '8.2.6', tag: 'read' }

const FORCE_SHARE = 0.25
const YIELD_SHARE = 0.6

/** Factored force of both other rules: 1.2 times the largest force while jacking. */
const FACTORED = 1.2

/** Steel for a quarter of the unfactored force `P` (N), or for the engineer's `own` force, at 0.6 `fy` (MPa). */
export function tieBack({ P, own }: { readonly P: number; readonly own: number | null }, fy: number): TieRule {
  const T = own === null ? shareOf(P) : ownForce(own)
  const stress = step(
    {
      symbol: 'sigmaT',
      meaning: 'Steel stress: 0.6 of the yield strength',
      formula: '0.6 * fy',
      unit: 'MPa',
      clause: SHARE,
    },
    { fy },
    (v) => YIELD_SHARE * v.fy,
  )
  const As = step(
    { symbol: 'As', meaning: 'Steel asked for behind the anchor', formula: 'T / sigmaT', unit: 'mm2', clause: SHARE },
    { T: T.value, sigmaT: stress.value },
    (v) => v.T / v.sigmaT,
  )
  return { area: As.value, stress: stress.value, clause: T.clause, steps: [T, stress, As], notes: [] }
}

function shareOf(P: number): Step {
  return step(
    { symbol: 'T', meaning: 'Tie behind the anchor, unfactored', formula: '0.25 * P', unit: 'N', clause: SHARE },
    { P },
    (v) => FORCE_SHARE * v.P,
  )
}

function ownForce(own: number): Step {
  return step(
    { symbol: 'T', meaning: 'Tie behind the anchor, by the engineer', formula: 'Town', unit: 'N', clause: OWN },
    { Town: own },
    (v) => v.Town,
  )
}

/** What other codes ask for, at their own force level; for information, never with this basis's steel stress. */
export function otherTieBacks(P: number): readonly OtherRule[] {
  return [
    { title: '0.20 of 1.2 times the force while jacking', force: 0.2 * FACTORED * P, clause: BRIDGES },
    { title: '0.35 of 1.2 times the force while jacking', force: 0.35 * FACTORED * P, clause: ACI },
  ]
}
