/** By which rule and readings the steel behind an anchor is sized and counted: plates by the basis, bonded ends by a reading. */

import { isBonded, type AnchorSite } from '../anchor-site'
import type { Stage } from '../model'
import { step } from '../step'
import type { Asked, WindowAt } from './bursting-steel'
import type { CheckContext } from './outcome'
import type { Prism } from './prism'

export type BurstingRule = Pick<Asked, 'windowAt' | 'readings' | 'clause' | 'notes'>

/** Where plates and bonded ends act as one, the rule for plates holds, for its window is the shorter. */
export function ruleFor(members: readonly AnchorSite[], context: CheckContext): BurstingRule {
  const { basis } = context
  const bonded = members.filter(isBonded)
  const readings = (ids: readonly (string | null)[]) => ids.filter((id) => id !== null)
  const [first] = bonded
  if (!first) {
    return {
      windowAt: ({ b }) => ({ window: basis.window(b.value), steps: [] }),
      readings: readings([basis.windowReading, basis.steelReading]),
      clause: null,
      notes: [],
    }
  }
  const atBulbs = 'No code formula covers a bonded dead end: by engineering judgement all force enters at the bulbs'
  const clause = basis.readings.find(({ id }) => id === basis.deadEndReading)?.clause ?? basis.clauses.tie
  if (bonded.length < members.length) {
    return {
      windowAt: ({ b }) => ({ window: basis.window(b.value), steps: [] }),
      readings: readings([basis.windowReading, basis.steelReading, basis.deadEndReading]),
      clause,
      notes: [`${atBulbs}, over the width of the splay.`],
    }
  }
  return {
    windowAt: (prism, stage) => bondWindow(first, { prism, stage, context }),
    readings: readings([basis.steelReading, basis.deadEndReading]),
    clause,
    notes: [
      `${atBulbs}, over the width of the splay; the steel counts from the bulbs over the bond length and one prism more.`,
    ],
  }
}

/**
 * The force leaves the strands over their bond length, so that the tension behind the bulbs is drawn out by as much. The
 * lower transmission length counts, so that no steel counts where the force may be in the concrete already.
 */
function bondWindow(site: AnchorSite, of: { prism: Prism; stage: Stage; context: CheckContext }): WindowAt {
  const { prism, stage, context } = of
  const bond = transmissionAt(site, stage, context)
  const to = step(
    {
      symbol: 'xTo',
      meaning: 'Behind the bulbs steel counts as far as the lower transmission length and one prism',
      formula: 'lower + b',
      unit: 'mm',
      clause: bond.clause,
    },
    { lower: bond.lower, b: prism.b.value },
    (v) => v.lower + v.b,
  )
  return { window: { from: 0, to: to.value }, steps: [...bond.steps, to] }
}

/** Transmission length of a bonded dead end at a stage, its strand at the stress of that stage. */
export function transmissionAt({ force, tendon, strand }: AnchorSite, stage: Stage, { basis }: CheckContext) {
  const stress = step(
    {
      symbol: 'sigmaP',
      meaning: `Stress of the strand at the end of stage ${stage.name}`,
      formula: 'share * Pjack / (n * Ap)',
      unit: 'MPa',
      clause: { source: 'Statics', section: 'force over area', tag: 'derived' },
    },
    { share: stage.share, Pjack: force.value, n: tendon.strands, Ap: strand.area },
    (v) => (v.share * v.Pjack) / (v.n * v.Ap),
  )
  const bond = basis.transmission({ diameter: strand.diameter, stress: stress.value, strength: stage.strength })
  return { ...bond, steps: [stress, ...bond.steps] }
}
