import type { Check, Layout, Region } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { accepted, checksAt, row } from './anchor-checks'
import { EDGES, length } from './sample-layout'

/** Edge beam 700 deep along the north edge, so wide; the anchor's bearing face stands 110 in. */
function besideBeam(depth: number): Layout {
  const beam: Region = {
    id: 'beam',
    mark: 'EB1',
    kind: 'edge-beam',
    outline: [
      { x: 0, y: 17_400 - depth },
      { x: 19_200, y: 17_400 - depth },
      { x: 19_200, y: 17_400 },
      { x: 0, y: 17_400 },
    ],
    top: 220,
    soffit: -480,
    cover: 40,
    linkDiameter: 10,
  }
  const edges = EDGES.map((one) => (one.id === 'E4' ? { ...one, lengths: [length(0, 19_200, { soffit: -480 })] } : one))
  return row('S4', { edges, pour: { regions: [beam] } })
}

const steps = (of: Layout): readonly Check[] => checksAt(accepted(of)).filter(({ family }) => family === 'depth-change')

describe('A step in depth within one prism length', () => {
  test('names the smaller prism and the re-entrant corner, and that an elastic answer needs judgement', () => {
    const [check] = steps(besideBeam(600))
    expect(check).toMatchObject({ status: 'not-covered', code: 'DEPTH_CHANGE', plane: 'thickness' })
    const message = check?.kind === 'refused' ? check.message : ''
    // 600 - 110 = 490 behind the face; slab 220 behind the beam; the corner where the slab's soffit meets the beam.
    expect(message).toContain('from 700 to 220 deep 490 behind the bearing face')
    expect(message).toContain("smaller section's prism is 220")
    expect(message).toContain('re-entrant corner at height 0 at the soffit')
    expect(check?.notes.join(' ')).toContain('0.25 P behind the anchor can become 0.5 P')
  })

  test.each([
    { depth: 809, count: 1 },
    { depth: 810, count: 0 },
    { depth: 811, count: 0 },
  ])('a beam $depth wide, 110 to the face, section 700: $count', ({ depth, count }) => {
    expect(steps(besideBeam(depth))).toHaveLength(count)
  })

  test('bursting in the thickness stays not covered there', () => {
    const check = checksAt(accepted(besideBeam(600))).find(({ family }) => family === 'bursting-thickness')
    expect(check).toMatchObject({ status: 'not-covered', code: 'DEPTH_CHANGE' })
  })

  test('a step up in the top has its corner at the lower top', () => {
    const edges = EDGES.map((one) =>
      one.id === 'E4' ? { ...one, lengths: [length(0, 8100), length(8100, 19_200, { top: 400 })] } : one,
    )
    const [check] = steps(row('S4', { edges }))
    // The plate ends at 7900 + 110 = 8010.
    expect(check?.kind === 'refused' && check.message).toContain('from 220 to 400 deep 90 beside the plate')
    expect(check?.kind === 'refused' && check.message).toContain('re-entrant corner at height 220 at the top')
  })

  test('without one there is nothing to say', () => {
    expect(steps(row('S4'))).toEqual([])
  })
})
