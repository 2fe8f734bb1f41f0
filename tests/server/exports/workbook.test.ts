import { runInNewContext } from 'node:vm'
import ExcelJS from 'exceljs'
import { describe, expect, test } from 'vitest'
import { scheduleOf, STATUSES, type SteelShape } from '@wedgeline/engine'
import { scheduleWorkbook, ScheduleBlockedError, type ScheduleWorkbookInput } from '@/server/exports/workbook'
import { anchor, layout, POUR } from '../../engine/sample-layout'
import { steel, OVER, SAMPLE, WITHIN, results, input } from './workbook-sample'

async function readBack(change: Partial<ScheduleWorkbookInput> = {}): Promise<ExcelJS.Workbook> {
  const book = new ExcelJS.Workbook()
  const written = await scheduleWorkbook(input(change))
  await book.xlsx.load(new Uint8Array(written).buffer)
  return book
}

function sheetOf(book: ExcelJS.Workbook, name: string): ExcelJS.Worksheet {
  const sheet = book.getWorksheet(name)
  if (!sheet) throw new Error(`no sheet ${name}`)
  return sheet
}

/** What a reader with formulas off sees. */
const seen = (cell: ExcelJS.Cell): unknown => (cell.type === ExcelJS.ValueType.Formula ? cell.result : cell.value)
const cellsOf = (book: ExcelJS.Workbook): unknown =>
  book.worksheets.map((sheet) => {
    const cells: unknown[] = []
    sheet.eachRow((row) => row.eachCell((cell) => cells.push([cell.address, cell.value, cell.numFmt, cell.font])))
    return [sheet.name, cells]
  })

const FIRST = 10

