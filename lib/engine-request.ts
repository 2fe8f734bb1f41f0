import type { Layout, PourResult, Proposal, ProposeAsk, Schedule } from '@wedgeline/engine'

/** What the page asks of the engine: plain data in, plain data out, so that it can cross to another thread. */
export type EngineRequest = {
  readonly id: number
  readonly layout: Layout
  readonly pourId: string
} & EngineTask

export type EngineTask =
  { readonly does: 'check' } | { readonly does: 'propose'; readonly ask: ProposeAsk } | { readonly does: 'schedule' }

export type EngineAnswer = PourResult | Proposal | Schedule

export type EngineReply =
  { readonly id: number; readonly result: EngineAnswer } | { readonly id: number; readonly failure: string }
