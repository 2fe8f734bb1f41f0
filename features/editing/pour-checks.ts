import { toEngine, type LayoutFile } from '@wedgeline/contract'
import { onProposedReadings } from '@wedgeline/engine/result'
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

/** The page's one client of the engine. */
export const pageEngine = (): EngineClient => (engine ??= openEngine())

/**
 * The checks of one pour as it stands on screen, worked out off the main thread while somebody types. Those of a quick
 * edge come on the proposed readings, so that every screen and every count shows the same.
 */
export function usePourChecks(pourId: string): PourChecks {
  const { layout, isUnfiled } = useJobDraft()
  const [answer, setAnswer] = useState<Answer | null>(null)
  useEffect(() => {
    let isLatest = true
    pageEngine()
      .check(toEngine(layout), pourId)
      .then(
        (result) => {
          if (!isLatest || !result) return
          setAnswer({ layout, pourId, result: isUnfiled ? onProposedReadings(result) : result, failure: null })
        },
        (error: unknown) => {
          if (isLatest) setAnswer({ layout, pourId, result: null, failure: String(error) })
        },
      )
    return () => {
      isLatest = false
    }
  }, [layout, pourId, isUnfiled])
  const known = answer?.pourId === pourId ? answer : null
  return { result: known?.result ?? null, isStale: known?.layout !== layout, failure: known?.failure ?? null }
}