describe('Schedule sheet', () => {
  test('titles stand in the order of the schedule form', async () => {
    const titles = sheetOf(await readBack(), 'Schedule').getRow(9)
    expect(Array.from({ length: 14 }, (_, k) => titles.getCell(k + 1).value)).toEqual([
      'Member',
      'Bar mark',
      'Type and size',
      'No. of members',
      'No. in each',
      'Total no.',
      'Length of each bar (mm)',
      'Shape code',
      'A',
      'B',
      'C',
      'D',
      'E/R',
      'Rev letter',
    ])
  })

  test("every cell of every row is the engine's value: numbers as numbers, marks and codes as text", async () => {
    const sheet = sheetOf(await readBack(), 'Schedule')
    const { rows } = input().schedule
    expect(rows.map((row) => row.code)).toEqual(['00', '00', '21', '51', '77'])
    rows.forEach((row, k) => {
      const at = (column: number) => seen(sheet.getCell(FIRST + k, column))
      const { A = null, B = null, C = null, D = null, E = null, R = null } = row.dimensions
      const expected = [
        row.member?.name,
        row.mark,
        row.typeAndSize,
        row.members,
        row.inEach,
        row.total,
        row.length,
        row.code,
      ]
      expect(Array.from({ length: 14 }, (_, c) => at(c + 1))).toEqual([...expected, A, B, C, D, E ?? R, null])
      expect(sheet.getCell(FIRST + k, 2).type).toBe(ExcelJS.ValueType.String)
      expect(sheet.getCell(FIRST + k, 8).type).toBe(ExcelJS.ValueType.String)
      expect(sheet.getCell(FIRST + k, 7).type).toBe(ExcelJS.ValueType.Number)
      expect(at(17)).toBeCloseTo((row.massEach ?? 0) * row.total, 9)
    })
    expect(sheet.getCell(FIRST + rows.length, 1).value).toBeNull()
  })

  test('the first rows by hand', async () => {
    const sheet = sheetOf(await readBack(), 'Schedule')
    const line = (at: number) => Array.from({ length: 8 }, (_, k) => seen(sheet.getCell(at, k + 1)))
    // edge bars 1 + 1 of 9600; transverse 5 positions in two layers
    expect(line(10)).toEqual(['E2', '01', 'B12', 1, 10, 10, 1400, '00'])
    expect(line(11)).toEqual(['E2', '02', 'B12', 1, 2, 2, 9600, '00'])
    // 600 + 150 + 600 - 20 - 20 = 1310, up to 1325
    expect(line(12)).toEqual(['E2', '03', 'B10', 1, 2, 2, 1325, '21'])
    // 2 (300 + 140 + 130) - 50 - 50 = 1040, up to 1050; links at both anchors of E2
    expect(line(13)).toEqual(['E2', '04', 'B10', 2, 4, 8, 1050, '51'])
    // 6 sqrt((pi 218)^2 + 55^2) = 4122.4, up to 4125
    expect(line(14)).toEqual(['E4', '05', 'B12', 1, 1, 1, 4125, '77'])
    expect(sheet.getCell('S14').value).toBe('6 turns of which 2 flat')
  })

  test('each formula, worked out from its cells, gives the frozen value beside it', async () => {
    const sheet = sheetOf(await readBack(), 'Schedule')
    const given = {
      CEILING: (value: number, to: number) => Math.ceil(value / to) * to,
      ROUND: (value: number, digits: number) => Number(value.toFixed(digits)),
      SQRT: Math.sqrt,
      PI: () => Math.PI,
    }
    const worked = (formula: string): number => {
      const text = formula.replaceAll(/[A-Z]+\d+/g, (address) => String(Number(seen(sheet.getCell(address)))))
      return Number(runInNewContext(text, given))
    }
    input().schedule.rows.forEach((row, k) => {
      for (const [column, value] of [
        [6, row.total],
        [16, row.length],
        [18, (row.massEach ?? 0) * row.total],
      ] as const) {
        const cell = sheet.getCell(FIRST + k, column)
        expect(cell.formula).toBeTruthy()
        expect(cell.result).toBeCloseTo(value ?? 0, 9)
        expect(worked(cell.formula)).toBeCloseTo(value ?? 0, 6)
      }
    })
  })

  test('header: draft until approved, edition, families not yet checked, cautions', async () => {
    const sheet = sheetOf(await readBack(), 'Schedule')
    expect(sheet.getCell('J1').value).toBe('DRAFT: NOT FOR CONSTRUCTION')
    expect(sheet.getCell('C2').value).toBe('QM-1 Quillmarsh Yard Podium (invented)')
    expect(sheet.getCell('J2').value).toBe('QM1 01')
    expect(sheet.getCell('C4').value).toBe('D. Rafter (invented)')
    expect(sheet.getCell('J4').value).toBe('2026-03-02')
    expect(sheet.getCell('A6').value).toContain('BS 8666:2020')
    expect(sheet.getCell('A6').value).toContain('do not replace one')
    expect(sheet.getCell('A7').value).toBe('Not yet checked: fit of the steel, spalling and edge tension.')
    const approved = await readBack({ approval: { by: 'E. Ngineer (invented)', on: '2026-03-03' } })
    expect(sheetOf(approved, 'Schedule').getCell('J1').value).toBe('APPROVED by E. Ngineer (invented) on 2026-03-03')
  })

  test('a real table, frozen heads, named ranges, A4 landscape, page numbers, properties', async () => {
    const book = await readBack()
    const sheet = sheetOf(book, 'Schedule')
    expect(sheet.getTables().map((table) => (table as unknown as { name: string }).name)).toEqual(['BarSchedule'])
    expect(sheet.views[0]).toMatchObject({ state: 'frozen', ySplit: 9 })
    expect(sheet.pageSetup).toMatchObject({
      paperSize: 9,
      orientation: 'landscape',
      fitToWidth: 1,
      printArea: 'A1:N14',
    })
    expect(sheet.headerFooter.oddFooter).toContain('Page &P of &N')
    expect(book.definedNames.getRanges('BarLengths').ranges).toEqual(['Schedule!$G$10:$G$14'])
    expect(book.definedNames.getRanges('AllMass').ranges).toEqual(['Summary!$E$7'])
    expect(book.title).toBe('Bar schedule QM1 01')
    expect(book.creator).toBe('D. Rafter (invented)')
    expect(book.created.getTime()).toBe(Date.UTC(2026, 2, 2, 9, 30))
    for (const each of book.worksheets) {
      expect(each.model.merges ?? []).toEqual([])
    }
  })
})

