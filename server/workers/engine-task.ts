import { checkPour, type Layout, type PourResult } from '@wedgeline/engine'

/** A layout in the engine's units and the pours of it that are to be checked. */
export interface EngineTask {
  readonly layout: Layout
  readonly pourIds: readonly string[]
}

/** Runs the engine over some pours; in a worker thread where the pool calls it. */
export default function checkTask({ layout, pourIds }: EngineTask): PourResult[] {
  return pourIds.map((pourId) => checkPour(layout, { pourId, withSteps: false }))
}
