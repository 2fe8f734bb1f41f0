import { toEngine } from '@wedgeline/contract'
import { checkPour, onProposedReadings, proposeSteel, scheduleOf } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '@/db/seed/demo-layout'
import { readPasted } from '@/features/edge/paste'
import { markLines } from '@/features/quick-edge/mark-lines'
import { withProposal } from '@/features/quick-edge/proposed-steel'
import { formProblems, ofHardware, usualForm, type QuickForm } from '@/features/quick-edge/quick-form'
import { EDGE_ID, nameOf, POUR_ID, quickLayout, spanOf } from '@/features/quick-edge/quick-layout'
import { worstKinds } from '@/features/quick-edge/worst-kinds'

const company = demoLayout()
const usual = usualForm(company)
const name = { number: 'Q-1', title: 'Quick edge', timeZone: 'Europe/London' }

function layoutOf(text: string, changes: Partial<QuickForm> = {}) {
  const { anchors } = readPasted(text, company)
  const made = quickLayout({ form: { ...usual, ...changes }, anchors, company, name })
  if (!made.ok) throw new Error(made.problems.join(' '))
  return made.layout
}
const at = (...chainages: number[]) => chainages.map((chainageMm) => ({ chainageMm }))

describe('the usual values', () => {
  test('come from the first live hardware: its strands, and the strengths that its approval asks for', () => {
    const [first] = company.hardware
    expect(usual).toMatchObject({ hardwareId: first?.id, strands: first?.strandsMax, concrete: 'C32/40' })
    const [quarter, whole] = first?.approval?.strengths ?? []
    expect([usual.firstStrengthMPa, usual.fullStrengthMPa]).toEqual([quarter?.strengthMinMPa, whole?.strengthMinMPa])
    expect(formProblems(usual, company)).toEqual({})
  })

  test('give high hardware a slab that it fits in: twice its least height above the soffit', () => {
    const beam = company.hardware.find(({ edgeHeightMinMm }) => edgeHeightMinMm === 160)
    // 2 x 160 = 320.
    expect(beam && ofHardware(beam).thicknessMm).toBe(320)
  })

  test.each([
    [{ thicknessMm: null }, 'thicknessMm', 'Thickness is needed.'],
    [
      { thicknessMm: 60, coverTopMm: 30, coverSoffitMm: 30 },
      'thicknessMm',
      '60 mm leaves no room between covers of 60 mm',
    ],
    [{ strands: 3.5 }, 'strands', 'whole number'],
    [{ jackingRatio: 0.96 }, 'jackingRatio', 'from 0.1 to 0.95'],
    [{ firstStrengthMPa: 25, fullStrengthMPa: 22 }, 'fullStrengthMPa', 'below the 25 MPa'],
    [{ hardwareId: 'gone' }, 'hardwareId', 'Choose another'],
  ] as const)('say what is wrong with %o', (changes, field, words) => {
    expect(formProblems({ ...usual, ...changes }, company)).toMatchObject({ [field]: expect.stringContaining(words) })
  })
})

describe('where the edge runs', () => {
  test('it ends as far beyond the last anchor as it starts before the first, unless a length is typed', () => {
    // 600 + 3000 = 3600.
    expect(spanOf(usual, at(600, 1800, 3000))).toEqual({ fromMm: 0, toMm: 3600 })
    expect(spanOf({ ...usual, lengthMm: 5000 }, at(600, 3000))).toEqual({ fromMm: 0, toMm: 5000 })
  })

  test('where the slab goes on it runs to the middle of a gap like the last, if that is further', () => {
    const both = { ...usual, goesOnAtStart: true, goesOnAtEnd: true, lengthMm: 3100 }
    // 300 - 1500 / 2 = -450; 3000 + 1200 / 2 = 3600.
    expect(spanOf(both, at(300, 1800, 3000))).toEqual({ fromMm: -450, toMm: 3600 })
    // 1000 - 500 / 2 = 750 lies inside: the edge still starts at 0. 2000 + 500 / 2 = 2250 is less than 3100.
    expect(spanOf(both, at(1000, 1500, 2000))).toEqual({ fromMm: 0, toMm: 3100 })
  })
})

describe('the layout of a quick edge', () => {
  test('has what was pasted, and for what was left out the usual values', () => {
    const layout = layoutOf('600 110 3\n1800\n3000 120 4 dead')
    expect(layout.edges).toMatchObject([{ id: EDGE_ID, lengths: [{ fromMm: 0, toMm: 3600, topMm: 220, soffitMm: 0 }] }])
    expect(layout.anchors.map(({ chainageMm, heightMm, end }) => [chainageMm, heightMm, end])).toEqual([
      [600, 110, 'live'],
      [1800, 110, 'live'],
      [3000, 120, 'dead'],
    ])
    expect(layout.tendons.map(({ strands, jackingRatio }) => [strands, jackingRatio])).toEqual([
      [3, 0.8],
      [4, 0.8],
      [4, 0.8],
    ])
    const dead = company.hardware.find(({ ends }) => ends === 'dead')
    expect(layout.anchors[2]?.hardwareId).toBe(dead?.id)
  })

  test('proposed bars go in as proposed and unlocked, and mend what was over for want of steel', () => {
    const layout = layoutOf('900 110\n2100 110\n3300 110\n4500 110')
    const plain = toEngine(layout)
    const over = (result: ReturnType<typeof checkPour>) => onProposedReadings(result).counts.over
    const proposal = proposeSteel(plain, { pourId: POUR_ID })
    let made = 0
    const after = withProposal(layout, proposal, () => `s${++made}`)
    expect(after.steel.length).toBeGreaterThan(0)
    expect(
      after.steel.every(({ source, isLocked, pourId }) => source === 'proposed' && !isLocked && pourId === POUR_ID),
    ).toBe(true)
    expect(over(checkPour(plain, { pourId: POUR_ID }))).toBeGreaterThan(0)
    expect(over(checkPour(toEngine(after), { pourId: POUR_ID }))).toBe(0)
    const schedule = scheduleOf(toEngine(after), POUR_ID, [])
    const lines = markLines(schedule)
    expect(new Set(lines.map(({ mark }) => mark)).size).toBe(lines.length)
    expect(lines.reduce((sum, { massKg }) => sum + (massKg ?? NaN), 0)).toBeCloseTo(schedule.mass, 6)
  })

  test('what is not within is one line for checks that say the same, worst first', () => {
    const { zones } = onProposedReadings(
      checkPour(toEngine(layoutOf('900 110\n2100 110\n3300 110')), { pourId: POUR_ID }),
    )
    const kinds = worstKinds(zones)
    expect(new Set(kinds.map((kind) => `${kind.status} ${kind.name}`)).size).toBe(kinds.length)
    const order = ['stop', 'not-covered', 'over', 'needs-judgement', 'near']
    const ranks = kinds.map(({ status }) => order.indexOf(status))
    expect(ranks).toEqual([...ranks].sort((a, b) => a - b))
    // Each of the three tendons has one end: one line that names one and counts two more.
    expect(kinds.find(({ name: what }) => what === 'Forces and elongation')?.place).toMatch(
      /^Tendon E1-T0\d and 2 more$/,
    )
  })
})

test('it is named after the day and the minute', () => {
  // 1 December 2026, 14:32 in London.
  expect(nameOf(Date.UTC(2026, 11, 1, 14, 32), 'Europe/London')).toEqual({
    number: 'Q-1201-1432',
    title: 'Quick edge of 1 December',
    timeZone: 'Europe/London',
  })
})
