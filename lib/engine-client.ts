import type { Layout, PourResult, Proposal, ProposeAsk, Schedule } from '@wedgeline/engine'
import { answerDirectly } from './engine-direct'
import type { EngineAnswer, EngineReply, EngineRequest, EngineTask } from './engine-request'

/**
 * Asks the engine while somebody types. The latest edit wins: while one request runs only the newest waiting one of each
 * kind and pour is kept, and an older answer is never shown over a newer one.
 */
export class EngineClient {
  private readonly worker: Worker | null
  private running: Pending | null = null
  /** By kind and pour, in the order in which they were asked for. */
  private readonly waiting = new Map<string, Pending>()
  private nextId = 1

  constructor(makeWorker: (() => Worker) | null) {
    this.worker = makeWorker?.() ?? null
    if (this.worker) this.worker.onmessage = (event: MessageEvent<EngineReply>) => this.answered(event.data)
  }

  /** The checks of a pour. Answers null when a newer request took this one's place, as the others do. */
  async check(layout: Layout, pourId: string): Promise<PourResult | null> {
    return (await this.ask({ layout, pourId, task: { does: 'check' } })) as PourResult | null
  }

  async propose(layout: Layout, ask: ProposeAsk): Promise<Proposal | null> {
    return (await this.ask({ layout, pourId: ask.pourId, task: { does: 'propose', ask } })) as Proposal | null
  }

  /** The bars of a pour by mark. What was not checked is not asked here. */
  async schedule(layout: Layout, pourId: string): Promise<Schedule | null> {
    return (await this.ask({ layout, pourId, task: { does: 'schedule' } })) as Schedule | null
  }

  close(): void {
    this.worker?.terminate()
  }

  private ask({ layout, pourId, task }: Asked): Promise<EngineAnswer | null> {
    const request = { id: this.nextId++, layout, pourId, ...task }
    if (!this.worker) return direct(request)
    return new Promise((resolve, reject) => {
      const place = `${task.does} ${pourId}`
      this.waiting.get(place)?.resolve(null)
      this.waiting.set(place, { place, request, resolve, reject })
      this.start()
    })
  }

  private start(): void {
    const [next] = this.waiting.values()
    if (this.running || !next) return
    this.waiting.delete(next.place)
    this.running = next
    this.worker?.postMessage(next.request)
  }

  private answered(reply: EngineReply): void {
    const done = this.running
    if (!done || done.request.id !== reply.id) return
    this.running = null
    if ('result' in reply) done.resolve(reply.result)
    else done.reject(new Error(reply.failure))
    this.start()
  }
}

interface Asked {
  readonly layout: Layout
  readonly pourId: string
  readonly task: EngineTask
}

async function direct(request: EngineRequest): Promise<EngineAnswer> {
  if (answerDirectly) return Promise.resolve(answerDirectly(request))
  throw new Error('This browser has no workers, which the checks run in. Use a current browser.')
}

interface Pending {
  readonly place: string
  readonly request: EngineRequest
  readonly resolve: (result: EngineAnswer | null) => void
  readonly reject: (error: Error) => void
}

/** The one client of the page; without workers (an old browser, a test) the engine runs directly. */
export function openEngine(): EngineClient {
  const canWork = typeof Worker !== 'undefined'
  return new EngineClient(canWork ? () => new Worker(new URL('./engine.worker', import.meta.url)) : null)
}
