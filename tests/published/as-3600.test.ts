import { basisOf, BASIS_SOURCES, type Job } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { layout } from '../engine/sample-layout'

const sample = layout().job
const job: Job = { ...sample, basis: 'as-3600', factors: [], readings: [] }
const basis = basisOf(job)
const valueOf = (steps: readonly { symbol: string; value: number }[], symbol: string) =>
  steps.find((line) => line.symbol === symbol)?.value

describe('AS 3600 12.5.4 (digest): bursting at the unfactored force while jacking and 150 MPa', () => {
  // EX07, a textbook example of one concentric anchor (Gilbert and Mickleborough; geometry from memory):
  // P 3000 kN, plate 315, block 480 by 1000. M = 256.875 kNm over D/2 = 0.5 m is 513.75 kN.
  test('EX07 in the depth: 513.75 kN, 3425 mm2, counted from 200 to 1000', () => {
    const { steps, area, stress } = basis.tie({ P: 3_000_000, a: 315, b: 1000 })
    expect(valueOf(steps, 'T')).toBeCloseTo(513_750, 6)
    expect(area).toBeCloseTo(3425, 6)
    expect(stress).toBe(150)
    expect(basis.window(1000)).toEqual({ from: 200, to: 1000 })
  })

  test('EX07 in the width: 257.8 kN, 1719 mm2, counted from 96 to 480', () => {
    const { steps, area } = basis.tie({ P: 3_000_000, a: 315, b: 480 })
    expect(valueOf(steps, 'T')).toBeCloseTo(257_812.5, 6)
    expect(area).toBeCloseTo(1718.75, 6)
    expect(basis.window(480).from).toBeCloseTo(96, 9)
    expect(basis.window(480).to).toBe(480)
  })

  test('EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300', () => {
    // Prism 2 * 150 = 300, kr = 165 / 300 = 0.55; 0.25 * 1000 * 0.45 = 112.5 kN
    const { steps, area } = basis.tie({ P: 1_000_000, a: 165, b: 300 })
    expect(valueOf(steps, 'kr')).toBeCloseTo(0.55, 9)
    expect(valueOf(steps, 'T')).toBeCloseTo(112_500, 6)
    expect(area).toBeCloseTo(750, 6)
    expect(basis.window(300)).toEqual({ from: 60, to: 300 })
  })

  test('EX15-L1 at the face: 100 kNm over 0.6 * 700 is 238.1 kN, 1587 mm2', () => {
    expect(basis.faceSteel({ T: 100e6 / (0.6 * 700), P: 1_000_000 }).area).toBeCloseTo(1587.3, 1)
  })

  test('Z01, a flat anchor of 588.8 kN: 93.7 kN and 624 mm2 in the thickness, 128.7 kN and 858 mm2 in plan', () => {
    const thickness = basis.tie({ P: 588_800, a: 80, b: 220 })
    expect(valueOf(thickness.steps, 'T')).toBeCloseTo(93_672.7, 0)
    expect(Math.abs(thickness.area - 624.5)).toBeLessThan(0.2)
    const plan = basis.tie({ P: 588_800, a: 220, b: 1750 })
    expect(valueOf(plan.steps, 'T')).toBeCloseTo(128_694.9, 0)
    expect(Math.abs(plan.area - 858)).toBeLessThan(0.2)
    expect(basis.window(1750)).toEqual({ from: 350, to: 1750 })
  })

  test('what 1.15 on the prestress would give stands beside (from memory), until the job uses it', () => {
    // 1.15 * 624.5 = 718
    expect(basis.tie({ P: 588_800, a: 80, b: 220 }).notes).toEqual([
      'With a factor of 1.15 on the prestress at transfer (from memory): 718 mm2 asked for.',
    ])
    const factored = basisOf({ ...job, factors: [{ name: 'transferFactor', value: 1.15, reason: 'office rule' }] })
    const rule = factored.tie({ P: 588_800, a: 80, b: 220 })
    expect(rule.notes).toEqual([])
    expect(rule.area).toBeCloseTo((1.15 * 0.25 * 588_800 * (1 - 80 / 220)) / 150, 6)
  })
})

