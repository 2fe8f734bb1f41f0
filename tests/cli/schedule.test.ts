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

  test('writes one workbook for the demo, each pour on sheets of its own with every mark in it', async () => {
    const out = join(temporaryFolder(), 'x.xlsx')
    const { status, stdout } = runNpm('schedule', [demoFile, '--out', out, '--by', 'A. Drafter'])
    expect(status).toBe(0)
    expect(stdout).toBe(`${out}\n`)
    const book = new ExcelJS.Workbook()
    await book.xlsx.readFile(out)
    const kinds = ['Schedule', 'Summary', 'Shapes', 'Zones', 'Checks', 'Notes', 'Revisions']
    expect(book.worksheets.map(({ name }) => name)).toEqual(
      ['P1', 'P2', 'P3'].flatMap((mark) => kinds.map((kind) => `${kind} ${mark}`)),
    )
    for (const pour of ['P1', 'P2', 'P3']) {
      const marks = book.getWorksheet(`Schedule ${pour}`)?.getColumn(2).values ?? []
      for (const { mark } of scheduleOf(toEngine(demoLayout()), pour).rows) expect(marks).toContain(mark)
    }
    const first = book.getWorksheet('Summary P2')?.getCell('B5').value
    expect(first).toMatchObject({ formula: 'SUMIFS(BarTotals_2,BarTypes_2,A5)' })
    expect(book.definedNames.getRanges('BarTotals_2').ranges[0]).toMatch(/^'Schedule P2'!\$F\$10:/)
  })

  test('writes the pour that is asked for', () => {
    const out = join(temporaryFolder(), 'x.xlsx')
    expect(runNpm('schedule', [demoFile, '--out', out, '--pour', 'P3']).stdout).toBe(`${out}\n`)
    expect(existsSync(out)).toBe(true)
  })

  const broken = temporaryFile(JSON.stringify(demoWith('steel.0.shape.diameterMm', 11)))
  // Between two bends of 12 mm the standard asks for 120.
  const tight = { kind: 'hairpins', diameterMm: 12, legMm: 600, bendMm: 40, count: 2, pitchMm: 100 }
  const unbendable = temporaryFile(JSON.stringify(demoWith('steel.25.shape', tight)))
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
      what: 'a bar that no yard bends',
      args: [unbendable, '--out', 'x.xlsx'],
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
