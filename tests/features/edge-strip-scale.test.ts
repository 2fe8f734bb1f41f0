import { describe, expect, test } from 'vitest'
import { fittingLabels, heightStretch, scrolled, showing, stripScale, zoomed } from '@/features/edge/strip/scale'

const edge = { from: 0, to: 12_000 }
const scale = (growsRight: boolean, view = edge) => stripScale({ view, left: 100, width: 1200, growsRight })

describe('strip scale', () => {
  test('0.1 px a mm from the left margin, both ways round', () => {
    // 12 000 mm in 1200 px; chainage 3300 stands 330 px in, or 870 px in where chainage runs to the left.
    expect(scale(true).x(3300)).toBe(430)
    expect(scale(false).x(3300)).toBe(970)
    expect(scale(true).chainage(430)).toBe(3300)
    expect(scale(false).chainage(970)).toBe(3300)
  })

  test('zooming holds the place under the pointer and stays on the edge', () => {
    expect(zoomed(edge, edge, { factor: 0.5, about: 3000 })).toEqual({ from: 1500, to: 7500 })
    expect(zoomed(edge, edge, { factor: 2, about: 3000 })).toEqual(edge)
    const closest = zoomed(edge, edge, { factor: 0.0001, about: 3000 })
    expect(closest.to - closest.from).toBe(800)
  })

  test('scrolling stops at the ends', () => {
    expect(scrolled({ from: 1000, to: 4000 }, edge, 500)).toEqual({ from: 1500, to: 4500 })
    expect(scrolled({ from: 1000, to: 4000 }, edge, -5000)).toEqual({ from: 0, to: 3000 })
    expect(scrolled({ from: 1000, to: 4000 }, edge, 50_000)).toEqual({ from: 9000, to: 12_000 })
  })

  test('an anchor out of view is brought in with a fifth of the view beside it', () => {
    expect(showing({ from: 0, to: 5000 }, edge, 8000)).toEqual({ from: 4000, to: 9000 })
    expect(showing({ from: 0, to: 5000 }, edge, 2500)).toEqual({ from: 0, to: 5000 })
  })

  test('heights are stretched by the largest plain factor that fits', () => {
    // 220 deep at 0.066 px a mm is 14.5 px: four times is 58.1 px, five times 72.6 px.
    expect(heightStretch(220, 0.066, 72)).toBe(4)
    expect(heightStretch(700, 0.2, 72)).toBe(1)
  })

  test('labels that would touch give way to the heavier one', () => {
    const label = (id: string, x: number, weight: number) => ({ id, x, width: 40, weight })
    expect(fittingLabels([label('a', 0, 0), label('b', 30, 1), label('c', 80, 0)])).toEqual(new Set(['b', 'c']))
    expect(fittingLabels([label('a', 0, 0), label('b', 46, 0)])).toEqual(new Set(['a', 'b']))
    expect(fittingLabels([label('a', 0, 0), label('b', 45.9, 0)])).toEqual(new Set(['a']))
  })
})
