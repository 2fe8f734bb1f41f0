import { jobBasisSchema, type JobData } from '@wedgeline/contract'
import type { Factor } from '@wedgeline/engine'
import { BASIS_SOURCES } from '@wedgeline/engine/bases'

/** What an engineer types on the basis page; null while a field is empty. */
export interface BasisForm {
  readonly settings: Readonly<Record<keyof JobData['settings'], string | number | null | readonly number[]>>
  readonly factors: Readonly<Record<string, TypedFactor>>
}

export interface TypedFactor {
  readonly value: number | null
  readonly reason: string
}

export const factorsOf = (basis: string): readonly Factor[] =>
  BASIS_SOURCES.find(({ id }) => id === basis)?.factors ?? []

export function basisFormOf({ basis, factors, settings }: JobData): BasisForm {
  const typed = factorsOf(basis).map(({ name, recommended }): readonly [string, TypedFactor] => {
    const set = factors.find((factor) => factor.name === name)
    return [name, { value: set?.value ?? recommended, reason: set?.reason ?? '' }]
  })
  return { settings, factors: Object.fromEntries(typed) }
}

export interface ReadBasis {
  /** What the server takes; null while something cannot be read. */
  readonly change: ReturnType<typeof jobBasisSchema.parse> | null
  /** First message of each field: `settings.nearFrom`, `gammaC.value`, `gammaC.reason`. */
  readonly errors: Readonly<Record<string, string>>
}

/** Reads the form by the schema that the server reads as well. A factor as recommended is no setting of the job. */
export function readBasisForm(form: BasisForm, { id: jobId, basis }: Pick<JobData, 'id' | 'basis'>): ReadBasis {
  const known = factorsOf(basis)
  const set = known.flatMap((factor) => {
    const typed = form.factors[factor.name]
    return typed && typed.value !== factor.recommended ? [{ factor, typed }] : []
  })
  const factors = set.map(({ factor, typed }) => ({ name: factor.name, value: typed.value, reason: typed.reason }))
  const read = jobBasisSchema.safeParse({ jobId, basis, settings: form.settings, factors })
  const wrong = set.flatMap(({ factor, typed }) => Object.entries(factorErrors(factor, typed)))
  const ofSettings = read.success
    ? []
    : read.error.issues
        .filter(({ path }) => path[0] === 'settings')
        .map(({ path, message }): [string, string] => [path.map(String).join('.'), `It ${message}.`])
  const errors = Object.fromEntries([...ofSettings.reverse(), ...wrong])
  return { change: read.success && wrong.length === 0 ? read.data : null, errors }
}

function factorErrors({ name, least, most }: Factor, { value, reason }: TypedFactor): Record<string, string> {
  const isOut = value === null || value < least || value > most
  return {
    ...(isOut ? { [`${name}.value`]: `It must lie between ${least} and ${most}.` } : {}),
    ...(reason.trim() === '' ? { [`${name}.reason`]: 'Say why it differs from the recommended value.' } : {}),
  }
}
