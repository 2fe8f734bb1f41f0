import { expect, test } from 'vitest'
import { figureText, formulaParts, putIn, symbolPart } from '@/features/calculation/formula-text'

test('numbers stand where the names stood', () => {
  expect(putIn('0.25 * F * (b - a) / b', { F: 706560, a: 220, b: 1500 })).toBe(
    '0.25 × 706\u202f560 × (1500 − 220) / 1500',
  )
})

test('a name is replaced whole, not where it is part of another', () => {
  expect(putIn('s1 + s', { s: 2, s1: 3 })).toBe('3 + 2')
})

test('functions stay, and take their numbers', () => {
  expect(putIn('2 * min(before, after)', { before: 1850, after: 750 })).toBe('2 × min(1850, 750)')
})

test('a negative number stands in brackets', () => {
  expect(putIn('a - b', { a: 1, b: -2 })).toBe('1 − (−2)')
})

test('a name without a value is refused, not printed', () => {
  expect(() => putIn('a + b', { a: 1 })).toThrow('names b, which has no value')
})

test('numbers keep five figures, and whole ones all of them', () => {
  expect(figureText(78.53981633974483)).toBe('78.54')
  expect(figureText(502.443)).toBe('502.44')
  expect(figureText(0.0123456)).toBe('0.012346')
  expect(figureText(1234567.8)).toBe('1\u202f234\u202f568')
  expect(figureText(-0.5)).toBe('−0.5')
})

test('thousands stand apart from five figures on', () => {
  expect(figureText(9999)).toBe('9999')
  expect(figureText(10000)).toBe('10\u202f000')
  expect(figureText(-588800)).toBe('−588\u202f800')
  expect(figureText(12345.67)).toBe('12\u202f346')
})

test('symbols are set with what stands below the line', () => {
  expect(symbolPart('gammaP')).toEqual({ text: 'γ', below: 'P' })
  expect(symbolPart('sigmaS')).toEqual({ text: 'σ', below: 'S' })
  expect(symbolPart('AsCounted')).toEqual({ text: 'A', below: 's,counted' })
  expect(symbolPart('Fpk')).toEqual({ text: 'F', below: 'pk' })
  expect(symbolPart('cTop')).toEqual({ text: 'c', below: 'top' })
  expect(symbolPart('share')).toEqual({ text: 'share' })
  expect(symbolPart('T')).toEqual({ text: 'T' })
  expect(symbolPart('muTop')).toEqual({ text: 'μ', below: 'Top' })
})

test('a formula falls into signs and symbols', () => {
  expect(formulaParts('2 * min(cTop, c)')).toEqual([
    { text: '2 × ' },
    { text: 'min' },
    { text: '(' },
    { text: 'c', below: 'top' },
    { text: ', ' },
    { text: 'c' },
    { text: ')' },
  ])
})
