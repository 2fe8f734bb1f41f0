import { expect, test } from 'vitest'
import { onProposedReadings, type Advice, type Compared, type PourResult, type Status } from '@wedgeline/engine'

const clause = { source: 'invented', section: '1', tag: 'derived' } as const
const head = { zoneId: 'z', family: 'bearing', plane: null, stage: null, limitKind: 'C', clause, notes: [] } as const
type Verdict = Compared['status']

function compared(
  name: string,
  status: Verdict,
  { once = status, readingIds = [] }: { readonly once?: Verdict; readonly readingIds?: readonly string[] } = {},
): Compared {
  const answer = { demand: 1, limit: 2, unit: 'N', compares: 'ratio', utilisation: 0.5, spare: null } as const
  return {
    ...head,
    ...answer,
    name,
    kind: 'compared',
    status,
    statusOnceAccepted: once,
    readingIds,
    steps: [],
    mend: null,
  }
}
const advice: Advice = { ...head, kind: 'advice', name: 'usual', measured: 1, usual: '1', unit: 'mm', isUsual: true }

const zone = { id: 'z', kind: 'anchor', name: 'E1-01', pourId: 'p', edgeId: 'e', panId: null, from: 0, to: 0 } as const
function pour(checks: PourResult['zones'][number]['checks'], status: Status | null): PourResult {
  const counts = { stop: 0, 'not-covered': 0, over: 0, 'needs-judgement': 0, near: 0, within: 0 }
  for (const check of checks) if (check.kind !== 'advice') counts[check.status] += 1
  return { pourId: 'p', basis: 'en-1992', zones: [{ zone, checks, status, notYetChecked: [] }], counts }
}

test('a check that waits for its readings takes the status that it has with them, and says so', () => {
  const checks = [
    compared('a', 'needs-judgement', { once: 'within', readingIds: ['r1'] }),
    compared('b', 'near'),
    advice,
  ]
  const { zones, counts } = onProposedReadings(pour(checks, 'needs-judgement'))
  expect(zones[0]?.checks.map(({ name }) => name)).toEqual(['b', 'a', 'usual'])
  expect(zones[0]?.checks[1]).toMatchObject({ status: 'within', isOnProposed: true })
  expect(zones[0]?.checks[0]).not.toHaveProperty('isOnProposed')
  expect(zones[0]?.status).toBe('near')
  expect(counts).toEqual({ stop: 0, 'not-covered': 0, over: 0, 'needs-judgement': 0, near: 1, within: 1 })
})

test('what is over with its readings is over, and comes first', () => {
  const { zones } = onProposedReadings(
    pour(
      [compared('a', 'needs-judgement', { once: 'over', readingIds: ['r1'] }), compared('b', 'within')],
      'needs-judgement',
    ),
  )
  expect(zones[0]?.status).toBe('over')
})

test('judgement that no reading settles stays, and a result without any open reading is the same object', () => {
  const open = compared('a', 'needs-judgement', { readingIds: ['r1'] })
  const before = pour([open, compared('b', 'within', { readingIds: ['accepted'] })], 'needs-judgement')
  expect(onProposedReadings(before).zones[0]).toBe(before.zones[0])
})
