import { checkPour, type Layout, type PourResult } from '@wedgeline/engine'

/** The engine on the thread that asks, where the platform has no workers. */
export const checkDirectly: ((layout: Layout, pourId: string) => PourResult) | null = (layout, pourId) =>
  checkPour(layout, { pourId, withSteps: true })