describe('Summary sheet', () => {
  test('metres and kilograms by type and size, arithmetic written out', async () => {
    const sheet = sheetOf(await readBack(), 'Summary')
    const line = (at: number) => [1, 2, 3, 4, 5].map((column) => seen(sheet.getCell(at, column)))
    // B10: 2 x 1.325 + 8 x 1.05 = 11.05 m x 0.616 = 6.8068 kg
    expect(line(5).slice(0, 4)).toEqual(['B10', 10, expect.closeTo(11.05, 9), 0.616])
    expect(line(5)[4]).toBeCloseTo(6.8068, 9)
    // B12: 10 x 1.4 + 2 x 9.6 + 4.125 = 37.325 m x 0.888 = 33.1446 kg
    expect(line(6).slice(0, 4)).toEqual(['B12', 13, expect.closeTo(37.325, 9), 0.888])
    expect(line(6)[4]).toBeCloseTo(33.1446, 9)
    expect(line(7)).toEqual(['All bars', 23, expect.closeTo(48.375, 9), null, expect.closeTo(39.9514, 9)])
    expect(sheet.getCell('C5').formula).toBe('SUMPRODUCT((BarTypes=A5)*BarTotals*BarLengths)/1000')
    expect(sheet.getCell('E7').formula).toBe('SUM(E5:E6)')
  })
})

describe('Checks and Notes sheets', () => {
  test('what is not covered or over is listed, worst first; what is within is not', async () => {
    const sheet = sheetOf(await readBack(), 'Checks')
    expect([6, 7, 8].map((at) => sheet.getCell(at, 2).value)).toEqual([
      'Bursting in plan',
      'Bearing under the plate',
      null,
    ])
    expect(sheet.getCell('M6').value).toBe('chainage: The gaps differ by more than a fifth. Net area.')
    // 588800 / 588200 = 1.00102, which must not read 1.00; N are shown as kN
    expect([7, 8, 9, 10].map((column) => sheet.getCell(7, column).value)).toEqual([588.8, 588.2, 'kN', 1.01])
    expect(sheet.getCell('L7').value).toBe('EN 1992-1-1 6.7')
    expect([9, 10, 11].map((at) => [sheet.getCell(at, 1).value, sheet.getCell(at, 2).value])).toEqual([
      ['Not yet checked', 'Zones that it would apply to'],
      ['fit of the steel', 1],
      ['spalling and edge tension', 0],
    ])
  })

  test('with nothing open it says only that, and never that the structure is safe', async () => {
    const counts = { ...results([]).counts, over: 0, 'not-covered': 0, within: 1 }
    const book = await readBack({ checks: { ...results([WITHIN]), counts } })
    const sheet = sheetOf(book, 'Checks')
    expect(sheet.getCell('A5').value).toBe(
      'No check that was made is a stop, not covered, over or in need of judgement.',
    )
    expect(STATUSES.every((status) => sheet.getCell('A3').text.includes(status.replaceAll('-', ' ')))).toBe(true)
    expect(JSON.stringify(cellsOf(book))).not.toMatch(/\b(safe|ready|OK)\b/)
  })

  test('notes hold edition, cover, concrete, laps, cautions, notes of marks and what is from memory', async () => {
    const sheet = sheetOf(await readBack(), 'Notes')
    const text: string[] = []
    sheet.eachRow((row) => text.push(`${row.getCell(1).text}|${row.getCell(2).text}`))
    const all = text.join('\n')
    expect(all).toContain('Cover|top 30, soffit 30, edge 30 mm')
    expect(all).toContain('Concrete|C32/40, slab 220 mm')
    expect(all).toContain('Laps|Straight bars over the stock length of 12000 mm are split and lapped')
    expect(all).toContain('Source|Supports: chairs and spacers are not scheduled here')
    expect(all).toContain('Caution|Local codes and licensed practice govern.')
    expect(all).toContain('Mark 05|6 turns of which 2 flat')
    expect(all).toContain('Source|From memory: dimensions to the nearest 5 mm')
    expect(all).toContain('0.1.0+abcdef012345')
  })
})

