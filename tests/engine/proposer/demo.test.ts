import { toEngine } from '@wedgeline/contract'
import { checkPour, proposeSteel, type Check, type Layout, type Steel } from '@wedgeline/engine'
import { expect, test } from 'vitest'
import { demoLayout } from '../../../db/seed/demo-layout'

/** All places of three pours are tried: on a busy machine that takes longer than a test may as a rule. */
const DEMO_MS = 240_000

/** Families that ask for bars, and those that ask whether bars hold and can be fixed. */
const OF_STEEL = [
  'bursting-thickness',
  'bursting-plan',
  'spalling',
  'edge-wedge',
  'joint',
  'pan-bars',
  'anchorage',
  'fit',
]

const isOver = (check: Check): boolean =>
  check.kind === 'compared' &&
  OF_STEEL.includes(check.family) &&
  (check.statusOnceAccepted === 'over' || check.statusOnceAccepted === 'stop')

/** By zone the names of what is over on which bars bear. */
const overIn = (layout: Layout, pourId: string): ReadonlyMap<string, readonly string[]> =>
  new Map(
    checkPour(layout, { pourId }).zones.map(({ zone, checks }) => [
      zone.id,
      checks.filter(isOver).map(({ family, name }) => `${family}: ${name}`),
    ]),
  )

test.each(['P1', 'P2', 'P3'])(
  'pour %s of the demonstration: nothing is over but what was wrong before and what is listed with a reason',
  (pourId) => {
    const layout = toEngine(demoLayout())
    const { zones } = proposeSteel(layout, { pourId })
    const added = zones.flatMap(({ zone, place, pourId: of, adds }) =>
      adds.map((shape, i): Steel => ({
        id: `${zone.id}:${i}`,
        pourId: of,
        zone: place,
        shape,
        source: 'proposed',
        isLocked: false,
      })),
    )
    expect(added.length).toBeGreaterThan(0)
    const before = overIn(layout, pourId)
    const after = overIn({ ...layout, steel: [...layout.steel, ...added] }, pourId)
    const listed = new Set(zones.filter(({ blocked }) => blocked.length > 0).map(({ zone }) => zone.id))
    for (const { zone, blocked } of zones) {
      for (const { check, by } of blocked)
        expect(
          [check, by].every((text) => text.length > 0),
          zone.name,
        ).toBe(true)
    }
    // A corner has no bars of its own: those of the gaps beside it cross it.
    const left = [...after].filter(([id]) => !listed.has(id) && !id.startsWith('corner:'))
    for (const [id, over] of left) {
      const was = before.get(id) ?? []
      expect(
        over.filter((name) => !was.includes(name)),
        id,
      ).toEqual([])
      // What is still over at a place that is not listed is no need of steel: it is a fault of what was there.
      expect(
        over.filter((name) => !/^(fit|anchorage): /.test(name)),
        id,
      ).toEqual([])
    }
  },
  DEMO_MS,
)
