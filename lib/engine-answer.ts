import { checkPour, proposeSteel, recheck, scheduleOf, type Checked, type Layout } from '@wedgeline/engine'
import type { EngineAnswer, EngineRequest } from './engine-request'

/** What the engine says to one request, on whichever thread. */
export function engineAnswer(request: EngineRequest): EngineAnswer {
  const { layout } = request
  switch (request.does) {
    case 'check':
      return checkedAgain(layout, request.pourId)
    case 'propose':
      return proposeSteel(layout, request.ask)
    case 'schedule':
      return scheduleOf(layout, request.pourId, [])
  }
}

/** The pours checked last, with the layout that they were checked in; the one checked longest ago goes first. */
const checked = new Map<string, Checked>()
const POURS_KEPT = 4

/** Only what differs from the last time is checked again. */
function checkedAgain(layout: Layout, pourId: string): Checked['result'] {
  const ask = { pourId, withSteps: true }
  const key = `${layout.job.id} ${pourId}`
  const before = checked.get(key)
  const result = before ? recheck(before, layout, ask) : checkPour(layout, ask)
  checked.delete(key)
  checked.set(key, { layout, result })
  const [oldest] = checked.keys()
  if (oldest !== undefined && checked.size > POURS_KEPT) checked.delete(oldest)
  return result
}
