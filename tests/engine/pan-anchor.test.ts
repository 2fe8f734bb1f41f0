import type { Anchor, Check, Layout, Obstruction, Pan } from '@wedgeline/engine'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { accepted, checksAt, compared, K4 } from './anchor-checks'
import { anchor, B7, D4, inPan, layout, pan, S4, type Parts } from './sample-layout'

/** Pour 19200 by 17400, 220 thick. Pans face north: bearing face at y, slab behind it to the south. */
const PLACE: Pick<Pan, 'x' | 'y' | 'azimuth' | 'depth'> = { x: 9600, y: 8700, azimuth: 0, depth: 150 }

function inPans(places: readonly Partial<Pan>[], parts: Parts & { change?: Partial<Anchor> } = {}): Layout {
  const { change = {}, ...more } = parts
  const pans = places.map((place, i) => pan(`PN0${i + 1}`, { ...PLACE, ...place }))
  const anchors = pans.map(({ id }) => ({ ...inPan(id), height: 120, ...change }))
  return layout({ hardware: [S4, K4, B7, D4], pans, ...more, anchors: [...anchors, ...(more.anchors ?? [])] })
}

const at = (of: Layout, family: Check['family'], panId = 'PN01') => {
  const check = checksAt(accepted(of), `${panId}-anchor`).find((one) => one.family === family)
  if (!check) throw new Error(`No ${family}`)
  return check
}
const stepOf = (check: Check, symbol: string) => compared(check).steps.find((one) => one.symbol === symbol)?.value

describe('Bursting behind the bearing face of a pan', () => {
  test('in the thickness: the whole slab behind the face, by the larger of own prism and mid-thickness', () => {
    // 588.8 kN: 0.25 * 1.2 * 588.8 * (220 - 80) / 220 / 300 = 374.7 mm2, as at an edge; own prism 2 * 100.
    const check = compared(at(inPans([{}]), 'bursting-thickness'))
    expect(check.demand).toBeCloseTo((0.25 * 706_560 * 140) / 220 / 300, 6)
    expect(check.notes.join(' ')).toContain('By the own prism (200) alone')
    // Links of the hardware at 80, 130, 180 in 44 to 220.
    expect(check.limit).toBeCloseTo((3 * 2 * Math.PI * 100) / 4, 6)
  })

  test('moving towards a face is never a gain', () => {
    const ratio = (height: number) =>
      compared(at(inPans([{ depth: 200 }], { change: { height } }), 'bursting-thickness')).utilisation ?? Infinity
    fc.assert(
      fc.property(fc.integer({ min: 45, max: 175 }), (height) => {
        expect(ratio(height)).toBeGreaterThanOrEqual(ratio(110) - 1e-12)
      }),
      { numRuns: 15 },
    )
  })

  test('in plan: half the gap to the next pan that faces the same way', () => {
    const check = at(inPans([{}, { x: 9600 + 1750 }]), 'bursting-plan')
    expect(stepOf(check, 'b')).toBe(1750)
    expect(compared(check).demand).toBeCloseTo((0.25 * 706_560 * (1750 - 220)) / 1750 / 300, 6)
  })

  test.each([
    { back: 1750, b: 1750 },
    // Further behind than aside: the next pan beyond, 3500 aside, sets half the gap.
    { back: 1751, b: 3500 },
  ])('a pan 1750 aside and $back further back: prism $b', ({ back, b }) => {
    const of = inPans([{}, { x: 9600 + 1750, y: 8700 - back }, { x: 9600 + 3500 }, { x: 9600 - 3500 }])
    expect(stepOf(at(of, 'bursting-plan'), 'b')).toBe(b)
  })

  test('a pan that faces another way is no neighbour, but its recess is a face', () => {
    // Facing east, its recess runs from x = 10600 to 11600 and 175 to each side of y = 8600: 1000 beside.
    const check = at(inPans([{}, { x: 10_600, y: 8600, azimuth: Math.PI / 2 }]), 'bursting-plan')
    expect(stepOf(check, 'b')).toBe(2000)
  })

  test('an opening beside the face sets the prism', () => {
    const outline = [
      { x: 10_300, y: 8000 },
      { x: 11_000, y: 8000 },
      { x: 11_000, y: 9400 },
      { x: 10_300, y: 9400 },
    ]
    const opening: Obstruction = {
      id: 'o',
      levelId: 'L1',
      kind: 'opening',
      mark: 'O1',
      note: '',
      outline,
      cageCover: null,
      cageBars: '',
    }
    const of = inPans([{}], { more: { obstructions: [opening] } })
    expect(stepOf(at(of, 'bursting-plan'), 'b')).toBe(1400)
    const distance = checksAt(of, 'PN01-anchor').find(({ name }) => name === 'Edge distance to opening O1')
    expect(distance).toMatchObject({ demand: 700, limit: 190 })
  })

  test('turned round with its pour, every number stays', () => {
    const numbers = (of: Layout) =>
      checksAt(of, 'PN01-anchor').map((one) =>
        one.kind === 'compared'
          ? [one.name.replace(/edge \w+/, 'edge'), one.demand.toFixed(6), one.limit.toFixed(6)].join()
          : one.kind,
      )
    const north = inPans([{ x: 5000, y: 8700 }, { x: 6500 }])
    const south = inPans([
      { x: 19_200 - 5000, y: 8700, azimuth: Math.PI },
      { x: 19_200 - 6500, azimuth: Math.PI },
    ])
    const bursting = (all: readonly string[]) =>
      all.filter((text) => /Bursting|Bearing|Centre|Plate to|Spacing/.test(text))
    expect(bursting(numbers(south)).sort()).toEqual(bursting(numbers(north)).sort())
  })

  test('tilted more than 20 degrees is refused (range from common practice)', () => {
    const elevation = (20.1 * Math.PI) / 180
    expect(at(inPans([{}], { change: { elevation } }), 'bursting-thickness')).toMatchObject({
      code: 'OUTSIDE_METHOD',
      field: 'elevation',
    })
  })
})

