import { readFileSync } from 'node:fs'
import { toEngine } from '@wedgeline/contract'
import { checkPour, STATUSES } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { z } from 'zod'
import { demoLayout } from '../../db/seed/demo-layout'
import { demoWith } from '../contract/layout-edits'
import { demoFile, exampleFile, runNpm, temporaryFile } from './run-command'

const status = z.enum(STATUSES)
const checkSchema = z.looseObject({
  check: z.string().min(1),
  family: z.string().min(1),
  basis: z.literal('en-1992'),
  kindOfLimit: z.enum(['C', 'H', 'P']),
  clause: z.strictObject({ source: z.string().min(1), section: z.string(), tag: z.string().min(1) }),
  plane: z.enum(['thickness', 'plan']).nullable(),
  stage: z.string().nullable(),
  demand: z.number().nullable(),
  limit: z.number().nullable(),
  unit: z.string().nullable(),
  utilisation: z.number().nullable(),
  distance: z.number().nullable(),
  status: status.nullable(),
  notes: z.array(z.string()),
})
const reportSchema = z.strictObject({
  format: z.literal('wedgeline.checks'),
  version: z.literal(1),
  engineVersion: z.string().min(1),
  note: z.string().min(1),
  job: z.strictObject({ number: z.string(), title: z.string(), basis: z.string() }),
  stops: z.array(z.strictObject({ field: z.string(), message: z.string() })),
  pours: z.array(
    z.strictObject({
      pour: z.string(),
      counts: z.record(status, z.number()),
      zones: z.array(
        z.strictObject({
          zone: z.string().min(1),
          zoneId: z.string().min(1),
          kind: z.string(),
          status: status.nullable(),
          checks: z.array(checkSchema),
          notYetChecked: z.array(z.string()),
        }),
      ),
    }),
  ),
})

const reportOf = (stdout: string) => reportSchema.parse(JSON.parse(stdout))

describe('check', { timeout: 60_000 }, () => {
  test('prints the checks of the demo as JSON, nothing else, and exits 0 although checks are over', () => {
    const { status, stdout, stderr } = runNpm('check', [demoFile])
    expect(stderr).toBe('')
    expect(status).toBe(0)
    const report = reportOf(stdout)
    expect(report.pours.map(({ pour }) => pour)).toEqual(['P1', 'P2', 'P3'])
    const e105 = report.pours[0]?.zones.find(({ zone }) => zone === 'E1-05')
    // Planted fault: the centre stands 55 above the soffit and hardware S4 needs 75, so 20 are missing.
    expect(e105?.checks).toContainEqual(
      expect.objectContaining({
        check: 'Centre above soffit',
        kindOfLimit: 'H',
        demand: 55,
        limit: 75,
        unit: 'mm',
        utilisation: null,
        distance: -20,
        status: 'over',
      }),
    )
    // Every family of an anchor is made.
    expect(e105?.notYetChecked).toEqual([])
  })

  test('prints what the engine gives to everybody else', () => {
    const report = reportOf(runNpm('check', [exampleFile]).stdout)
    const demo = reportOf(runNpm('check', [demoFile]).stdout)
    for (const { pour, counts } of demo.pours) {
      expect(counts).toEqual(checkPour(toEngine(demoLayout()), { pourId: pour }).counts)
    }
    expect(report.pours).toHaveLength(1)
  })

  test('an anchor typed off its edge is reported as a stop and the rest is still checked', () => {
    const file = temporaryFile(JSON.stringify(demoWith('anchors.0.chainageMm', 19300)))
    const { status, stdout } = runNpm('check', [file])
    expect(status).toBe(0)
    const report = reportOf(stdout)
    expect(report.stops).toContainEqual({
      field: 'anchors[0].chainageMm',
      message: '19300 mm is off edge E2-P1; must lie within 0 mm to 19200 mm',
    })
    expect(report.pours).toHaveLength(3)
  })

  const whole = readFileSync(demoFile, 'utf8')
  test.each([
    { what: 'half a file', content: whole.slice(0, 20_000), field: 'file: is not JSON' },
    { what: 'an empty file', content: '', field: 'file: is empty' },
    {
      what: 'text for a number',
      content: JSON.stringify(demoWith('pours.1.thicknessMm', '220')),
      field: 'pours[1].thicknessMm: must be a number of mm, not text: write 220 without quotation marks',
    },
    {
      what: 'an outline that crosses itself',
      content: JSON.stringify(demoWith('pours.2.outline.1.yMm', 20_000)),
      field: 'pours[2].outline: crosses itself',
    },
    {
      what: 'a reference to nothing',
      content: JSON.stringify(demoWith('anchors.0.hardwareId', 'S9')),
      field: 'anchors[0].hardwareId: "S9" is no hardware of this file',
    },
  ])('$what: exit 2, nothing on stdout, the field on stderr', ({ content, field }) => {
    const { status, stdout, stderr } = runNpm('check', [temporaryFile(content)])
    expect(stdout).toBe('')
    expect(stderr).toContain(field)
    expect(status).toBe(2)
  })

  test.each([
    { what: 'no file', args: [], message: 'file: must be given once' },
    { what: 'two files', args: [demoFile, demoFile], message: 'file: must be given once' },
    { what: 'a file that is not there', args: ['/no/such/layout.json'], message: 'file: cannot be read' },
    { what: 'an option that it has not', args: ['--all', demoFile], message: 'Usage: npm run -s check' },
  ])('$what: exit 2 and how to call it', ({ args, message }) => {
    const { status, stdout, stderr } = runNpm('check', args)
    expect(stdout).toBe('')
    expect(stderr).toContain(message)
    expect(status).toBe(2)
  })
})
