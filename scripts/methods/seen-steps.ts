import {
  BAR_STANDARDS,
  basisOf,
  checkPour,
  closeAnchors,
  closeBelow,
  cutLength,
  layoutIndex,
  type BarStandard,
  type Basis,
  type Dimensions,
  type Layout,
  type Step,
} from '@wedgeline/engine'
import { tendonForces } from '../../packages/engine/src/tendon/profile'
import type { SeenStep } from './collect'
import { innerSeen } from './inner-steps'

/** Every step that the engine makes of these layouts, and every length of the bar schedule's shapes. */
export function* seenSteps(layouts: readonly Layout[]): Generator<SeenStep> {
  for (const layout of layouts) {
    yield* stepsOfChecks(layout)
    yield* stepsBeside(layout)
    yield* innerSeen(layout)
  }
  for (const standard of BAR_STANDARDS) yield* stepsOfShapes(standard)
}

function* stepsOfChecks(layout: Layout): Generator<SeenStep> {
  const { basis } = layout.job
  for (const { id: pourId } of layout.pours) {
    const checks = checkPour(layout, { pourId, withSteps: true }).zones.flatMap((zone) => zone.checks)
    for (const check of checks) {
      if (check.kind !== 'compared') continue
      for (const step of check.steps) yield { family: check.family, basis, step }
    }
  }
}

/** Steps on which results rest without printing them: groups of close anchors, elongations, stresses in fine cracks. */
function* stepsBeside(layout: Layout): Generator<SeenStep> {
  const index = layoutIndex(layout)
  const { basis } = layout.job
  for (const { id } of layout.edges) {
    for (const { plane, steps } of closeAnchors(index, id)) {
      const family = plane === 'plan' ? 'bursting-plan' : 'bursting-thickness'
      for (const step of steps) yield { family, basis, step }
    }
  }
  yield { family: 'bursting-plan', basis, step: closeBelow({ plate: 220, toOuterBefore: 900, toOuterAfter: 900 }) }
  for (const { id } of layout.tendons) {
    const forces = tendonForces(index, id, 'nominal')
    if ('steps' in forces) yield { family: 'tendon', basis, step: forces.steps.elongation }
  }
  for (const step of crackSteps(basisOf(layout.job))) yield { family: 'edge-wedge', basis, step }
}

/** Fine cracks, and bars smaller and larger than those of the table. */
const CRACKS = [
  { crackWidth: 0.1, diameter: 12, thickness: 220 },
  { crackWidth: 0.3, diameter: 6, thickness: 800 },
  { crackWidth: 0.3, diameter: 40, thickness: 150 },
]

const crackSteps = ({ crackChoices }: Basis): readonly Step[] =>
  crackChoices.flatMap((choice) =>
    CRACKS.flatMap((one) => choice.steel({ ...one, cover: 30, fck: 32, tensile: null, compression: 0 })?.steps ?? []),
  )

/** A helix of small and of large pitch; links with the shortest hooks and with hooks that are given. */
const BENT: readonly Dimensions[] = [
  { A: 600, B: 300, C: 200, D: 150, E: 150, R: 100 },
  { A: 600, B: 50, C: 10, D: 10, E: 150, R: 100 },
]

function* stepsOfShapes(standard: BarStandard): Generator<SeenStep> {
  for (const { code, title, needs, also } of standard.shapes) {
    const names = [needs, [...needs, ...also]]
    for (const dimensions of names.flatMap((given) => BENT.map((bent) => only(bent, given)))) {
      const typedLength = code === '99' ? 1200 : null
      for (const step of cutLength({ code, diameter: 10, dimensions, typedLength, flatTurns: 0 }, standard)?.steps ??
        []) {
        const meaning = step.symbol === 'L' ? `Cut length of shape ${code}, ${title}` : step.meaning
        yield { family: 'schedule', basis: null, step: { ...step, meaning } }
      }
    }
  }
}

const only = (dimensions: Dimensions, names: readonly (keyof Dimensions)[]): Dimensions =>
  Object.fromEntries(Object.entries(dimensions).filter(([name]) => names.includes(name as keyof Dimensions)))
