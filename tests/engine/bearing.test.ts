import type { Approval, ApprovalStrength, Hardware, Steel } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { APPROVAL, checkAt, checksAt, compared, K4, row, S4_APPROVED } from './anchor-checks'
import { anchor, B7, D4, layout, S4, twoPours } from './sample-layout'

describe('A plate without an approval: EN 1992-1-1 6.7 Eq. 6.63 (digest), 6.7(3) and 3.1.6 (from memory)', () => {
  const value = (symbol: string, stage: string) =>
    compared(checkAt(row('K4'), 'bearing', stage)).steps.find((line) => line.symbol === symbol)?.value

  test('K4 of the invented podium at full force, 22 MPa, height 110 in 220, spacing 1750', () => {
    const check = compared(checkAt(row('K4'), 'bearing', 'Full'))
    // P = 4 * 0.8 * 184 = 588.8 kN; F = 1.2 * 588.8 = 706.56 kN
    // net 300 * 120 - 90 * 26 = 33 660 mm2; k = min(1750 / 300, 220 / 120, 3) = 1.833
    expect(value('Anet', 'Full')).toBe(33_660)
    expect(value('k', 'Full')).toBeCloseTo(220 / 120, 12)
    // 706 560 / 33 660 = 20.99 MPa; limit 22 / 1.5 * 1.8333 = 26.89 MPa; 0.781
    expect(check.demand).toBeCloseTo(20.99, 2)
    expect(check.limit).toBeCloseTo(26.89, 2)
    expect(check.utilisation).toBeCloseTo(0.781, 3)
    expect(check).toMatchObject({ status: 'within', limitKind: 'C', compares: 'ratio', stage: 'Full' })
  })

  test('the same plate at 25 % of the force, 9 MPa', () => {
    // 0.25 * 706 560 / 33 660 = 5.25 MPa; 9 / 1.5 * 1.8333 = 11.0 MPa; 0.477
    const check = compared(checkAt(row('K4'), 'bearing', '25 %'))
    expect(check.demand).toBeCloseTo(5.25, 2)
    expect(check.limit).toBeCloseTo(11, 6)
    expect(check.utilisation).toBeCloseTo(0.477, 3)
  })

  test('height, spacing and the end of the edge each limit the supporting area', () => {
    const k = (change: Parameters<typeof row>[1]) =>
      compared(checkAt(row('K4', change), 'bearing', 'Full')).steps.find(({ symbol }) => symbol === 'k')?.value
    // 90 to the soffit: 180 / 120. Moved to 450 from its neighbour at 6150: 450 / 300.
    expect(k({ middle: { height: 90 } })).toBeCloseTo(1.5, 12)
    expect(k({ middle: { chainage: 6600 } })).toBeCloseTo(1.5, 12)
  })

  test('never more than three plates (6.7(3), from memory)', () => {
    const small = { ...K4, plate: { width: 60, height: 60 }, hole: null }
    const k = compared(checkAt(row('K4', { hardware: [small] }), 'bearing', 'Full')).steps.find(
      ({ symbol }) => symbol === 'k',
    )
    expect(k?.value).toBe(3)
  })

  test('two beam plates of 170 at 260: k = 260 / 170 = 1.529', () => {
    const plate: Hardware = { ...B7, approval: null }
    const pair = [1, 2].map((number) =>
      anchor('E4', number, { chainage: 9000 + 260 * number, hardwareId: 'B7', height: 350 }),
    )
    const deep = layout({ hardware: [plate], anchors: pair, pour: { thickness: 700 } })
    const edges = deep.edges.map((edge) => ({ ...edge, lengths: edge.lengths.map((one) => ({ ...one, top: 700 })) }))
    const check = checksAt({ ...deep, edges }, 'E4-1').find(
      ({ family, stage }) => family === 'bearing' && stage === 'Full',
    )
    // F = 1.2 * 7 * 0.8 * 184 = 1236.48 kN on 170^2 - pi/4 * 72^2 = 24 828 mm2: 49.80 MPa; 22 / 1.5 * 1.529 = 22.43
    expect(check).toMatchObject({ status: 'over' })
    expect((check?.kind === 'compared' && check.demand) || 0).toBeCloseTo(49.8, 1)
    expect((check?.kind === 'compared' && check.limit) || 0).toBeCloseTo(22.43, 2)
  })

  test('a hole as large as the plate is refused', () => {
    const hole = { width: 300, height: 120, isRound: false }
    expect(checkAt(row('K4', { hardware: [{ ...K4, hole }] }), 'bearing')).toMatchObject({ code: 'OUTSIDE_METHOD' })
  })
})

