import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { toEngine } from '@wedgeline/contract'
import { scheduleOf } from '@wedgeline/engine'
import ExcelJS from 'exceljs'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { demoWith } from '../contract/layout-edits'
import { demoFile, exampleFile, runNpm, temporaryFile, temporaryFolder } from './run-command'

async function textOf(path: string): Promise<string> {
  const book = new ExcelJS.Workbook()
  await book.xlsx.readFile(path)
  const cells: string[] = []
  book.eachSheet((sheet) => sheet.eachRow((row) => row.eachCell((cell) => cells.push(cell.text))))
  return cells.join('\n')
}

describe('schedule', { timeout: 60_000 }, () => {
  test('writes one workbook for a layout with one pour', async () => {
    const out = join(temporaryFolder(), 'x.xlsx')
    const { status, stdout, stderr } = runNpm('schedule', [exampleFile, '--out', out])
    expect(stderr).toBe('')
    expect(stdout).toBe(`${out}\n`)
    expect(status).toBe(0)
    expect(await textOf(out)).toContain('DRAFT: NOT FOR CONSTRUCTION')
  })

  test('writes a workbook for each pour of the demo, with every mark in it', async () => {
    const folder = temporaryFolder()
    const { status, stdout } = runNpm('schedule', [demoFile, '--out', join(folder, 'x.xlsx'), '--by', 'A. Drafter'])
    expect(status).toBe(0)
    const files = ['P1', 'P2', 'P3'].map((mark) => join(folder, `x-${mark}.xlsx`))
    expect(stdout).toBe(files.map((file) => `${file}\n`).join(''))
    const text = await textOf(files[1] ?? '')
    expect(text).toContain('A. Drafter')
    for (const { mark } of scheduleOf(toEngine(demoLayout()), 'P2').rows) expect(text.split('\n')).toContain(mark)
  })

  test('writes the pour that is asked for', () => {
    const out = join(temporaryFolder(), 'x.xlsx')
    expect(runNpm('schedule', [demoFile, '--out', out, '--pour', 'P3']).stdout).toBe(`${out}\n`)
    expect(existsSync(out)).toBe(true)
  })

  const broken = temporaryFile(JSON.stringify(demoWith('steel.0.shape.diameterMm', 11)))
  const tooLong = temporaryFile(JSON.stringify(demoWith('steel.0.shape.toMm', 17_000)))
  const strange = temporaryFile(JSON.stringify(demoWith('job.timeZone', 'Nowhere')))
  test.each([
    { what: 'no workbook named', args: [demoFile], message: '--out: is missing' },
    { what: 'another ending', args: [demoFile, '--out', 'x.csv'], message: '--out: "x.csv" must end in .xlsx' },
    { what: 'no such pour', args: [demoFile, '--out', 'x.xlsx', '--pour', 'P9'], message: 'must be one of P1, P2, P3' },
    {
      what: 'a broken layout',
      args: [broken, '--out', 'x.xlsx'],
      message: 'steel[0].shape.diameterMm: must be a bar size',
    },
    {
      what: 'a bar that no yard stocks',
      args: [tooLong, '--out', 'x.xlsx'],
      message: 'steel of pour P1: The schedule has errors',
    },
    { what: 'no time zone', args: [strange, '--out', 'x.xlsx'], message: 'job.timeZone: "Nowhere" is no time zone' },
  ])('$what: exit 2, nothing written, the field on stderr', ({ args, message }) => {
    const { status, stdout, stderr } = runNpm('schedule', args)
    expect(stdout).toBe('')
    expect(stderr).toContain(message)
    expect(status).toBe(2)
    expect(existsSync('x.xlsx')).toBe(false)
  })
})
