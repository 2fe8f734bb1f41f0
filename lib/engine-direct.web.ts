import type { Layout, PourResult } from '@wedgeline/engine'

/** Every browser has workers: the engine is left out of the page's own code, where it would be loaded twice. */
export const checkDirectly: ((layout: Layout, pourId: string) => PourResult) | null = null