describe('AS 3600 12.6 (digest corrected, from memory): bearing behind a plate without an approval', () => {
  // 300 by 120 plate, hole 90 by 26, mid-height of a 220 slab, 588.8 kN: Anet = 36 000 - 2 340 = 33 660
  const plate = {
    P: 588_800,
    plateWidth: 300,
    plateHeight: 120,
    holeArea: 90 * 26,
    widthFree: 900,
    heightFree: 220,
    strength: 22,
  }

  test('all of the force at 22 MPa: 17.49 of 21.78 MPa', () => {
    // 588 800 / 33 660 = 17.49; sqrt(A2 / A1) = 220 / 120 = 1.833; 0.6 * 0.9 * 22 * 1.833 = 21.78
    const rule = basis.bearing(plate)
    expect(rule.demand).toBeCloseTo(17.49, 2)
    expect(rule.limit).toBeCloseTo(21.78, 6)
    expect(rule.notes[0]).toContain('20.12 MPa of 21.78 MPa')
  })

  test('a quarter of it at 9 MPa: 4.37 of 8.91 MPa', () => {
    const rule = basis.bearing({ ...plate, P: 588_800 / 4, strength: 9 })
    expect(rule.demand).toBeCloseTo(4.37, 2)
    expect(rule.limit).toBeCloseTo(8.91, 6)
  })

  test('the limit stops growing at phi 1.8 fc: from sqrt(A2 / A1) = 2 on', () => {
    const limit = (heightFree: number) => basis.bearing({ ...plate, heightFree }).limit
    expect(limit(239)).toBeLessThan(0.6 * 1.8 * 22)
    expect(limit(240)).toBeCloseTo(0.6 * 1.8 * 22, 9)
    expect(limit(400)).toBeCloseTo(0.6 * 1.8 * 22, 9)
  })

  test('a plate of 240 by 75 with 1800 mm2 of holes, for information: 36.35 of 23.76 MPa', () => {
    // Net 18 000 - 1 800 = 16 200; 588 800 / 16 200 = 36.35; sqrt ratio 2.5 or more: 0.6 * 1.8 * 22 = 23.76
    const rule = basis.bearing({ ...plate, plateWidth: 240, plateHeight: 75, holeArea: 1800, heightFree: 200 })
    expect(rule.demand).toBeCloseTo(36.35, 2)
    expect(rule.limit).toBeCloseTo(23.76, 6)
  })
})

describe('AS 3600 17.3.4.6 (from memory): force while jacking', () => {
  const strand = {
    id: 's',
    name: '12.7',
    diameter: 12.7,
    area: 98.6,
    breakingLoad: 184_000,
    proofLoad: 156_000,
    modulus: 195_000,
  }

  test('0.85 of the breaking load, whatever the proof load; after lock-off there is no limit', () => {
    // 4 * 0.85 * 184 = 625.6 kN
    expect(basis.jackingLimit(strand, 4).at(-1)?.value).toBeCloseTo(625_600, 6)
    expect(basis.jackingLimit({ ...strand, proofLoad: 1 }, 4).at(-1)?.value).toBeCloseTo(625_600, 6)
    expect(basis.lockOffLimit).toBeNull()
  })

  test('a job with strand that is not stress-relieved sets 0.75', () => {
    const set = basisOf({ ...job, factors: [{ name: 'kJacking', value: 0.75, reason: 'as drawn' }] })
    expect(set.jackingLimit(strand, 1).at(-1)?.value).toBeCloseTo(0.75 * 184_000, 6)
  })
})

describe('AS 3600 9.5.3 (secondary): crack steel of a restrained edge wedge, both faces', () => {
  const wedge = {
    thickness: 220,
    cover: 30,
    diameter: 12,
    fck: 32,
    tensile: null,
    crackWidth: 0.3,
    compression: 0,
  }
  const steel = (readingId: string, input: Partial<typeof wedge> = {}) =>
    basis.crackChoices.find((one) => one.readingId === readingId)?.steel({ ...wedge, ...input })

  test('C01 minor 385, C02 moderate 770, strong 1320 mm2/m in a 220 slab', () => {
    // 1.75, 3.5 and 6.0 * 220
    expect(steel('as-crack-minor')?.areaPerMetre).toBeCloseTo(385, 6)
    expect(steel('as-crack-moderate')?.areaPerMetre).toBeCloseTo(770, 6)
    expect(steel('as-crack-strong')?.areaPerMetre).toBeCloseTo(1320, 6)
  })

  test('C03 strong with 1.2 MPa of compression counted: (6.0 - 3.0) * 220 = 660', () => {
    expect(steel('as-crack-strong', { compression: 1.2 })?.areaPerMetre).toBeCloseTo(660, 6)
  })

  test('in a 200 slab 350 and 700', () => {
    expect(steel('as-crack-minor', { thickness: 200 })?.areaPerMetre).toBeCloseTo(350, 6)
    expect(steel('as-crack-moderate', { thickness: 200 })?.areaPerMetre).toBeCloseTo(700, 6)
  })

  test('compression of 0.7 MPa leaves nothing of the minor degree, and more never gives less than nothing', () => {
    expect(steel('as-crack-minor', { compression: 0.7 })?.areaPerMetre).toBeCloseTo(0, 9)
    expect(steel('as-crack-minor', { compression: 2 })?.areaPerMetre).toBe(0)
  })

  test('over 500 thick only the outer 250 at each face counts', () => {
    const moderate = (thickness: number) => steel('as-crack-moderate', { thickness })?.areaPerMetre
    expect(moderate(499)).toBeCloseTo(3.5 * 499, 6)
    expect(moderate(500)).toBeCloseTo(1750, 6)
    expect(moderate(501)).toBeCloseTo(1750, 6)
    expect(moderate(900)).toBeCloseTo(1750, 6)
  })

  test('spacing: 200 at most, in a slab thinner than 133.3 no more than 1.5 of it', () => {
    expect(steel('as-crack-minor')?.spacingMax).toBe(200)
    expect(steel('as-crack-minor', { thickness: 120 })?.spacingMax).toBe(180)
  })

  test('crack width, bar size and concrete have no say', () => {
    const other = steel('as-crack-moderate', { crackWidth: 0.1, diameter: 20, cover: 50, fck: 50 })
    expect(other?.areaPerMetre).toBe(steel('as-crack-moderate')?.areaPerMetre)
  })

  test('ordinary edge bars only ask for nothing', () => {
    expect(basis.crackChoices[0]?.readingId).toBe('as-crack-edge-bars')
    expect(steel('as-crack-edge-bars')).toBeNull()
  })
})