describe('Hardware with an approval', () => {
  const withStrength = (strength: number) =>
    row('S4A', { pour: { stages: [{ id: 's', name: 'Full', share: 1, strength }] } })

  test.each([
    { strength: 21.9, status: 'over', spare: -0.1 },
    { strength: 22, status: 'within', spare: 0 },
    { strength: 25, status: 'within', spare: 3 },
  ])('22 MPa asked for, $strength there: $status', ({ strength, status, spare }) => {
    const check = compared(checkAt(withStrength(strength), 'bearing'))
    expect(check).toMatchObject({ status, compares: 'at-least', limitKind: 'H', unit: 'MPa', utilisation: null })
    expect(check.spare).toBeCloseTo(spare, 9)
  })

  test('the formula is said for information and gives no status', () => {
    // F / net = 706 560 / (220 * 80 - 70 * 20) = 43.61 MPa; 22 / 1.5 * 220 / 80 = 40.33 MPa: over, and yet within.
    const check = checkAt(row('S4A'), 'bearing', 'Full')
    expect(check).toMatchObject({ status: 'within' })
    expect(check.notes.join()).toContain('43.6 MPa of 40.3 MPa')
  })

  test.each([
    { why: 'spacing', middle: { chainage: 6150 + 349 }, field: 'chainage', says: 'spacing 349' },
    { why: 'height', middle: { height: 74 }, field: 'height', says: '74 to the soffit' },
    { why: 'height from the top', middle: { height: 146 }, field: 'height', says: '74 to the top' },
  ])('a condition not met makes bearing not covered: $why', ({ middle, field, says }) => {
    const check = checkAt(row('S4A', { middle }), 'bearing', 'Full')
    expect(check).toMatchObject({ status: 'not-covered', code: 'OUTSIDE_APPROVAL', field })
    expect(check.kind === 'refused' && check.message).toContain('not covered: outside its approval (')
    expect(check.kind === 'refused' && check.message).toContain(says)
  })

  test.each([
    { beyond: 19_349, isInside: false },
    { beyond: 19_350, isInside: true },
  ])('a neighbour in the next pour counts: from 19000 to $beyond', ({ beyond, isInside }) => {
    const anchors = [
      anchor('E2', 1, { chainage: 19_000, hardwareId: 'S4A' }),
      anchor('E2-P2', 1, { chainage: beyond, hardwareId: 'S4A', castWithPourId: 'P2' }),
    ]
    const checks = checksAt(layout({ hardware: [S4_APPROVED], ...twoPours(anchors) }), 'E2-1')
    const check = checks.find(({ family, stage }) => family === 'bearing' && stage === 'Full')
    expect(check?.kind).toBe(isInside ? 'compared' : 'refused')
    if (!isInside) expect(check).toMatchObject({ code: 'OUTSIDE_APPROVAL', field: 'chainage' })
  })

  test.each([350, 351])('spacing of %s is inside the approval', (spacing) => {
    expect(checkAt(row('S4A', { middle: { chainage: 6150 + spacing } }), 'bearing', 'Full').kind).toBe('compared')
  })

  test.each([
    { chainage: 189, kind: 'refused' },
    { chainage: 190, kind: 'compared' },
  ])('$chainage from the end of the edge, 190 asked for: $kind', ({ chainage, kind }) => {
    expect(checkAt(row('S4A', { middle: { chainage } }), 'bearing', 'Full').kind).toBe(kind)
  })

  test('local steel of its kind entered by hand must be as tested', () => {
    const links = (count: number): Steel => ({
      id: 'x',
      pourId: 'P1',
      zone: { kind: 'anchor', anchorId: 'E4-4' },
      shape: { kind: 'links', diameter: 10, width: 300, height: 140, hook: 130, count, first: 30, pitch: 50 },
      source: 'by-hand',
      isLocked: false,
    })
    expect(checkAt(row('S4A', { steel: [links(4)] }), 'bearing', 'Full').kind).toBe('compared')
    expect(checkAt(row('S4A', { steel: [links(3)] }), 'bearing', 'Full')).toMatchObject({ field: 'steel' })
  })

  test('more strands than the hardware takes are outside its approval', () => {
    const plan = row('S4A')
    const tendons = plan.tendons.map((tendon) => ({ ...tendon, strands: 5 }))
    expect(checkAt({ ...plan, tendons }, 'bearing')).toMatchObject({ field: 'tendon.strands' })
  })

  const several = (strengths: readonly Partial<ApprovalStrength>[]): readonly Hardware[] => {
    const [, full] = APPROVAL.strengths
    const approval = { ...APPROVAL, strengths: strengths.map((line) => ({ ...full, ...line })) } as Approval
    return [S4, D4, { ...S4_APPROVED, approval }]
  }

  test('of several strengths the highest not above the stage counts, with its own distances', () => {
    const hardware = several([
      { strengthMin: 20, spacingAlongMin: 500 },
      { strengthMin: 22, spacingAlongMin: 400 },
      { strengthMin: 30, spacingAlongMin: 350 },
    ])
    const close = { middle: { chainage: 6150 + 400 } }
    expect(checkAt(row('S4A', { hardware, ...close }), 'bearing', 'Full')).toMatchObject({ limit: 22 })
    expect(checkAt(row('S4A', { hardware, middle: { chainage: 6150 + 399 } }), 'bearing', 'Full').kind).toBe('refused')
  })

  test('none at all for this share of the force is not covered', () => {
    expect(checkAt(row('S4A', { hardware: several([{ share: 0.5 }]) }), 'bearing', 'Full')).toMatchObject({
      code: 'OUTSIDE_APPROVAL',
      field: 'stage.share',
    })
  })
})
