import type { Job } from '../model'
import { AS_3600 } from './as-3600'
import type { Basis, BasisSource } from './basis'
import { EN_1992 } from './en-1992'

export { CRACK_CHOICE } from './basis'

/** The list of bases; a new one is one file and one line here. */
export const BASIS_SOURCES: readonly BasisSource[] = [EN_1992, AS_3600]

/** The job's basis with its factors and accepted readings; throws where the job names a basis that is not in the list. */
export function basisOf(job: Pick<Job, 'basis' | 'factors' | 'readings' | 'settings'>): Basis {
  const source = BASIS_SOURCES.find(({ id }) => id === job.basis)
  if (!source) throw new Error(`Basis "${job.basis}" is not one of ${BASIS_SOURCES.map(({ id }) => id).join(', ')}.`)
  return source.make({ factors: job.factors, readings: job.readings, fyk: job.settings.fyk })
}

/** Angle at which force spreads from a plate for edge wedges, rad: the job's own, otherwise that of its basis. */
export function spreadOf(job: Job): number {
  return job.settings.wedgeSpread ?? basisOf(job).spread.value
}

interface FactorProblem {
  /** Place among the job's factors, and which part of it is wrong. */
  readonly at: number
  readonly part: 'name' | 'value'
  readonly field: string
  /** What is wrong and what would be right. */
  readonly message: string
}

/** What is wrong with the factors that a job sets; empty where all are right. */
export function factorProblems(job: Pick<Job, 'basis' | 'factors'>): readonly FactorProblem[] {
  const known = BASIS_SOURCES.find(({ id }) => id === job.basis)?.factors ?? []
  return job.factors.flatMap(({ name, value }, at) => {
    const factor = known.find((one) => one.name === name)
    if (!factor) {
      const names = known.map((one) => one.name).join(', ')
      return [problemOf(at, 'name', `"${name}" is not a factor of this basis: ${names}.`)]
    }
    if (job.factors.findIndex((one) => one.name === name) < at) {
      return [problemOf(at, 'name', `${factor.title} is given twice; give it once.`)]
    }
    if (value >= factor.least && value <= factor.most) return []
    const range = `${factor.least} to ${factor.most}`
    return [problemOf(at, 'value', `${factor.title} is ${value}; it must lie in ${range}.`)]
  })
}

const problemOf = (at: number, part: FactorProblem['part'], message: string): FactorProblem => ({
  at,
  part,
  field: `job.factors[${at}].${part}`,
  message,
})
