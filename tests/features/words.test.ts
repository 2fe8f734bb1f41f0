import type { Compared } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import {
  checkWords,
  notYetText,
  outcomeText,
  quantityText,
  ratioText,
  shownQuantity,
  sidesText,
} from '@/features/checks/words'

const check = (change: Partial<Compared>): Compared => ({
  kind: 'compared',
  zoneId: 'anchor:a',
  family: 'bursting-plan',
  name: 'Bursting in plan',
  plane: 'plan',
  stage: 'full',
  limitKind: 'C',
  clause: { source: 'EN 1992-1-1', section: '6.5.3', tag: 'digest' },
  notes: [],
  status: 'within',
  demand: 377,
  limit: 452,
  unit: 'mm2',
  compares: 'ratio',
  utilisation: 377 / 452,
  spare: null,
  steps: [],
  readingIds: [],
  statusOnceAccepted: 'within',
  mend: null,
  ...change,
})

describe('checks in words', () => {
  test.each([
    [0.834, '0.84'],
    [0.7, '0.70'],
    [1, '1.00'],
    [1.0000001, '1.01'],
    [1.001, '1.01'],
    [0.9999, '1.00'],
    [null, 'no steel'],
  ])('ratio %s rounds up to %s', (ratio, text) => {
    expect(ratioText(ratio)).toBe(text)
  })

  test('a ratio with both its sides', () => {
    expect(sidesText(check({}))).toBe('377 mm² of 452 mm²')
    // 377 / 452 = 0.83407..., rounded up.
    expect(checkWords(check({}))).toBe('Bursting in plan 0.84')
    expect(checkWords(check({ limit: 0, utilisation: null }))).toBe('Bursting in plan, no steel')
  })

  test('distances say what is spare or short', () => {
    const height = check({
      name: 'Centre above soffit',
      compares: 'at-least',
      unit: 'mm',
      demand: 62,
      limit: 75,
      utilisation: null,
      spare: -13,
    })
    expect(sidesText(height)).toBe('62 mm, needs 75 mm')
    expect(outcomeText(height)).toBe('short by 13 mm')
    expect(outcomeText({ ...height, spare: 35 })).toBe('spare 35 mm')
  })

  test('figures keep what matters, forces in kN', () => {
    expect(quantityText(20.99, 'MPa')).toBe('21 MPa')
    expect(quantityText(0.477, '-')).toBe('0.48')
    expect(shownQuantity(588_800, 'N')).toBe('589 kN')
  })

  test('families not yet checked make one sentence', () => {
    expect(notYetText(['spalling', 'fit'])).toBe('Not yet checked here: spalling and edge tension, fit of the steel.')
    expect(notYetText([])).toBeNull()
  })
})
