import { toEngine } from '@wedgeline/contract'
import { proposeSteel } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { z } from 'zod'
import { readLayoutFile } from '../../scripts/layout-file'
import { exampleFile, runNpm } from './run-command'

const reportSchema = z.looseObject({
  format: z.literal('wedgeline.proposal'),
  pours: z.array(
    z.looseObject({
      pour: z.string(),
      mass: z.number(),
      marks: z.number(),
      zones: z.array(z.looseObject({ zone: z.string().min(1), adds: z.array(z.looseObject({ kind: z.string() })) })),
    }),
  ),
})

describe('propose', { timeout: 120_000 }, () => {
  test('prints for each pour what the engine proposes to everybody else, and nothing else', () => {
    const { status, stdout, stderr } = runNpm('propose', [exampleFile])
    expect(stderr).toBe('')
    expect(status).toBe(0)
    const report = reportSchema.parse(JSON.parse(stdout))
    const layout = toEngine(readLayoutFile(exampleFile).layout)
    const proposals = layout.pours.map(({ id }) => proposeSteel(layout, { pourId: id }))
    expect(report.pours.map(({ mass, marks }) => ({ mass, marks }))).toEqual(
      proposals.map(({ mass, marks }) => ({ mass, marks })),
    )
    expect(report.pours.map(({ zones }) => zones.length)).toEqual(proposals.map(({ zones }) => zones.length))
  })

  test('without a file it says how it is used, and exits 2', () => {
    const { status, stdout, stderr } = runNpm('propose', [])
    expect(status).toBe(2)
    expect(stdout).toBe('')
    expect(stderr).toContain('Usage: npm run -s propose -- <layout file>')
  })
})
