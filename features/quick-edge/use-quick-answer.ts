import { toEngine, type LayoutFile } from '@wedgeline/contract'
import { onProposedReadings } from '@wedgeline/engine/result'
import type { PourResult, Proposal, Schedule } from '@wedgeline/engine'
import { useEffect, useState } from 'react'
import { pageEngine } from '../editing/pour-checks'
import { withProposal } from './proposed-steel'
import { POUR_ID } from './quick-layout'

export interface QuickAnswer {
  /** The layout that the answer is of, with the proposed bars where there are some. */
  readonly layout: LayoutFile
  /** On the proposed readings. */
  readonly result: PourResult
  readonly schedule: Schedule
  /** When it was worked out. */
  readonly atMs: number
}

export interface QuickWork {
  /** Stands while a newer one is worked out, then `isStale`; null before the first. */
  readonly answer: QuickAnswer | null
  readonly isStale: boolean
  readonly failure: string | null
  /** The proposal whose bars are in the layout; null where none is, or something was typed since. */
  readonly proposal: Proposal | null
  /** Bars were proposed before something else was typed. */
  readonly isOutdated: boolean
  readonly isProposing: boolean
  readonly propose: () => void
}

interface Proposed {
  readonly base: LayoutFile
  readonly layout: LayoutFile
  readonly proposal: Proposal
}

interface Answered {
  readonly of: LayoutFile
  readonly answer: QuickAnswer | null
  readonly failure: string | null
}

/** Checks, bars and proposals for an edge that is nowhere but on this page, worked out off the main thread. */
export function useQuickWork(base: LayoutFile | null): QuickWork {
  const [proposed, setProposed] = useState<Proposed | null>(null)
  const [answered, setAnswered] = useState<Answered | null>(null)
  const [proposing, setProposing] = useState<LayoutFile | null>(null)
  const isCurrent = proposed !== null && proposed.base === base
  const layout = isCurrent ? proposed.layout : base
  useEffect(() => {
    if (!layout) return
    let isLatest = true
    answerOf(layout).then(
      (answer) => isLatest && answer && setAnswered({ of: layout, answer, failure: null }),
      (error: unknown) => isLatest && setAnswered({ of: layout, answer: null, failure: String(error) }),
    )
    return () => {
      isLatest = false
    }
  }, [layout])
  const propose = () => {
    if (!base) return
    setProposing(base)
    pageEngine()
      .propose(toEngine(base), { pourId: POUR_ID })
      .then((proposal) => proposal && setProposed({ base, proposal, layout: withBars(base, proposal) }))
      .catch((error: unknown) => setAnswered({ of: base, answer: null, failure: String(error) }))
      .finally(() => setProposing((now) => (now === base ? null : now)))
  }
  return {
    answer: layout ? (answered?.answer ?? null) : null,
    isStale: layout !== null && answered?.of !== layout,
    failure: answered?.of === layout ? (answered?.failure ?? null) : null,
    proposal: isCurrent ? proposed.proposal : null,
    isOutdated: proposed !== null && !isCurrent,
    isProposing: proposing !== null && proposing === base,
    propose,
  }
}

function withBars(base: LayoutFile, proposal: Proposal): LayoutFile {
  let made = 0
  return withProposal(base, proposal, () => `quick-steel-${++made}`)
}

/** Null where a newer request took this one's place. */
async function answerOf(layout: LayoutFile): Promise<QuickAnswer | null> {
  const plain = toEngine(layout)
  const engine = pageEngine()
  const [result, schedule] = await Promise.all([engine.check(plain, POUR_ID), engine.schedule(plain, POUR_ID)])
  return result && schedule ? { layout, result: onProposedReadings(result), schedule, atMs: Date.now() } : null
}
