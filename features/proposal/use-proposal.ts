import { toEngine, type LayoutFile } from '@wedgeline/contract'
import type { Proposal, ProposeAsk } from '@wedgeline/engine'
import { useEffect, useState } from 'react'
import { pageEngine } from '../editing/pour-checks'

export interface ProposalState {
  /** Null while the first one is being worked out. */
  readonly proposal: Proposal | null
  readonly isStale: boolean
  readonly failure: string | null
}

interface Answer {
  readonly layout: LayoutFile
  readonly key: string
  readonly proposal: Proposal | null
  readonly failure: string | null
}

/** What the engine proposes for the layout as it stands, worked out off the main thread; null asks for nothing. */
export function useProposal(layout: LayoutFile, ask: ProposeAsk | null): ProposalState {
  const [answer, setAnswer] = useState<Answer | null>(null)
  const key = JSON.stringify(ask)
  useEffect(() => {
    const asked = JSON.parse(key) as ProposeAsk | null
    if (!asked) return
    let isLatest = true
    pageEngine()
      .propose(toEngine(layout), asked)
      .then(
        (proposal) => {
          if (isLatest && proposal) setAnswer({ layout, key, proposal, failure: null })
        },
        (error: unknown) => {
          if (isLatest) setAnswer({ layout, key, proposal: null, failure: String(error) })
        },
      )
    return () => {
      isLatest = false
    }
  }, [layout, key])
  return {
    proposal: answer?.proposal ?? null,
    isStale: answer?.layout !== layout || answer.key !== key,
    failure: answer?.failure ?? null,
  }
}
