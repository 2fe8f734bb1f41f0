import { describe, expect, test } from 'vitest'
import { formatNumber, MAGNITUDE_MAX, parseNumber } from '@/components/ui/number-text'
import type { Separator } from '@/components/ui/number-text'

const mm = (text: string, separator: Separator = null) => parseNumber(text, { unit: 'mm', separator })
const number = (value: number, shownAs: string | null = null) => ({ kind: 'number', value, shownAs })
const choices = (text: string, separator: Separator = null) => {
  const read = mm(text, separator)
  return read.kind === 'ambiguous' ? read.choices : read
}

describe('plain numbers', () => {
  test.each([
    ['110', 110],
    [' 110 ', 110],
    ['+110', 110],
    ['-62', -62],
    ['62.5', 62.5],
    ['.5', 0.5],
    ['5.', 5],
    ['0.375', 0.375],
    ['1e3', 1000],
    ['1 234', 1234],
    ["1'234'567", 1234567],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['1,234,567', 1234567],
    ['0,375', 0.375],
  ])('%s', (text, value) => expect(mm(text)).toEqual(number(value)))

  test('nothing typed is not nought', () => expect(mm('  ')).toEqual({ kind: 'empty' }))
  test('minus nought is nought', () => {
    const read = mm('-0')
    expect(read.kind === 'number' && Object.is(read.value, 0)).toBe(true)
  })
})

describe('a comma or a point with two meanings is asked about', () => {
  test('1,5 is never silently 15', () => expect(choices('1,5')).toEqual([1.5, 15]))
  test('1,5 of somebody who writes points', () => expect(choices('1,5', '.')).toEqual([1.5, 15]))
  test('1,500 may be a group', () => expect(choices('1,500')).toEqual([1.5, 1500]))
  test('1.500 may be a group', () => expect(choices('1.500')).toEqual([1.5, 1500]))
  test('1.5 of somebody who writes commas', () => expect(choices('1.5', ',')).toEqual([1.5, 15]))
  test('the setting settles it', () => {
    expect(mm('1,5', ',')).toEqual(number(1.5))
    expect(mm('1.500', '.')).toEqual(number(1.5))
    expect(mm('1.500', ',')).toEqual(number(1500))
    expect(mm('1,500', '.')).toEqual(number(1500))
  })
  test('the question names both', () =>
    expect(mm('1,5')).toHaveProperty('message', '“1,5” can be read as 1.5 mm or 15 mm. Which is meant?'))
})

describe('units', () => {
  test.each([
    ['1.2 m', 1200, '1200 mm'],
    ['1.2m', 1200, '1200 mm'],
    ['12 cm', 120, '120 mm'],
    // 6 x 25.4 = 152.4
    ['6 in', 152.4, '152.4 mm'],
    ['6"', 152.4, '152.4 mm'],
    // 4 x 304.8 = 1219.2
    ['4 ft', 1219.2, '1219.2 mm'],
    ['1.2e3 cm', 12000, '12000 mm'],
  ])('%s in a field of mm', (text, value, shownAs) => expect(mm(text)).toEqual(number(value, shownAs)))

  test('an area has a figure in its unit', () =>
    expect(parseNumber('4.91 cm2', { unit: 'mm2', separator: null })).toEqual(number(491, '491 mm2')))

  test('the field’s own unit needs no conversion', () => expect(mm('110 mm')).toEqual(number(110)))
  test('kN in a field of N and back', () => {
    expect(parseNumber('588.8 kN', { unit: 'N', separator: null })).toEqual(number(588800, '588800 N'))
    expect(parseNumber('588800 N', { unit: 'kN', separator: null })).toEqual(number(588.8, '588.8 kN'))
  })
  test('1 ksi is 1000 lbf on a square inch: 4448.2216152605 / 645.16 = 6.89475729317 MPa', () =>
    expect(parseNumber('1 ksi', { unit: 'MPa', separator: null })).toHaveProperty('value', 6.89475729317))
  test('a force is no length', () => {
    expect(mm('12 kN')).toEqual({
      kind: 'unreadable',
      message: '“kN” is not a unit that can be turned into mm. Type the number in mm.',
    })
  })
  test('a count has no unit', () =>
    expect(parseNumber('4 mm', { unit: null, separator: null })).toEqual({
      kind: 'unreadable',
      message: 'This is a plain number, without a unit. Leave out “mm”.',
    }))
})

describe('other digits', () => {
  test.each(['٣٣٠٠', '۳۳۰۰', '३३००', '３３００'])('%s is read and shown in figures', (text) =>
    expect(mm(text)).toEqual(number(3300, '3300 mm')),
  )
  test('Arabic decimal and group signs', () => {
    expect(mm('١٢٫٥')).toEqual(number(12.5, '12.5 mm'))
    expect(mm('١٬٢٣٤')).toEqual(number(1234, '1234 mm'))
  })
  test('the printed minus', () => expect(mm('−62')).toHaveProperty('value', -62))
})

describe('what cannot be read says so', () => {
  test.each(['abc', '1..2', '1,2,3', '12 34', '--1', '1.2.3,4', 'NaN', 'Infinity', '.', '-', '1 m 2', '0x10', '1/2'])(
    '%s',
    (text) => expect(mm(text).kind).toBe('unreadable'),
  )
  test('too large: below, on and above the limit', () => {
    expect(mm('999999999999')).toEqual(number(999999999999))
    expect(mm(String(MAGNITUDE_MAX))).toEqual(number(MAGNITUDE_MAX))
    expect(mm('1000000000001').kind).toBe('unreadable')
    expect(mm('1e308').kind).toBe('unreadable')
    expect(mm('1e309').kind).toBe('unreadable')
    expect(mm('-1e308').kind).toBe('unreadable')
    expect(mm('1e308')).toHaveProperty('message', '“1e308” is too large for any quantity here. Type a smaller number.')
  })
})

describe('shown', () => {
  test.each([
    [1200, '.', '1200'],
    [0.1 + 0.2, '.', '0.3'],
    [62.5, ',', '62,5'],
    [-0, '.', '0'],
    [1e-7, '.', '0.0000001'],
    [123456789, null, '123456789'],
  ] as const)('%d with %s', (value, separator, text) => expect(formatNumber(value, separator)).toBe(text))
})