test('force spreads at 1 in 1 (12.5, digest)', () => {
  expect(Math.tan(basis.spread.value)).toBeCloseTo(1, 12)
})

describe('AS 3600 13.3 (from memory): transmission length', () => {
  test('60 diameters: 15.2 mm strand 912 mm, whatever stress and strength, without bounds', () => {
    const found = basis.transmission({ diameter: 15.2, stress: 1300, strength: 25 })
    expect(found).toMatchObject({ lower: 912, length: 912, upper: 912 })
    expect(basis.transmission({ diameter: 15.2, stress: 900, strength: 40 }).length).toBe(912)
  })
})

describe('One code’s force never meets another’s steel stress', () => {
  // The same anchor in both: EN 0.25 * 1.2 * 800 * (1 - 75/200) = 150 kN at 300; AS 0.25 * 800 * (1 - 75/200) = 125 kN at 150
  const anchor = { P: 800_000, a: 75, b: 200 }

  test('a job that changes from EN 1992 to AS 3600 has the unfactored force at 150 MPa', () => {
    const before = basisOf({ ...job, basis: 'en-1992' }).tie(anchor)
    const after = basisOf({ ...job, basis: 'as-3600' }).tie(anchor)
    expect([valueOf(before.steps, 'T'), before.stress]).toEqual([150_000, 300])
    expect([valueOf(after.steps, 'T'), after.stress]).toEqual([125_000, 150])
    expect(after.area).toBeCloseTo(125_000 / 150, 6)
  })

  test('readings and factors of EN 1992 change nothing in AS 3600', () => {
    const acceptedAtMs = 1
    const readings = ['en-steel-alt', 'en-window', 'en-own-prism'].map((readingId) => ({
      readingId,
      acceptedBy: 'A. Engineer',
      acceptedAtMs,
      reason: 'test',
    }))
    const mixed = basisOf({ ...job, readings, factors: [{ name: 'gammaP', value: 1.5, reason: 'of another basis' }] })
    expect(mixed.tie(anchor)).toEqual(basis.tie(anchor))
    expect(mixed.isAccepted(mixed.ownPrismReading.id)).toBe(false)
  })

  test('no clause of AS 3600 is one of EN 1992, and no two bases have a reading in common', () => {
    const plate = {
      P: 1,
      plateWidth: 100,
      plateHeight: 100,
      holeArea: 0,
      widthFree: 200,
      heightFree: 200,
      strength: 25,
    }
    const steps = [
      ...basis.tie(anchor).steps,
      ...basis.faceSteel({ T: 1, P: 1 }).steps,
      ...basis.bearing(plate).steps,
      ...basis.transmission({ diameter: 15, stress: 1, strength: 25 }).steps,
      ...basis.tieBack.rule({ P: 1, own: null }).steps,
    ]
    for (const { clause } of steps) expect(clause.source).not.toContain('EN 1992')
    const ids = BASIS_SOURCES.flatMap(({ readings }) => readings.map(({ id }) => id))
    expect(new Set(ids).size).toBe(ids.length)
  })
})

