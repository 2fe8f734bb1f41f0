import { basisOf, proposeSteel, type Layout, type Steel } from '@wedgeline/engine'

/** Readings that are another answer to a question that one of the others answers already. */
const OTHER_ANSWERS = ['en-steel-alt', 'en-tie-back-own', 'en-crack-edge-bars', 'en-crack-stronger']

/** The layout with its readings accepted and each pour's proposal taken over, one pour after the other. */
export function withProposals(layout: Layout): Layout {
  return layout.pours.reduce((given, { id }) => withProposal(given, id), withReadings(layout))
}

function withReadings(layout: Layout): Layout {
  const readings = basisOf(layout.job)
    .readings.filter(({ id }) => !OTHER_ANSWERS.includes(id))
    .map(({ id }) => ({ readingId: id, acceptedBy: 'An engineer (invented)', acceptedAtMs: 0, reason: 'test' }))
  return { ...layout, job: { ...layout.job, readings } }
}

function withProposal(layout: Layout, pourId: string): Layout {
  const { zones } = proposeSteel(layout, { pourId })
  const removed = new Set(zones.flatMap(({ removes }) => removes))
  const added = zones.flatMap(({ adds, place, pourId: castWith }, zone) =>
    adds.map((shape, at): Steel => ({
      id: `${pourId}-${zone}-${at}`,
      pourId: castWith,
      zone: place,
      shape,
      source: 'proposed',
      isLocked: false,
    })),
  )
  return { ...layout, steel: [...layout.steel.filter(({ id }) => !removed.has(id)), ...added] }
}