describe('Deliveries, Shapes, Zones and Revisions sheets', () => {
  const DELIVERIES = [
    { id: 'a', name: 'First week', neededOn: '2026-03-09', edgeIds: ['E2'], panIds: [] },
    { id: 'b', name: 'Second week', neededOn: null, edgeIds: ['E1'], panIds: [] },
  ]
  const delivered = () =>
    readBack({
      schedule: scheduleOf(
        { ...SAMPLE, pours: SAMPLE.pours.map((pour) => ({ ...pour, deliveries: DELIVERIES })) },
        'P1',
      ),
    })

  test('bars by delivery, what is not assigned last, and their sum', async () => {
    const book = await delivered()
    const sheet = sheetOf(book, 'Deliveries')
    const line = (at: number) => [1, 2, 3, 4, 6].map((column) => seen(sheet.getCell(at, column)))
    // E2: 10 x 1.4 + 2 x 9.6 = 33.2 m x 0.888 + (2 x 1.325 + 8 x 1.05) x 0.616 = 29.4816 + 6.8068
    expect(line(5)).toEqual(['First week', '2026-03-09', 'E2', 22, expect.closeTo(36.2884, 9)])
    expect(line(6)).toEqual(['Second week', 'no day agreed', 'no bars', 0, 0])
    // the helix of E4: 4.125 x 0.888
    expect(line(7)).toEqual(['not assigned', 'no day agreed', 'E4', 1, expect.closeTo(3.663, 9)])
    expect(line(8)[4]).toBeCloseTo(39.9514, 9)
    expect(sheet.getCell('D5').formula).toBe('SUMIFS(BarTotals,BarDeliveries,A5)')
    expect(sheetOf(book, 'Schedule').getCell('T10').value).toBe('First week')
  })

  test('without deliveries there is no sheet of them', async () => {
    expect((await readBack()).worksheets.map(({ name }) => name)).toEqual([
      'Schedule',
      'Summary',
      'Shapes',
      'Zones',
      'Checks',
      'Notes',
      'Revisions',
    ])
  })

  test('every shape with its title, a picture of its own, its formula and its marks', async () => {
    const sheet = sheetOf(await readBack(), 'Shapes')
    expect([5, 6, 7, 8].map((at) => [sheet.getCell(at, 1).value, sheet.getCell(at, 2).value])).toEqual([
      ['00', 'straight'],
      ['21', 'hairpin'],
      ['51', 'closed link'],
      ['77', 'helix'],
    ])
    expect(sheet.getCell('E5').value).toBe('01, 02')
    expect(sheet.getImages().map(({ range }) => range.tl.nativeRow)).toEqual([4, 5, 6, 7])
  })

  test('the worst check of each zone and its counts; readings with their state', async () => {
    const rests = { ...OVER, readingIds: ['en-own-prism'] }
    const sheet = sheetOf(await readBack({ checks: results([rests, WITHIN]) }), 'Zones')
    // 588800 / 588200 = 1.00102, shown as 1.01; over 1, within 1
    expect([1, 2, 3, 4].map((column) => sheet.getCell(5, column).value)).toEqual([
      'E2-01',
      'over',
      'Bearing under the plate',
      1.01,
    ])
    expect([6, 7, 8, 9, 10, 11].map((column) => sheet.getCell(5, column).value)).toEqual([0, 0, 1, 0, 0, 1])
    expect(sheet.getCell('H6').formula).toBe('SUM(H5:H5)')
    expect([2, 4].map((column) => sheet.getCell(9, column).value)).toEqual(['not accepted yet', 1])
  })

  test('one line for what is not issued yet', async () => {
    const sheet = sheetOf(await readBack(), 'Revisions')
    expect([1, 2, 3, 4].map((column) => sheet.getCell(4, column).value)).toEqual([
      '-',
      '2026-03-02',
      'D. Rafter (invented)',
      'First draft: not issued, without a revision letter.',
    ])
  })

  test('by kind of bar and the longest bar', async () => {
    const sheet = sheetOf(await readBack(), 'Summary')
    const line = (at: number) => [1, 2, 3].map((column) => seen(sheet.getCell(at, column)))
    expect([10, 11, 12, 13, 14].map((at) => line(at)[0])).toEqual([
      'spirals',
      'links',
      'hairpins',
      'transverse bars',
      'edge bars',
    ])
    expect(line(14)).toEqual(['edge bars', 2, 19.2])
    expect(line(16)).toEqual(['Longest bar (mm)', 9600, 'mark 02'])
  })
})

