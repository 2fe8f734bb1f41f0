import type { CheckTask, EngineTasks } from '@/server/workers/engine-pool'
import checkTask from '@/server/workers/engine-task'
import { scheduleTask, workbookTask } from '@/server/workers/schedule-task'

/** The engine on the thread of the test. */
export const checkHere: CheckTask = (task) => Promise.resolve(checkTask(task))

/** All that threads do elsewhere, on the thread of the test. */
export const engineHere: EngineTasks = {
  check: checkHere,
  schedule: (task) => Promise.resolve(scheduleTask(task)),
  writeWorkbook: workbookTask,
}
