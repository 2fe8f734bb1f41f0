import { checkPour, type Layout, type PourResult } from '@wedgeline/engine'

/** Runs the engine off the main thread: plain data in, plain data out. */
export interface CheckRequest {
  readonly id: number
  readonly layout: Layout
  readonly pourId: string
}
export type CheckReply =
  { readonly id: number; readonly result: PourResult } | { readonly id: number; readonly failure: string }

self.onmessage = ({ data }: MessageEvent<CheckRequest>) => {
  self.postMessage(reply(data))
}

function reply({ id, layout, pourId }: CheckRequest): CheckReply {
  try {
    return { id, result: checkPour(layout, { pourId, withSteps: true }) }
  } catch (error) {
    return { id, failure: error instanceof Error ? error.message : String(error) }
  }
}
