import { toEngine } from '@wedgeline/contract'
import { BASIS_SOURCES, checkPour, type Check, type Layout } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { evaluated } from './step-text'

/** The demo with its basis changed and nothing else: what a job is after its engineer has chosen AS 3600. */
const demo = toEngine(demoLayout())
const switched: Layout = { ...demo, job: { ...demo.job, basis: 'as-3600', factors: [], readings: [] } }
const checks: readonly Check[] = switched.pours.flatMap(({ id }) =>
  checkPour(switched, { pourId: id, withSteps: true }).zones.flatMap((zone) => zone.checks),
)
const compared = checks.filter((check) => check.kind === 'compared')

describe('the demo as a job by AS 3600', () => {
  test('every step has a text that evaluates to the value beside it', () => {
    const steps = compared.flatMap((check) => check.steps)
    expect(steps.length).toBeGreaterThan(100)
    for (const line of steps) {
      const difference = Math.abs(evaluated(line) - line.value)
      expect(difference, `${line.symbol} = ${line.formula}`).toBeLessThanOrEqual(
        1e-9 * Math.max(1, Math.abs(line.value)),
      )
    }
  })

  test('every bursting demand is the unfactored force at 150 MPa', () => {
    const bursting = compared.filter(({ family }) => family.startsWith('bursting'))
    expect(bursting.length).toBeGreaterThan(10)
    for (const { steps, clause } of bursting) {
      expect(clause.source).toBe('AS 3600:2018')
      const area = steps.find(({ symbol }) => symbol === 'As')
      expect(area?.values.sigmaS).toBe(150)
      expect(steps.some(({ values }) => 'gammaP' in values)).toBe(false)
    }
  })

  test('no limit of the code and no reading comes from another basis', () => {
    for (const check of compared.filter(({ limitKind }) => limitKind === 'C')) {
      expect(check.clause.source, check.name).not.toContain('EN 1992')
    }
    const others = new Set(
      BASIS_SOURCES.filter(({ id }) => id !== 'as-3600').flatMap(({ readings }) => readings.map(({ id }) => id)),
    )
    for (const { readingIds } of compared) expect(readingIds.filter((id) => others.has(id))).toEqual([])
  })
})
