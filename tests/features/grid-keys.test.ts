import { describe, expect, test } from 'vitest'
import { afterCommit, isTyping, moved } from '@/features/edge/table/grid-keys'

const extent = { rows: 4, columns: 7 }
const press = (key: string, change = {}) => ({ key, ctrl: false, shift: false, ...change })

describe('grid keys', () => {
  test('arrows move and stop at the border', () => {
    expect(moved({ row: 1, column: 2 }, extent, press('ArrowDown'))).toEqual({ row: 2, column: 2 })
    expect(moved({ row: 3, column: 2 }, extent, press('ArrowDown'))).toEqual({ row: 3, column: 2 })
    expect(moved({ row: 0, column: 0 }, extent, press('ArrowLeft'))).toEqual({ row: 0, column: 0 })
    expect(moved({ row: 0, column: 6 }, extent, press('ArrowRight'))).toEqual({ row: 0, column: 6 })
  })

  test('Home and End along the row, with Ctrl to the corners', () => {
    expect(moved({ row: 2, column: 3 }, extent, press('Home'))).toEqual({ row: 2, column: 0 })
    expect(moved({ row: 2, column: 3 }, extent, press('End'))).toEqual({ row: 2, column: 6 })
    expect(moved({ row: 2, column: 3 }, extent, press('End', { ctrl: true }))).toEqual({ row: 3, column: 6 })
    expect(moved({ row: 2, column: 3 }, extent, press('x'))).toBeNull()
  })

  test('Enter goes down, Tab along and on to the next row, and out of the grid at its ends', () => {
    expect(afterCommit({ row: 1, column: 2 }, extent, press('Enter'))).toEqual({ row: 2, column: 2 })
    expect(afterCommit({ row: 1, column: 2 }, extent, press('Enter', { shift: true }))).toEqual({ row: 0, column: 2 })
    expect(afterCommit({ row: 1, column: 6 }, extent, press('Tab'))).toEqual({ row: 2, column: 0 })
    expect(afterCommit({ row: 1, column: 0 }, extent, press('Tab', { shift: true }))).toEqual({ row: 0, column: 6 })
    expect(afterCommit({ row: 3, column: 6 }, extent, press('Tab'))).toBeNull()
    expect(afterCommit({ row: 0, column: 0 }, extent, press('Tab', { shift: true }))).toBeNull()
  })

  test('a character begins to type, a command does not', () => {
    expect(isTyping(press('6'))).toBe(true)
    expect(isTyping(press('c', { ctrl: true }))).toBe(false)
    expect(isTyping(press('Escape'))).toBe(false)
  })
})
