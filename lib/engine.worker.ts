import { engineAnswer } from './engine-answer'
import type { EngineReply, EngineRequest } from './engine-request'

/** Runs the engine off the main thread. */
self.onmessage = ({ data }: MessageEvent<EngineRequest>) => {
  self.postMessage(reply(data))
}

function reply(request: EngineRequest): EngineReply {
  const { id } = request
  try {
    return { id, result: engineAnswer(request) }
  } catch (error) {
    return { id, failure: error instanceof Error ? error.message : String(error) }
  }
}
