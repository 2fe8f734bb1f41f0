import type { EngineAnswer, EngineRequest } from './engine-request'

/** Every browser has workers: the engine is left out of the page's own code, where it would be loaded twice. */
export const answerDirectly: ((request: EngineRequest) => EngineAnswer) | null = null
