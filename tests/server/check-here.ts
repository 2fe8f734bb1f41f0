import type { CheckTask } from '@/server/workers/engine-pool'
import checkTask from '@/server/workers/engine-task'

/** The engine on the thread of the test. */
export const checkHere: CheckTask = (task) => Promise.resolve(checkTask(task))