describe('holding', () => {
  test('the same input gives the same bytes, whatever the time', async () => {
    const first = await scheduleWorkbook(input())
    // a zip file's times go in steps of 2 s
    await new Promise((resolve) => setTimeout(resolve, 2100))
    const second = await scheduleWorkbook(input())
    expect(second.equals(first)).toBe(true)
  })

  test('the same input gives the same cells', async () => {
    expect(cellsOf(await readBack())).toEqual(cellsOf(await readBack()))
  })

  test.each(['=1+1', '+44 20', '-1', '@SUM(A1)', '=cmd|/c calc!A1', "'=1", '<b>&amp;"'])(
    'text %j stays text',
    async (text) => {
      const book = await readBack({
        reference: text,
        drawing: text,
        preparedBy: text,
        job: { number: text, title: text },
        pour: { ...POUR, mark: text, concrete: text },
      })
      const sheet = sheetOf(book, 'Schedule')
      expect(sheet.getCell('J2').value).toBe(text)
      expect(sheet.getCell('J2').type).toBe(ExcelJS.ValueType.String)
      expect(sheet.getCell('C4').value).toBe(text)
    },
  )

  test('one cell with another style leaves its neighbours as they are', async () => {
    const sheet = sheetOf(await readBack(), 'Schedule')
    expect(sheet.getCell('B10').numFmt).toBe('@')
    expect(sheet.getCell('A10').numFmt).toBeUndefined()
    expect(sheet.getCell('A9').font.bold).toBe(true)
    expect(sheet.getCell('A10').style.font).toBeUndefined()
  })

  test('it is blocked while a mark has an error, and says each', async () => {
    // An H10 link of 120 cannot take its hooks of 130.
    const links: SteelShape = {
      kind: 'links',
      diameter: 10,
      width: 300,
      height: 120,
      hook: 130,
      count: 4,
      first: 30,
      pitch: 50,
    }
    const wrong = layout({ anchors: [anchor('E2', 1)], steel: [steel('l', 'E2-1', links)] })
    const attempt = scheduleWorkbook(input({ schedule: scheduleOf(wrong, 'P1') }))
    await expect(attempt).rejects.toBeInstanceOf(ScheduleBlockedError)
    await expect(attempt).rejects.toMatchObject({ problems: [{ mark: '01', field: 'B', where: 'E2-01' }] })
    await expect(attempt).rejects.toThrow('make B 130 or more')
  })

  test('a pour without bars is blocked', async () => {
    await expect(scheduleWorkbook(input({ schedule: scheduleOf(layout(), 'P1') }))).rejects.toThrow('no bars yet')
  })
})
