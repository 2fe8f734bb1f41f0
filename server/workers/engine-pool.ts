import { availableParallelism } from 'node:os'
import { Piscina } from 'piscina'
import type { PourResult } from '@wedgeline/engine'
import { throttled } from '../failure'
import type { EngineTask } from './engine-task'

export type CheckTask = (task: EngineTask) => Promise<PourResult[]>

export interface EnginePool {
  readonly check: CheckTask
  close(): Promise<void>
}

/** Checks that wait for a thread; whoever comes after them is told to try again. */
const QUEUE_MAX = 200
const HEAP_MAX_MB = 512
/** What is stored stays; the same change sent again is checked then. */
const BUSY = 'The change is stored, but too many checks wait just now. It is checked as soon as it is asked for again.'
const RETRY_AFTER_S = 5
const IDLE_MS = 60_000

/** Threads that run the engine, so that a long check never holds up who only reads. */
export function enginePool(): EnginePool {
  const pool = new Piscina<EngineTask, PourResult[]>({
    filename: new URL('engine-task.ts', import.meta.url).href,
    execArgv: ['--import', 'tsx'],
    minThreads: 1,
    maxThreads: Math.max(1, availableParallelism() - 1),
    maxQueue: QUEUE_MAX,
    idleTimeout: IDLE_MS,
    resourceLimits: { maxOldGenerationSizeMb: HEAP_MAX_MB },
  })
  const check = async (task: EngineTask) => {
    if (pool.queueSize >= QUEUE_MAX) throw throttled(BUSY, RETRY_AFTER_S)
    return await pool.run(task)
  }
  return { check, close: () => pool.close({ force: true }) }
}
