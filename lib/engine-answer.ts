import { checkPour, proposeSteel, scheduleOf } from '@wedgeline/engine'
import type { EngineAnswer, EngineRequest } from './engine-request'

/** What the engine says to one request, on whichever thread. */
export function engineAnswer(request: EngineRequest): EngineAnswer {
  const { layout } = request
  switch (request.does) {
    case 'check':
      return checkPour(layout, { pourId: request.pourId, withSteps: true })
    case 'propose':
      return proposeSteel(layout, request.ask)
    case 'schedule':
      return scheduleOf(layout, request.pourId, [])
  }
}
