import type { Layout, PourResult } from '@wedgeline/engine'
import { checkDirectly } from './engine-direct'
import type { CheckReply, CheckRequest } from './engine.worker'

/**
 * Asks the engine for a pour's checks while somebody types. The latest edit wins: while one request runs only the
 * newest waiting one of each pour is kept, and an older answer is never shown over a newer one.
 */
export class EngineClient {
  private readonly worker: Worker | null
  private running: Pending | null = null
  /** By pour, in the order in which they were asked for. */
  private readonly waiting = new Map<string, Pending>()
  private nextId = 1

  constructor(makeWorker: (() => Worker) | null) {
    this.worker = makeWorker?.() ?? null
    if (this.worker) this.worker.onmessage = (event: MessageEvent<CheckReply>) => this.answered(event.data)
  }

  /** Answers null when a newer request took this one's place. */
  check(layout: Layout, pourId: string): Promise<PourResult | null> {
    if (!this.worker) return direct(layout, pourId)
    return new Promise((resolve, reject) => {
      this.waiting.get(pourId)?.resolve(null)
      this.waiting.set(pourId, { request: { id: this.nextId++, layout, pourId }, resolve, reject })
      this.start()
    })
  }

  close(): void {
    this.worker?.terminate()
  }

  private start(): void {
    const [next] = this.waiting.values()
    if (this.running || !next) return
    this.waiting.delete(next.request.pourId)
    this.running = next
    this.worker?.postMessage(next.request)
  }

  private answered(reply: CheckReply): void {
    const done = this.running
    if (!done || done.request.id !== reply.id) return
    this.running = null
    if ('result' in reply) done.resolve(reply.result)
    else done.reject(new Error(reply.failure))
    this.start()
  }
}

function direct(layout: Layout, pourId: string): Promise<PourResult> {
  if (checkDirectly) return Promise.resolve(checkDirectly(layout, pourId))
  return Promise.reject(new Error('This browser has no workers, which the checks run in. Use a current browser.'))
}

interface Pending {
  readonly request: CheckRequest
  readonly resolve: (result: PourResult | null) => void
  readonly reject: (error: Error) => void
}

/** The one client of the page; without workers (an old browser, a test) the engine runs directly. */
export function openEngine(): EngineClient {
  const canWork = typeof Worker !== 'undefined'
  return new EngineClient(canWork ? () => new Worker(new URL('./engine.worker', import.meta.url)) : null)
}