describe('Rows and readings of AS 3600', () => {
  test('12.5 covers two anchors: a near-equal row rests on a reading, an uneven one is not covered', () => {
    expect(basis.planRow).toMatchObject({ equalReadingId: 'as-row', isUnevenCovered: false })
  })

  test('the window and the steel stress stand in the clause: neither rests on a reading', () => {
    expect(basis.steelReading).toBeNull()
    expect(basis.windowReading).toBeNull()
  })
})

describe.each(BASIS_SOURCES.map(({ id, title }) => ({ id, title })))('What holds in every basis: $title', ({ id }) => {
  const one = basisOf({ ...job, basis: id })
  const tie = (input: { P?: number; a?: number; b?: number }) => one.tie({ P: 500_000, a: 80, b: 220, ...input }).area

  test('bursting steel grows with the force in proportion, with the prism, and falls with the plate', () => {
    expect(tie({ P: 1_000_000 })).toBeCloseTo(2 * tie({}), 6)
    expect(tie({ b: 221 })).toBeGreaterThan(tie({}))
    expect(tie({ a: 81 })).toBeLessThan(tie({}))
  })

  test('plate and prism are not interchangeable', () => {
    expect(tie({ a: 80, b: 220 })).not.toBeCloseTo(tie({ a: 220, b: 80 }), 3)
  })

  test('bearing: pressure grows with the force, the limit with strength and with the area that supports', () => {
    const plate = {
      P: 500_000,
      plateWidth: 300,
      plateHeight: 120,
      holeArea: 2340,
      widthFree: 500,
      heightFree: 180,
      strength: 22,
    }
    const at = one.bearing(plate)
    expect(one.bearing({ ...plate, P: 1_000_000 }).demand).toBeCloseTo(2 * at.demand, 6)
    expect(one.bearing({ ...plate, strength: 44 }).limit).toBeCloseTo(2 * at.limit, 6)
    expect(one.bearing({ ...plate, heightFree: 190 }).limit).toBeGreaterThan(at.limit)
    expect(one.bearing({ ...plate, holeArea: 0 }).demand).toBeLessThan(at.demand)
  })

  test('anchorage and laps: longer with a thicker bar, more stress and poor bond, shorter in stronger concrete', () => {
    const bar = { diameter: 16, strength: 32, stress: 300, cd: 30, isGoodBond: true, isBent: false }
    const length = (change: Partial<typeof bar>) => one.anchorage({ ...bar, ...change }).length
    expect(length({ diameter: 20 })).toBeGreaterThan(length({}))
    expect(length({ stress: 400 })).toBeGreaterThan(length({}))
    expect(length({ isGoodBond: false })).toBeGreaterThan(length({}))
    expect(length({ strength: 40 })).toBeLessThan(length({}))
    expect(one.lap({ ...bar, stress: one.id === 'as-3600' ? 500 : 435 }, 1)).toBeGreaterThan(length({ stress: 435 }))
  })

  test('every factor has a recommended value inside its own range', () => {
    for (const { recommended, least, most, name } of one.factors) {
      expect(recommended, name).toBeGreaterThanOrEqual(least)
      expect(recommended, name).toBeLessThanOrEqual(most)
    }
  })

  test('the choices of crack control ask for more from one to the next', () => {
    const areas = one.crackChoices.map(
      ({ steel }) =>
        steel({ thickness: 220, cover: 30, diameter: 12, fck: 32, tensile: null, crackWidth: 0.3, compression: 0 })
          ?.areaPerMetre ?? 0,
    )
    expect(areas[0]).toBe(0)
    for (const [i, area] of areas.entries()) if (i > 0) expect(area).toBeGreaterThan(areas[i - 1] ?? 0)
  })

  test('every reading that a result rests on is offered, and one answer to each choice is proposed', () => {
    const offered = one.readings.map(({ id: readingId }) => readingId)
    const { tieBack, deadEndReading, jointReading, planRow, steelReading, windowReading } = one
    const named = [
      ...one.crackChoices.map(({ readingId }) => readingId),
      ...[tieBack.readingId, tieBack.ownReadingId, deadEndReading, jointReading, one.ownPrismReading.id],
      ...[steelReading, windowReading, planRow.equalReadingId].filter((readingId) => readingId !== null),
    ]
    for (const readingId of named) expect(offered, readingId).toContain(readingId)
    for (const choice of new Set(one.readings.map((reading) => reading.choice))) {
      if (choice === undefined) continue
      const answers = one.readings.filter((reading) => reading.choice === choice)
      expect(answers.filter(({ proposed }) => proposed)).toHaveLength(1)
    }
  })
})
