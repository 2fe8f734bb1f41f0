import { toEngine, type LayoutFile } from '@wedgeline/contract'
import type { PourResult } from '@wedgeline/engine'
import { useEffect, useState } from 'react'
import { openEngine, type EngineClient } from '@/lib/engine-client'
import { useJobDraft } from './job-draft'

export interface PourChecks {
  /** Latest result; while a newer one is being worked out `isStale` is true. */
  readonly result: PourResult | null
  readonly isStale: boolean
  readonly failure: string | null
}

interface Answer {
  readonly layout: LayoutFile
  readonly pourId: string
  readonly result: PourResult | null
  readonly failure: string | null
}

let engine: EngineClient | null = null

/** The checks of one pour as it stands on screen, worked out off the main thread while somebody types. */
export function usePourChecks(pourId: string): PourChecks {
  const { layout } = useJobDraft()
  const [answer, setAnswer] = useState<Answer | null>(null)
  useEffect(() => {
    let isLatest = true
    engine ??= openEngine()
    engine.check(toEngine(layout), pourId).then(
      (result) => {
        if (isLatest && result) setAnswer({ layout, pourId, result, failure: null })
      },
      (error: unknown) => {
        if (isLatest) setAnswer({ layout, pourId, result: null, failure: String(error) })
      },
    )
    return () => {
      isLatest = false
    }
  }, [layout, pourId])
  const known = answer?.pourId === pourId ? answer : null
  return { result: known?.result ?? null, isStale: known?.layout !== layout, failure: known?.failure ?? null }
}