describe('Bearing in a pan', () => {
  test('the supporting area ends at the floor of the recess', () => {
    // K4, 300 x 120 at height 140: plate from 80, floor at 220 - 150 = 70, so 70 from the centre down to it and 80 up.
    // k = 2 * 70 / 120; limit = 22 / 1.5 * 7 / 6 = 17.11 MPa; stress 706 560 / (36 000 - 2340) = 20.99 MPa.
    const of = inPans([{}], { change: { hardwareId: 'K4', height: 140 } })
    const check = checksAt(of, 'PN01-anchor').find((one) => one.family === 'bearing' && one.stage === 'Full')
    expect(check && compared(check).demand).toBeCloseTo(706_560 / 33_660, 6)
    expect(check && compared(check).limit).toBeCloseTo(((22 / 1.5) * 7) / 6, 6)
    expect(check).toMatchObject({ status: 'over' })
  })

  test('hardware with an approval answers to it, in a pan as at an edge', () => {
    const distances = { spacingAlongMin: 350, spacingHeightMin: 350, edgeAlongMin: 190, edgeHeightMin: 75 }
    const approval = { reference: 'INVENTED', strengths: [{ share: 1, strengthMin: 22, ...distances }] }
    const hardware = [{ ...S4, approval }]
    expect(at(inPans([{}], { hardware }), 'bearing')).toMatchObject({ limitKind: 'H' })
    const near = checksAt(inPans([{}, { x: 9600 + 349 }], { hardware }), 'PN01-anchor')
    expect(near.find(({ family, stage }) => family === 'bearing' && stage === 'Full')).toMatchObject({
      code: 'OUTSIDE_APPROVAL',
      field: 'chainage',
    })
  })
})

describe('Spacing in pans', () => {
  test.each([
    { apart: 349.9, status: 'over' },
    { apart: 350, status: 'within' },
  ])('two pans $apart apart against 350: $status', ({ apart, status }) => {
    const check = checksAt(inPans([{}, { x: 9600 + apart }]), 'PN01-anchor').find(
      ({ name }) => name === 'Spacing to PN02',
    )
    expect(check).toMatchObject({ status, limit: 350, mend: null })
  })

  test('an anchor at the edge that the pan faces stands beside it only where it is nearer to it in front than aside', () => {
    // North edge at 17400, bearing face there at 17290; the pan's at 16000: 1290 in front.
    const beside = (aside: number) => {
      const of = inPans([{ y: 16_000 }], { anchors: [anchor('E4', 1, { chainage: 9600 + aside })] })
      return checksAt(of, 'PN01-anchor').some(({ name }) => name === 'Spacing to E4-01')
    }
    expect(beside(1290)).toBe(true)
    expect(beside(1289)).toBe(false)
  })
})

describe('Bad input', () => {
  test('a chainage or set-back given to an anchor in a pan moves it nowhere', () => {
    const [given, plain] = [{ chainage: 700, setBack: 110 }, {}].map((change) =>
      checksAt(inPans([{}, { x: 9600 + 1750 }], { change }), 'PN01-anchor'),
    )
    expect(given).toEqual(plain)
  })

  test.each([
    { what: 'outside the pour', place: { x: -500 }, change: {}, field: 'pan.x' },
    { what: 'below the floor of the recess', place: { depth: 100 }, change: { height: 120 }, field: 'height' },
  ])('a bearing face $what gives no result', ({ place, change, field }) => {
    const of = inPans([place], { change })
    for (const family of ['bearing', 'bursting-thickness', 'bursting-plan'] as const) {
      expect(at(of, family)).toMatchObject({ status: 'not-covered', code: 'OUTSIDE_METHOD', field })
    }
  })
})
