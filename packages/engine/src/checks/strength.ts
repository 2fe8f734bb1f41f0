/** Strength at stressing: each set of specimens of a pour against the strength asked for before each stage. */

import type { Check, Compared, Zone } from '../result'
import { statusOfDistance } from '../status'
import { step, type Clause, type Step } from '../step'
import { strengthAtStages, type StageStrength, type StrengthSet } from '../strengths'
import { comparison, type CheckContext } from './outcome'

/** The strength is data of the stage, set from the approval of its hardware by whoever entered it. */
const STAGE: Clause = { source: 'Stage of stressing', section: 'strength before it, as entered', tag: 'practice' }

/** One specimen that is too weak is concrete that is too weak: a mean hides it. */
const LOWEST: Clause = { source: 'Common practice', section: 'lowest specimen, cured on site', tag: 'practice' }

/**
 * Strengths recorded for a pour, MPa. A stage that a set reached is within, and the sets before it that were short are
 * told beside it; until then each short set stands as its own result. Nothing where nothing is recorded: what is
 * missing is said where the hold points are listed.
 */
export function strengthChecks({ index }: CheckContext, zone: Zone): readonly Check[] | null {
  const pour = index.pours.get(zone.pourId)
  if (zone.kind !== 'pour' || !pour) return null
  const { concreteResults } = index.layout
  const specimensOf = new Map(concreteResults.map(({ id, specimens }) => [id, specimens]))
  return strengthAtStages(pour, concreteResults).flatMap((at) =>
    shownSets(at).map((set) => setCheck({ zone, at, set, specimens: specimensOf.get(set.id) ?? [] })),
  )
}

/** A stage that is reached shows the set that reached it, and what is weaker after it; otherwise every set. */
function shownSets({ stage, sets, reachedBy }: StageStrength): readonly StrengthSet[] {
  if (!reachedBy) return sets
  const weakerLater = sets
    .slice(sets.indexOf(reachedBy) + 1)
    .filter((set) => set.isSiteCured && set.lowest < stage.strength)
  return [reachedBy, ...weakerLater]
}

interface SetAtStage {
  readonly zone: Zone
  readonly at: StageStrength
  readonly set: StrengthSet
  readonly specimens: readonly number[]
}

function setCheck(given: SetAtStage): Compared {
  const { zone, at, set, specimens } = given
  const { stage, reachedBy } = at
  const spare = set.lowest - stage.strength
  const isOpen = !set.isSiteCured || (reachedBy !== null && reachedBy !== set)
  const status = isOpen ? 'needs-judgement' : statusOfDistance(spare)
  const head = {
    zoneId: zone.id,
    family: 'strength',
    name: `Lowest specimen at ${set.ageHours} h`,
    stage: stage.name,
    limitKind: 'H',
    clause: STAGE,
    notes: notesOf(given),
  } as const
  const answer = { demand: set.lowest, limit: stage.strength, unit: 'MPa', steps: stepsOf(specimens) }
  return comparison(head, answer, {
    compares: 'at-least',
    status,
    statusOnceAccepted: status,
    utilisation: null,
    spare,
    readingIds: [],
    mend: null,
  })
}

function notesOf({ at: { stage, sets, reachedBy }, set }: SetAtStage): string[] {
  const mean = `The mean of the set is ${figure(set.mean)} MPa; its lowest specimen counts.`
  const notes = [mean]
  if (!set.isSiteCured)
    notes.push('Not cured on site beside the pour: how far it tells the strength there is for an engineer to judge.')
  else if (reachedBy && reachedBy !== set)
    notes.push(`Weaker than the set at ${reachedBy.ageHours} h, which reached the ${figure(stage.strength)} MPa.`)
  if (reachedBy !== set) return notes
  const before = sets.slice(0, sets.indexOf(set)).filter(({ lowest }) => lowest < stage.strength)
  return [
    ...notes,
    ...before.map(
      ({ ageHours, lowest, ...other }) =>
        `Before it, at ${ageHours} h, the lowest was ${figure(lowest)} MPa and the mean ${figure(other.mean)}: short by ` +
        `${figure(stage.strength - lowest)}.`,
    ),
  ]
}

function stepsOf(specimens: readonly number[]): Step[] {
  const values = Object.fromEntries(specimens.map((strength, at) => [`f${at + 1}`, strength]))
  const names = Object.keys(values)
  const counted = { clause: LOWEST, unit: 'MPa' }
  return [
    step(
      { ...counted, symbol: 'fmin', meaning: 'lowest specimen of the set', formula: `min(${names.join(', ')})` },
      values,
      (v) => Math.min(...Object.values(v)),
    ),
    step(
      {
        ...counted,
        symbol: 'fmean',
        meaning: 'mean of the set, for information',
        formula: `(${names.join(' + ')}) / ${names.length}`,
      },
      values,
      (v) => Object.values(v).reduce((sum, strength) => sum + strength, 0) / names.length,
    ),
  ]
}

const figure = (strength: number): string => String(Math.round(strength * 100) / 100)
