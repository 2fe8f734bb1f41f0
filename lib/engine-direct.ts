import { engineAnswer } from './engine-answer'
import type { EngineAnswer, EngineRequest } from './engine-request'

/** The engine on the thread that asks, where the platform has no workers. */
export const answerDirectly: ((request: EngineRequest) => EngineAnswer) | null = engineAnswer
