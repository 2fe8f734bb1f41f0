import { availableParallelism } from 'node:os'
import { Piscina } from 'piscina'
import type { PourResult, Schedule } from '@wedgeline/engine'
import { throttled } from '../failure'
import type { EngineTask } from './engine-task'
import type { ScheduleTask, WorkbookTask, WrittenWorkbook } from './schedule-task'

export type CheckTask = (task: EngineTask) => Promise<PourResult[]>

/** What takes the engine long enough to be done beside whoever only reads. */
export interface EngineTasks {
  readonly check: CheckTask
  readonly schedule: (task: ScheduleTask) => Promise<Schedule>
  readonly writeWorkbook: (task: WorkbookTask) => Promise<WrittenWorkbook>
}

export interface EnginePool extends EngineTasks {
  close(): Promise<void>
}

/** Tasks that wait for a thread; whoever comes after them is told to try again. */
const QUEUE_MAX = 200
const HEAP_MAX_MB = 512
/** What is stored stays; the same change sent again is checked then. */
const BUSY = 'The change is stored, but too many checks wait just now. It is checked as soon as it is asked for again.'
const BUSY_READING = 'Too many schedules and checks wait just now. Ask again in a few seconds.'
const RETRY_AFTER_S = 5
const IDLE_MS = 60_000

const SCHEDULES = new URL('schedule-task.ts', import.meta.url).href

/** Threads that run the engine and write workbooks, so that neither ever holds up who only reads. */
export function enginePool(): EnginePool {
  const pool = new Piscina({
    filename: new URL('engine-task.ts', import.meta.url).href,
    execArgv: ['--import', 'tsx'],
    minThreads: 1,
    maxThreads: Math.max(1, availableParallelism() - 1),
    maxQueue: QUEUE_MAX,
    idleTimeout: IDLE_MS,
    resourceLimits: { maxOldGenerationSizeMb: HEAP_MAX_MB },
  })
  const assertRoom = (busy: string) => {
    if (pool.queueSize >= QUEUE_MAX) throw throttled(busy, RETRY_AFTER_S)
  }
  return {
    async check(task) {
      assertRoom(BUSY)
      return (await pool.run(task)) as PourResult[]
    },
    async schedule(task) {
      assertRoom(BUSY_READING)
      return (await pool.run(task, { filename: SCHEDULES, name: 'scheduleTask' })) as Schedule
    },
    async writeWorkbook(task) {
      assertRoom(BUSY_READING)
      return (await pool.run(task, { filename: SCHEDULES, name: 'workbookTask' })) as WrittenWorkbook
    },
    close: () => pool.close({ force: true }),
  }
}
