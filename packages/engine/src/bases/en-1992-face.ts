import { step, type Clause } from '../step'
import type { FaceInput, TieRule } from './basis'

/** EN 1992-2 J.104.2: steel that every loaded face gets, whatever the force along it. */
const FLOOR: Clause = { source: 'EN 1992-2:2005', section: 'J.104.2', tag: 'memory' }
const FORCE: Clause = { source: 'EN 1992-1-1:2004', section: '2.4.2.2(3)', tag: 'memory' }

const FLOOR_SHARE = 0.03

interface FaceFactors {
  readonly gammaP: number
  readonly gammaS: number
  readonly fyk: number
  /** Steel stress of the job's bursting reading, MPa, for a factored force. */
  readonly stress: number
  readonly stressClause: Clause
}

/** Steel for a force along the face, factored, or 0.03 of the factored anchor force at design yield, whichever is more. */
export function faceSteel({ T, P }: FaceInput, factors: FaceFactors): TieRule {
  const { gammaP, gammaS, fyk, stress, stressClause } = factors
  const design = step(
    { symbol: 'TEd', meaning: 'Force along the face, factored', formula: 'gammaP * T', unit: 'N', clause: FORCE },
    { gammaP, T },
    (v) => v.gammaP * v.T,
  )
  const byForce = step(
    { symbol: 'AsT', meaning: 'Steel for that force', formula: 'TEd / sigmaS', unit: 'mm2', clause: stressClause },
    { TEd: design.value, sigmaS: stress },
    (v) => v.TEd / v.sigmaS,
  )
  const floor = step(
    {
      symbol: 'Asurf',
      meaning: 'Least steel at a loaded face in each direction',
      formula: '0.03 * P * gammaP / (fyk / gammaS)',
      unit: 'mm2',
      clause: FLOOR,
    },
    { P, gammaP, fyk, gammaS },
    (v) => (FLOOR_SHARE * v.P * v.gammaP) / (v.fyk / v.gammaS),
  )
  const isFloor = floor.value > byForce.value
  const clause = isFloor ? FLOOR : stressClause
  const As = step(
    { symbol: 'As', meaning: 'Steel asked for at the face', formula: 'max(AsT, Asurf)', unit: 'mm2', clause },
    { AsT: byForce.value, Asurf: floor.value },
    (v) => Math.max(v.AsT, v.Asurf),
  )
  return {
    area: As.value,
    stress: isFloor ? fyk / gammaS : stress,
    clause,
    steps: [design, byForce, floor, As],
    notes: [],
  }
}
