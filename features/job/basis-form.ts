import { jobBasisSchema, type JobData } from '@wedgeline/contract'
import type { BasisSource, Factor } from '@wedgeline/engine'
import { BASIS_SOURCES } from '@wedgeline/engine/bases'

/** What an engineer types on the basis page; null while a field is empty. */
export interface BasisForm {
  readonly basis: JobData['basis']
  readonly settings: Readonly<Record<keyof JobData['settings'], string | number | null | readonly number[]>>
  readonly factors: Readonly<Record<string, TypedFactor>>
}

export interface TypedFactor {
  readonly value: number | null
  readonly reason: string
}

/** @throws for a basis that is not in the list; the contract lets none through. */
export function sourceOf(basis: string): BasisSource {
  const source = BASIS_SOURCES.find(({ id }) => id === basis)
  if (!source) throw new Error(`There is no basis "${basis}".`)
  return source
}

export function basisFormOf({ basis, factors, settings }: JobData): BasisForm {
  return { basis, settings, factors: typedFactors(basis, factors) }
}

function typedFactors(basis: string, factors: JobData['factors']): BasisForm['factors'] {
  const typed = sourceOf(basis).factors.map(({ name, recommended }): readonly [string, TypedFactor] => {
    const set = factors.find((factor) => factor.name === name)
    return [name, { value: set?.value ?? recommended, reason: set?.reason ?? '' }]
  })
  return Object.fromEntries(typed)
}

/** The form with another basis: its factors are those recommended, or those of the job where it has that basis. */
export function withBasis(form: BasisForm, basis: JobData['basis'], job: JobData): BasisForm {
  return { ...form, basis, factors: typedFactors(basis, basis === job.basis ? job.factors : []) }
}

/** What a job loses with another basis, as a sentence; null where the basis stays. */
export function lossOf(job: JobData, basis: string): string | null {
  if (basis === job.basis) return null
  const before = sourceOf(job.basis)
  const titles = (names: readonly string[], of: readonly { readonly key: string; readonly title: string }[]) =>
    names.map((name) => of.find(({ key }) => key === name)?.title ?? name).join('; ')
  const readings = titles(
    job.readings.map(({ readingId }) => readingId),
    before.readings.map(({ id, title }) => ({ key: id, title })),
  )
  const factors = titles(
    job.factors.map(({ name }) => name),
    before.factors.map(({ name, title }) => ({ key: name, title })),
  )
  return [
    `Once kept, every pour is checked by ${sourceOf(basis).title} alone.`,
    readings === ''
      ? `No reading of ${before.title} is accepted.`
      : `Accepted readings of ${before.title} count no longer and are withdrawn: ${readings}.`,
    factors === '' ? '' : `Factors set for ${before.title} are dropped: ${factors}.`,
    'The settings below stay as they are: look at friction and edge wedges.',
  ]
    .filter((sentence) => sentence !== '')
    .join(' ')
}

export interface ReadBasis {
  /** What the server takes; null while something cannot be read. */
  readonly change: ReturnType<typeof jobBasisSchema.parse> | null
  /** First message of each field: `settings.nearFrom`, `gammaC.value`, `gammaC.reason`. */
  readonly errors: Readonly<Record<string, string>>
}

/** Reads the form by the schema that the server reads as well. A factor as recommended is no setting of the job. */
export function readBasisForm(form: BasisForm, { id: jobId }: Pick<JobData, 'id'>): ReadBasis {
  const { basis } = form
  const known = sourceOf(basis).factors
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
