import { jobBasisSchema, jobSettingsSchema, type JobData } from '@wedgeline/contract'
import { BASIS_SOURCES } from '@wedgeline/engine/bases'
import { describe, expect, test } from 'vitest'
import { basisFormOf, lossOf, readBasisForm, withBasis } from '@/features/job/basis-form'
import { settingGroups } from '@/features/job/setting-fields'
import { BASIS_OPTIONS } from '@/features/jobs/bases'

const job: JobData = {
  id: '0190a000-0000-7000-8000-000000000001',
  number: '1',
  title: 'Invented car park',
  timeZone: 'Europe/London',
  basis: 'en-1992',
  factors: [{ name: 'gammaP', value: 1.3, reason: 'National annex' }],
  readings: [{ readingId: 'en-window', acceptedBy: 'A. Engineer', acceptedAtMs: 1, reason: 'Elastic figures' }],
  settings: jobSettingsSchema.parse({}),
}

describe('the bases that can be chosen', () => {
  test('are those of the engine, by name, and those that the contract lets through', () => {
    expect(BASIS_OPTIONS.map(({ value, label }) => [value, label])).toEqual(
      BASIS_SOURCES.map(({ id, title }) => [id, title]),
    )
    expect(BASIS_OPTIONS.map(({ value }) => value)).toEqual(jobBasisSchema.shape.basis.options)
  })
})

describe('another basis', () => {
  test('says by name which readings and factors go, before anything is kept', () => {
    const loss = lossOf(job, 'as-3600')
    expect(loss).toContain('checked by AS 3600:2018 alone')
    expect(loss).toContain('withdrawn: Bursting steel counts from 0.2 b to 1.0 b')
    expect(loss).toContain('dropped: Factor on prestress for local effects')
    expect(lossOf(job, 'en-1992')).toBeNull()
  })

  test('sends its own recommended factors alone; back again the job’s own stand as before', () => {
    const other = withBasis(basisFormOf(job), 'as-3600', job)
    expect(readBasisForm(other, job).change).toMatchObject({ basis: 'as-3600', factors: [] })
    const back = withBasis(other, 'en-1992', job)
    expect(back).toEqual(basisFormOf(job))
    expect(readBasisForm(back, job).change?.factors).toEqual(job.factors)
  })

  test('takes a factor of its own', () => {
    const other = withBasis(basisFormOf(job), 'as-3600', job)
    const set = { ...other, factors: { ...other.factors, transferFactor: { value: 1.15, reason: 'office rule' } } }
    expect(readBasisForm(set, job).change?.factors).toEqual([
      { name: 'transferFactor', value: 1.15, reason: 'office rule' },
    ])
  })
})

describe('fields of the settings', () => {
  test.each(BASIS_OPTIONS)('$label: every setting of a job has one field', ({ value }) => {
    const names = settingGroups(value).flatMap(({ fields }) => fields.map(({ name }) => name))
    expect([...names].sort()).toEqual(Object.keys(jobSettingsSchema.shape).sort())
  })

  test('usual friction and spread are those of the basis', () => {
    const words = (basis: string) => JSON.stringify(settingGroups(basis))
    expect(words('en-1992')).toContain('own: 33.7°')
    expect(words('as-3600')).toContain('own: 45°')
    expect(words('as-3600')).toContain('0.016 to 0.024')
  })
})
