import { describe, expect, test } from 'vitest'
import { readPasted } from '@/features/edge/paste'

const context = { hardware: [{ id: 'h1', name: 'S4' }] }
const read = (text: string) => readPasted(text, context)

describe('pasted anchors', () => {
  test('distance, height and strands from a spreadsheet', () => {
    expect(read('900\t110\t4\r\n2100\t105\t3\r\n')).toEqual({
      anchors: [
        { chainageMm: 900, heightMm: 110, strands: 4 },
        { chainageMm: 2100, heightMm: 105, strands: 3 },
      ],
      problems: [],
    })
  })

  test('a first line of words names the columns, and from last counts on', () => {
    const { anchors } = read('From last\tEnd\tHeight\n600\tlive\t110\n1200\tdead\t100')
    expect(anchors.map(({ chainageMm, end, heightMm }) => [chainageMm, end, heightMm])).toEqual([
      [600, 'live', 110],
      [1800, 'dead', 100],
    ])
  })

  test('blank lines are passed over; other units are turned into mm', () => {
    expect(read('\n0.9 m;110;4\n\n').anchors[0]).toMatchObject({ chainageMm: 900, heightMm: 110, strands: 4 })
  })

  test.each([
    ['1,5\t110\t4', 'Distance'],
    ['900\tabc\t4', 'Height'],
    ['900\t110\t2.5', 'Strands'],
    ['900\t110\t0', 'Strands'],
    ['900\t110\t4\tboth', 'End'],
    ['900\t110\t4\tlive\tXX', 'Hardware'],
    ['\t110\t4', 'distance'],
  ])('%j names the line and %s', (line, field) => {
    const { anchors, problems } = read(`600\t110\t4\n${line}`)
    expect(anchors).toHaveLength(1)
    expect(problems).toHaveLength(1)
    expect(problems[0]?.line).toBe(2)
    expect(problems[0]?.message).toContain(field)
  })
})
